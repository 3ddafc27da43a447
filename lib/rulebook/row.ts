/** One cause's row in the table of one check, as it would be with other weights. */
import { completeRow } from '@/lib/diagnose/complete-table';
import type { CompiledCheck } from '@/lib/diagnose/compiled';
import { decibansOf, natsOf } from '@/lib/diagnose/decibans';

/** Weights that stand in for those of the rulebook: decibans by the name of a rule. */
export type Weights = Readonly<Record<string, number>>;

export type Row =
  | { coherent: true; /** w of each answer, nats, completed and normalised. */ nats: number[] }
  | { coherent: false; /** Sum of b e^w over the answers given; see `completeRow`. */ total: number };

/**
 * The completed row of a cause.
 *
 * @param check from `compiled.checks`
 * @param causeId whose row
 * @param weights decibans that replace, or add to, those of the check's table rules
 * @returns the weight of every answer, or the sum that makes the row impossible
 * @example rowOf(check, 'rings-worn', { 'noise: knock': 4 })
 */
export function rowOf(check: CompiledCheck, causeId: string, weights: Weights = {}): Row {
  const given = check.rulesByState.map((rules) => {
    const rule = rules.find((each) => decibansIn(each, causeId, weights) !== undefined);
    const decibans = rule && decibansIn(rule, causeId, weights);
    return decibans === undefined ? undefined : natsOf(decibans);
  });
  const row = completeRow(check.backgrounds, given);
  if (!row.coherent) return row;
  return { coherent: true, nats: given.map((nats) => (nats === undefined ? row.fill : nats - row.excess)) };
}

/**
 * The largest weight that a rule may give a cause, the others of its check left as they are.
 *
 * @returns decibans that the weight must stay below, or, where every answer is given, the one weight that fits;
 * undefined when the others take all, or the rule is not of this check
 * @example largestWeight(check, 'rings-worn', 'noise: knock') // 6.98
 */
export function largestWeight(check: CompiledCheck, causeId: string, ruleName: string): number | undefined {
  let own = 0;
  let others = 0;
  check.rulesByState.forEach((rules, state) => {
    const background = check.backgrounds[state] ?? 0;
    if (rules.some((rule) => rule.name === ruleName)) own += background;
    else {
      const decibans = rules.map((rule) => decibansIn(rule, causeId, {})).find((each) => each !== undefined);
      if (decibans !== undefined) others += background * Math.exp(natsOf(decibans));
    }
  });
  return own > 0 && others < 1 ? decibansOf(Math.log((1 - others) / own)) : undefined;
}

function decibansIn({ name, rule }: CompiledCheck['tableRules'][number], causeId: string, weights: Weights): number | undefined {
  if (Object.hasOwn(weights, name)) return weights[name];
  return Object.hasOwn(rule.weights, causeId) ? rule.weights[causeId] : undefined;
}
