import type * as z from 'zod';
import type { Problem } from './errors';
import { placeOf } from './schema-limits';
import { REFUSALS } from './schema-shape';

/** Keys that json-rules-engine knows and a rulebook does not, with the reason. */
const ENGINE_KEYS = new Map([
  ['event', 'leave it out: a rule has weights, and the event type is fixed'],
  ['priority', 'leave it out: rules and conditions have no order (the engine would turn 0 into 1)'],
  ['onSuccess', 'leave it out: a rule has weights and does nothing else'],
  ['onFailure', 'leave it out: a rule has weights and does nothing else'],
]);

/**
 * Puts what Zod found into a rulebook author's words: the rule, the place, and what to write instead.
 *
 * @param json the raw rulebook, for the names of rules
 * @param issues from `safeParse` with `reportInput`
 */
export function problemsOf(json: unknown, issues: readonly z.core.$ZodIssue[]): Problem[] {
  return issues.flatMap((issue) => {
    if (issue.code === 'unrecognized_keys') {
      return issue.keys.map((key) => ({
        ...placeOf(json, [...issue.path, key]),
        message: `unknown key "${key}"`,
        instead: ENGINE_KEYS.get(key) ?? 'leave it out, or check its spelling',
      }));
    }
    return [{ ...placeOf(json, issue.path), ...wordsFor(issue) }];
  });
}

function wordsFor(issue: z.core.$ZodIssue): Pick<Problem, 'message' | 'instead'> {
  const got = shown(issue.input);
  switch (issue.code) {
    case 'invalid_type':
      if (issue.input === undefined) return { message: 'is missing', instead: `write ${aKind(issue.expected)}` };
      if (issue.expected === 'number' && typeof issue.input === 'string') {
        return { message: `the text ${got} stands where a number belongs`, instead: 'write the number without quotation marks' };
      }
      return { message: `${got} stands where ${aKind(issue.expected)} belongs`, instead: `write ${aKind(issue.expected)}` };
    case 'invalid_value':
      return {
        message: issue.input === undefined ? 'is missing' : `${got} is not known here`,
        instead: `write ${issue.values.map((value) => JSON.stringify(value)).join(' or ')}`,
      };
    case 'too_small':
      return { message: `${got} is too ${issue.origin === 'number' ? 'low' : 'few'}`, instead: `write ${issue.inclusive ? 'at least' : 'more than'} ${issue.minimum}` };
    case 'too_big':
      return { message: `${got} is too ${sizeWord(issue.origin)}`, instead: `write ${issue.inclusive ? 'at most' : 'less than'} ${issue.maximum}` };
    case 'invalid_format':
      return { message: `${got} ${issue.message}`, instead: 'write a name: small letters, digits and single hyphens for an id ("intake-filter"), one line for a title' };
    case 'invalid_key':
      return { message: 'the key is not an id', instead: 'use small letters, digits and single hyphens: "intake-filter"' };
    case 'invalid_union':
      return { message: `${got} is neither a text nor a range`, instead: 'write a text, or { "atLeast": number, "below": number }' };
    default:
      return {
        message: issue.input === undefined ? issue.message : `${got} ${issue.message}`,
        instead: ADVICE.get(issue.message) ?? 'see the shapes in lib/diagnose/types.ts',
      };
  }
}

/** What to write instead, for the refusals that `schema-shape.ts` words itself. */
const ADVICE = new Map<string, string>([
  [REFUSALS.reserved, 'use another name'],
  [REFUSALS.emptyText, 'write some text, without a space at either end'],
  [REFUSALS.empty, 'name at least one'],
  [REFUSALS.missing, 'write { "all": [...] } or { "any": [...] }'],
]);

function sizeWord(origin: string): string {
  return origin === 'number' ? 'high' : origin === 'string' ? 'long' : 'many';
}

const KINDS = new Map([
  ['array', 'a list'],
  ['object', 'an object'],
  ['record', 'an object'],
  ['string', 'a text'],
  ['int', 'a whole number'],
]);

function aKind(expected: string): string {
  return KINDS.get(expected) ?? `a ${expected}`;
}

/** The value as JSON, cut to what fits in a line. */
export function shown(value: unknown): string {
  const text = (JSON.stringify(value) as string | undefined) ?? String(value);
  return text.length > 60 ? `${text.slice(0, 57)}...` : text;
}
