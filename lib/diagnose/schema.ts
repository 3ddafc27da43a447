import type { Problem } from './errors';
import { checkProblems } from './schema-checks';
import { coherenceProblems } from './schema-coherence';
import { readConditions } from './schema-conditions';
import { limitProblems, pathText } from './schema-limits';
import { problemsOf } from './schema-messages';
import { proofProblems } from './schema-proof';
import { referenceProblems } from './schema-references';
import { ruleProblems } from './schema-rules';
import { rulebookShape } from './schema-shape';
import type { Rule, Rulebook } from './types';

export type ParsedRulebook = { ok: true; rulebook: Rulebook } | { ok: false; problems: Problem[] };

/**
 * Reads a rulebook and refuses everything that would rank wrongly: each trap of json-rules-engine, each name that
 * leads nowhere, each table that can't be true.
 *
 * It goes in steps, and stops after the first that finds something, since what follows would only echo it: size; keys,
 * types and ranges; names, bands and conditions; rules against each other; sums.
 *
 * @param json parsed JSON from anywhere; not changed
 * @returns the rulebook, a copy; or every problem of the step that failed, with its rule, place and what to write
 * @example parseRulebook({}) // { ok: false, problems: [{ path: 'schemaVersion', message: 'is missing', ... }] }
 */
export function parseRulebook(json: unknown): ParsedRulebook {
  const tooMuch = limitProblems(json);
  if (tooMuch.length > 0) return { ok: false, problems: tooMuch };

  const shape = rulebookShape.safeParse(json, { reportInput: true });
  if (!shape.success) return { ok: false, problems: problemsOf(json, shape.error.issues) };

  const problems = [...referenceProblems(shape.data), ...checkProblems(shape.data), ...proofProblems(shape.data)];
  const checks = new Map(shape.data.checks.map((check) => [check.id, check]));
  const rules = shape.data.rules.flatMap((rule, index): Rule[] => {
    const conditions = readConditions(rule.conditions, checks, (path, message, instead) => {
      problems.push({ rule: rule.name, path: pathText(['rules', index, 'conditions', ...path]), message, instead });
    });
    return conditions ? [{ ...rule, conditions: structuredClone(conditions) }] : [];
  });
  if (problems.length > 0) return { ok: false, problems };

  const rulebook: Rulebook = { ...shape.data, rules };
  for (const step of [ruleProblems, coherenceProblems]) {
    const found = step(rulebook);
    if (found.length > 0) return { ok: false, problems: found };
  }
  return { ok: true, rulebook };
}
