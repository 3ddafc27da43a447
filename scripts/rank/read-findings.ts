import * as z from 'zod';
import { FindingError, sharesOf, type Answer, type CompiledCheck, type CompiledRulebook, type Finding, type RecordFacts } from '@/lib/diagnose';
import { InputError } from './input-error';
import { readError, readValue } from './readings';

/** What a file of findings holds. */
export interface Input {
  /** Answers, those that say nothing included. */
  findings: Finding[];
  /** Facts of unit, model and fit; numbers in SI. */
  facts: RecordFacts;
}

const answerSchema = z.strictObject({
  answer: z.string().optional(),
  value: z.union([z.string(), z.number()]).optional(),
  error: z.union([z.string(), z.number()]).optional(),
  sure: z.boolean().optional(),
});
type WrittenAnswer = z.infer<typeof answerSchema>;

const fileSchema = z.strictObject({
  findings: z.union([
    z.record(z.string(), z.union([z.string(), z.number(), answerSchema])),
    z.array(answerSchema.extend({ check: z.string() })),
  ]),
  record: z.record(z.string(), z.union([z.string(), z.number()])).optional(),
});

const CANNOT_TELL = new Set(["can't tell", 'can’t tell', 'cannot tell', 'cannot-tell']);

/**
 * Reads a file of findings against a rulebook.
 *
 * @param text the file's text
 * @param compiled the rulebook
 * @throws InputError for the first thing that is wrong, in one line
 */
export function readInput(text: string, compiled: CompiledRulebook): Input {
  const parsed = fileSchema.safeParse(readJson(text));
  if (!parsed.success) throw new InputError(shapeMessage(parsed.error));
  const { findings, record = {} } = parsed.data;
  const entries = Array.isArray(findings)
    ? findings.map(({ check, ...answer }) => ({ check, answer }))
    : Object.entries(findings).map(([check, answer]) => ({ check, answer: typeof answer === 'object' ? answer : shortAnswer(compiled, check, answer) }));
  const seen = new Set<string>();
  return {
    findings: entries.map(({ check: id, answer }) => {
      if (seen.has(id)) throw new InputError(`check "${id}" is answered twice`);
      seen.add(id);
      return readFinding(checkOf(compiled, id), answer);
    }),
    facts: readFacts(compiled, record),
  };
}

function readJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch (error) {
    throw new InputError(`not JSON: ${error instanceof Error ? error.message : String(error)}`.replace(/\s+/g, ' '));
  }
}

function shapeMessage(error: z.ZodError): string {
  const [issue] = error.issues;
  const place = issue?.path.join('.') || 'the file';
  if (issue?.code === 'unrecognized_keys') return `${place}: unknown key "${issue.keys[0]}"`;
  return `${place}: must be { "findings": { "check-id": "answer" } } or a list of { "check", "answer" or "value", "error", "sure" }, with "record" beside it if you like`;
}

function checkOf(compiled: CompiledRulebook, id: string): CompiledCheck {
  const check = compiled.checks.get(id);
  if (!check) throw new InputError(`there is no check "${id}"; npm run rank -- --list shows them all`);
  return check;
}

/** In the short form a measured check takes its value where a choice takes its answer. */
function shortAnswer(compiled: CompiledRulebook, id: string, written: string | number): WrittenAnswer {
  const isReading = compiled.checks.get(id)?.check.kind === 'measured' && !saysNothing(written);
  if (isReading) return { value: written };
  if (typeof written === 'number') throw new InputError(`check "${id}": ${written} is not one of its answers`);
  return { answer: written };
}

function saysNothing(written: unknown): boolean {
  return typeof written === 'string' && (written === 'skip' || CANNOT_TELL.has(written));
}

function readFinding(check: CompiledCheck, written: WrittenAnswer): Finding {
  try {
    return { id: check.id, checkId: check.id, stage: { kind: 'diagnosis' }, ...sharesOf(check, readAnswer(check, written)) };
  } catch (error) {
    if (!(error instanceof FindingError)) throw error;
    const reading = error.code === 'out-of-range' ? `check "${check.id}": ${JSON.stringify(written.value)} is out of its range` : error.message;
    throw new InputError(reading);
  }
}

function readAnswer(check: CompiledCheck, { answer, value, error, sure = true }: WrittenAnswer): Answer {
  const sureness = sure ? 'sure' : 'think-so';
  if (answer !== undefined && value !== undefined) throw new InputError(`check "${check.id}": give "answer" or "value", not both`);
  if (answer === 'skip') return { kind: 'skip' };
  if (answer !== undefined && CANNOT_TELL.has(answer)) return { kind: 'cannot-tell' };
  if (check.check.kind === 'measured') {
    if (value === undefined) throw new InputError(`check "${check.id}" is measured: give "value", such as "12 ${check.check.unit ?? ''}"`);
    return { kind: 'measured', value: readValue(check.check, value), error: readError(check.check, error), sureness };
  }
  if (answer === undefined) throw new InputError(`check "${check.id}" needs "answer": ${check.stateIds.join(', ')}`);
  if (error !== undefined) throw new InputError(`check "${check.id}" is not measured, so it has no "error"`);
  return { kind: 'state', state: answer, sureness };
}

function readFacts(compiled: CompiledRulebook, record: RecordFacts): RecordFacts {
  const checks = [...compiled.checks.values()].map(({ check }) => check);
  const variants = compiled.rulebook.priorVariants ?? [];
  const known = new Set([...checks.flatMap(({ fromRecord }) => fromRecord?.fact ?? []), ...variants.flatMap(({ when }) => Object.keys(when))]);
  return Object.fromEntries(
    Object.entries(record).map(([fact, value]) => {
      if (!known.has(fact)) throw new InputError(`record: no check asks for "${fact}"; known: ${[...known].sort().join(', ')}`);
      const measured = checks.find(({ kind, fromRecord }) => kind === 'measured' && fromRecord?.fact === fact);
      return [fact, measured && typeof value === 'string' ? readValue(measured, value) : value];
    }),
  );
}
