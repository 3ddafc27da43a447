import type { Problem } from './errors';
import { parseRulebook } from './schema';
import type { Rule, Rulebook } from './types';

export type ReadRule = { ok: true; rule: Rule } | { ok: false; problems: Problem[] };

/**
 * Reads one rule as it would stand in a rulebook: the one way in for editor, API and command, so that each refuses the
 * same and says the same of what to write instead.
 *
 * @param json the rule as parsed JSON, from anywhere
 * @param book a sound rulebook; it is not changed
 * @param at index of the rule that it replaces; left out: it is added at the end
 * @returns the rule, a copy, or its problems, their paths beginning at the rule
 * @example readRule({ ...rule, conditions: { all: [] } }, book).ok // false: an empty list would always hold
 */
export function readRule(json: unknown, book: Rulebook, at = book.rules.length): ReadRule {
  const rules: unknown[] = [...book.rules];
  rules[at] = json;
  const parsed = parseRulebook({ ...book, rules });
  if (!parsed.ok) {
    const here = `rules[${at}]`;
    return {
      ok: false,
      problems: parsed.problems.map((problem) => ({ ...problem, path: problem.path.startsWith(here) ? problem.path.slice(here.length).replace(/^\./, '') || 'the rule' : problem.path })),
    };
  }
  const rule = parsed.rulebook.rules[at];
  if (!rule) throw new RangeError(`the rulebook has no place ${at} for a rule`);
  return { ok: true, rule };
}
