import { attenuatedGain } from '@/lib/diagnose/attenuation';
import type { CompiledCheck, CompiledGroup, CompiledRule, CompiledRulebook } from '@/lib/diagnose/compiled';
import { compoundNats, type EvidenceItem } from '@/lib/diagnose/evidence';
import { evidenceNats } from '@/lib/diagnose/contributions';
import { natsOf } from '@/lib/diagnose/decibans';
import type { UsedFinding } from '@/lib/diagnose/used-findings';
import { rowOf, type Weights } from '../row';
import type { PreparedCase } from './prepare';

/**
 * What moves when one weight moves: the score of one cause, in the cases whose evidence the rule is part of. Of a table
 * rule these are all cases in which its check is answered, since the answers that it leaves open are filled in anew.
 */
export interface Moving {
  compiled: CompiledRulebook;
  cause: number;
  causeId: string;
  group: CompiledGroup;
  source: { kind: 'table'; check: CompiledCheck } | { kind: 'compound'; rule: CompiledRule };
}

/**
 * Finds what moves.
 *
 * @throws RangeError for a rule or cause that the rulebook does not list
 */
export function movingOf(compiled: CompiledRulebook, ruleName: string, causeId: string): Moving {
  const rule = compiled.rules.get(ruleName);
  const cause = compiled.causeIndex.get(causeId);
  if (!rule || cause === undefined) throw new RangeError(`the rulebook has no rule "${ruleName}" or no cause "${causeId}"`);
  if (rule.kind === 'compound') return { compiled, cause, causeId, group: rule.group, source: { kind: 'compound', rule } };
  const check = compiled.checks.get(rule.checkIds[0] ?? '');
  if (!check) throw new RangeError(`the rulebook has no check "${rule.checkIds[0]}"`);
  return { compiled, cause, causeId, group: check.group, source: { kind: 'table', check } };
}

/** The evidence of a case that moves; undefined when the case has none. */
export function movingItem({ source }: Moving, { items }: PreparedCase): EvidenceItem | undefined {
  return source.kind === 'table'
    ? items.find((item) => item.kind === 'table' && item.checkIds[0] === source.check.id)
    : items.find((item) => item.kind === 'compound' && item.rules[0] === source.rule);
}

/** W of the moving evidence for the cause, nats, at some weights; undefined where they make the row impossible. */
export type WeightAt = (used: readonly UsedFinding[]) => number;

/**
 * Makes the function that weighs the moving evidence of any case at some weights.
 *
 * @param weights decibans by rule; the row is completed anew with them
 * @returns the function, or the sum that makes the row impossible
 */
export function weightAt(moving: Moving, weights: Weights): { coherent: true; of: WeightAt } | { coherent: false; total: number } {
  const { source, causeId } = moving;
  if (source.kind === 'compound') {
    const own = Object.hasOwn(weights, source.rule.name) ? weights[source.rule.name] : source.rule.rule.weights[causeId];
    const rule: CompiledRule = { ...source.rule, nats: [natsOf(own ?? 0)] };
    return {
      coherent: true,
      of: (used) => {
        const reliability = rule.checkIds.reduce((product, id) => product * (used.find(({ check }) => check.id === id)?.finding.reliability ?? 1), 1);
        return compoundNats(rule, reliability)[0] ?? 0;
      },
    };
  }
  const row = rowOf(source.check, causeId, weights);
  if (!row.coherent) return row;
  return {
    coherent: true,
    of: (used) => {
      const found = used.find(({ check }) => check === source.check);
      if (!found) return 0;
      const { states, finding } = found;
      return evidenceNats(states.map(({ index }) => row.nats[index] ?? 0), states.map(({ share }) => share), finding.reliability);
    },
  };
}

/** The rest of the group for the cause: what the moving weight is attenuated beside. */
export interface Beside {
  /** Sizes of the weights for and against, nats, largest first. */
  for: number[];
  against: number[];
  /** S of the cause without the moving evidence, nats. */
  score: number;
}

/** Takes the moving evidence out of a case. */
export function withoutMoving({ compiled, cause, group }: Moving, item: EvidenceItem, { items, scores }: PreparedCase): Beside {
  const others = items.filter((other) => other !== item && other.group.id === group.id).map((other) => other.nats[cause] ?? 0);
  const sizes = (sign: 1 | -1) => others.map((weight) => sign * weight).filter((size) => size > 0).sort((a, b) => b - a);
  const beside = { for: sizes(1), against: sizes(-1), score: 0 };
  const was = gainOf(beside, item.nats[cause] ?? 0, group.rho);
  return { ...beside, score: (scores[cause] ?? 0) - compiled.settings.beta * was };
}

/** What a weight adds to its group, attenuated, nats. */
export function gainOf(beside: Omit<Beside, 'score'>, weight: number, rho: number): number {
  if (weight === 0) return 0;
  return weight > 0 ? attenuatedGain(beside.for, weight, rho) : -attenuatedGain(beside.against, -weight, rho);
}
