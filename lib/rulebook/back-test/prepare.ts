import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import { evidenceItems, firedByPredicates, type EvidenceItem } from '@/lib/diagnose/evidence';
import { posteriorOf } from '@/lib/diagnose/log-sum-exp';
import { priorsFor } from '@/lib/diagnose/priors';
import { attenuationFactors } from '@/lib/diagnose/attenuation';
import { usedFindings, type UsedFinding } from '@/lib/diagnose/used-findings';
import type { ProvedCase } from '../proved-case';

/** A proved case, ranked once and kept open, so that a weight can be moved without ranking it anew. */
export interface PreparedCase {
  id: string;
  /** Index of the proved cause in `compiled.causeIds`. */
  truth: number;
  used: readonly UsedFinding[];
  items: readonly EvidenceItem[];
  /** ln prior by cause, nats. */
  logPriors: Float64Array;
  /** S by cause, nats. */
  scores: Float64Array;
  /** p by cause. */
  posterior: Float64Array;
  /** By check: why it was asked. */
  asked: NonNullable<ProvedCase['asked']>;
}

export interface PreparedCases {
  compiled: CompiledRulebook;
  cases: readonly PreparedCase[];
  /** Cases that this rulebook can't be tried on, since it does not list the cause that was proved. */
  unknownCause: readonly string[];
  /** Findings that this rulebook has no check or no answer for; the cases were ranked without them. */
  unknownFindings: readonly { caseId: string; checkId: string }[];
}

/**
 * Ranks proved cases by the compiled predicates and keeps what moving a weight needs. A rulebook that lacks a check
 * or an answer is tried without that finding; one that lacks the proved cause isn't tried on the case at all. Both are
 * said.
 *
 * @param compiled the rulebook to try
 * @param cases proved cases, each with at most one finding for a check
 * @throws FindingError for shares or a reliability that no rulebook could rank
 * @example prepareCases(compiled, cases).cases[0]?.posterior
 */
export function prepareCases(compiled: CompiledRulebook, cases: readonly ProvedCase[]): PreparedCases {
  const unknownCause: string[] = [];
  const unknownFindings: { caseId: string; checkId: string }[] = [];
  const prepared = cases.flatMap((each): PreparedCase[] => {
    const truth = compiled.causeIndex.get(each.truth);
    if (truth === undefined) {
      unknownCause.push(each.id);
      return [];
    }
    const findings = each.findings.filter(({ checkId, shares }) => {
      const check = compiled.checks.get(checkId);
      const known = check !== undefined && shares.every(({ state }) => check.stateIndex.has(state));
      if (!known) unknownFindings.push({ caseId: each.id, checkId });
      return known;
    });
    const used = usedFindings(compiled, findings);
    const items = evidenceItems(compiled, used, firedByPredicates(compiled, used));
    const logPriors = priorsFor(compiled, each.facts ?? {}).map(Math.log);
    const scores = scoresOf(compiled, items, logPriors);
    return [{ id: each.id, truth, used, items, logPriors, scores, posterior: posteriorOf(scores), asked: each.asked ?? {} }];
  });
  return { compiled, cases: prepared, unknownCause, unknownFindings };
}

/** S of every cause: the arithmetic of `rank`, without its terms. */
function scoresOf({ settings }: CompiledRulebook, items: readonly EvidenceItem[], logPriors: Float64Array): Float64Array {
  const groups = new Map<string, EvidenceItem[]>();
  for (const item of items) {
    const held = groups.get(item.group.id);
    if (held) held.push(item);
    else groups.set(item.group.id, [item]);
  }
  return logPriors.map((logPrior, cause) => {
    let sum = 0;
    for (const members of groups.values()) {
      const weights = members.map((item) => item.nats[cause] ?? 0);
      const factors = attenuationFactors(weights, members[0]?.group.rho ?? 1);
      weights.forEach((weight, index) => (sum += (factors[index] ?? 1) * weight));
    }
    return logPrior + settings.beta * sum;
  });
}
