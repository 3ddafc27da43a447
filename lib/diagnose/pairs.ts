/** Two causes at once: a secondary view, offered when one cause alone explains the findings clearly worse. */
import { attenuationFactors } from './attenuation';
import type { CompiledCheck, CompiledRulebook } from './compiled';
import { evidenceNats } from './contributions';
import { decibansOf } from './decibans';
import { evidenceItems, firedByPredicates, type EvidenceItem } from './evidence';
import { byCodeUnits } from './order';
import { inhibition, noisyOr } from './pairs-noisy-or';
import { rank, type RankOptions } from './rank';
import { NORMAL_CARRYOVER, SOMETHING_ELSE, type Finding } from './types';
import { usedFindings, type UsedFinding } from './used-findings';

export interface PairOfCauses {
  /** In the order of ids. */
  causeIds: readonly [string, string];
  /** ln pi_i + ln pi_j + what the findings count for both together, nats; comparable with a single cause's score. */
  scoreNats: number;
  /** How far it is ahead of the best single cause, decibans; below 0 behind it. */
  aheadDecibans: number;
}

export interface PairsOfCauses {
  /** True when the best pair beats the best single cause by 3 dB or more. */
  offered: boolean;
  bestSingle: string;
  /** Best first, five at most. */
  pairs: PairOfCauses[];
}

/** By how much the best pair must beat the best single cause, decibans. */
export const OFFERED_FROM_DECIBANS = 3;
const SHOWN = 5;

/**
 * Scores every two causes at once and compares the best with the best single cause.
 *
 * A check of two answers is a sign that is present or absent: leaky noisy-OR, with the sign's background rate for its
 * leak. For any other check, and for compound rules, the answer is taken to come from either cause alike:
 * W = ln((e^{W_i} + e^{W_j}) / 2), so that a pair never gains by it over the better of the two. Groups and beta count
 * as for single causes. Never paired: "nothing to repair" and "something else".
 *
 * @param compiled the rulebook
 * @param findings current findings, as for `rank`
 * @param options as for `rank`
 * @returns the best pairs and whether they are worth showing
 * @throws FindingError as `rank` does
 * @see Pearl (1988), section 4.3.2, and Henrion (1989) for the leak
 * @example rankPairs(compiled, findings).pairs[0]?.causeIds
 */
export function rankPairs(
  compiled: CompiledRulebook,
  findings: readonly Finding[],
  options: RankOptions = {},
): PairsOfCauses {
  const used = usedFindings(compiled, findings, options.stages);
  const items = evidenceItems(compiled, used, firedByPredicates(compiled, used));
  const { causes } = rank(compiled, findings, options);
  const [best] = causes;
  const bestScore = best?.scoreNats ?? -Infinity;
  const logPrior = new Map(causes.map(({ causeId, prior }) => [causeId, Math.log(prior)]));
  const pairable = compiled.causeIds.flatMap((id, c) => (id === NORMAL_CARRYOVER || id === SOMETHING_ELSE ? [] : [{ id, c }]));
  const byCheck = new Map(used.map((each) => [each.check.id, each]));
  const signs = items.map((item) => signOf(item, byCheck));

  const pairs = pairable.flatMap((a, n) => pairable.slice(n + 1).map((b): PairOfCauses => {
    const weights = items.map((item, i) => signs[i]?.(a.c, b.c) ?? fromEither(item.nats[a.c] ?? 0, item.nats[b.c] ?? 0));
    const evidence = compiled.settings.beta * attenuatedSum(items, weights);
    const scoreNats = (logPrior.get(a.id) ?? 0) + (logPrior.get(b.id) ?? 0) + evidence;
    return { causeIds: [a.id, b.id], scoreNats, aheadDecibans: decibansOf(scoreNats - bestScore) };
  }));
  pairs.sort((x, y) => y.scoreNats - x.scoreNats || byCodeUnits(x.causeIds.join(), y.causeIds.join()));
  return {
    offered: (pairs[0]?.aheadDecibans ?? -Infinity) >= OFFERED_FROM_DECIBANS,
    bestSingle: best?.causeId ?? '',
    pairs: pairs.slice(0, SHOWN),
  };
}

/** ln of the mean of two ratios, for an answer that either cause may have given. */
function fromEither(a: number, b: number): number {
  const top = Math.max(a, b);
  return top + Math.log((Math.exp(a - top) + Math.exp(b - top)) / 2);
}

/** W of both causes for a finding of a two-answer check; undefined for any other item. */
function signOf(item: EvidenceItem, byCheck: ReadonlyMap<string, UsedFinding>) {
  const used = item.kind === 'table' ? byCheck.get(item.checkIds[0] ?? '') : undefined;
  if (!used || used.check.stateIds.length !== 2) return undefined;
  const { check, states, finding } = used;
  const present = presentState(check);
  const leak = check.backgrounds[present] ?? 0;
  const given = (cause: number): number => leak * Math.exp(check.table[present]?.[cause] ?? 0);
  const shares = states.map(({ share }) => share);
  return (a: number, b: number): number => {
    const both = noisyOr(leak, [inhibition(given(a), leak), inhibition(given(b), leak)]);
    const nats = states.map(({ index }) => Math.log(index === present ? both / leak : Math.max(Number.MIN_VALUE, 1 - both) / (1 - leak)));
    return evidenceNats(nats, shares, finding.reliability);
  };
}

/** The answer that means the sign is there: one called so, else the rarer one. */
function presentState(check: CompiledCheck): number {
  const named = check.stateIds.findIndex((id) => id === 'present' || id === 'yes');
  if (named >= 0) return named;
  return (check.backgrounds[0] ?? 0) <= (check.backgrounds[1] ?? 0) ? 0 : 1;
}

function attenuatedSum(items: readonly EvidenceItem[], weights: readonly number[]): number {
  const groups = new Map<string, { rho: number; weights: number[] }>();
  items.forEach(({ group }, i) => {
    const weight = weights[i] ?? 0;
    const known = groups.get(group.id);
    if (known) known.weights.push(weight);
    else groups.set(group.id, { rho: group.rho, weights: [weight] });
  });
  let sum = 0;
  for (const { rho, weights: own } of groups.values()) {
    attenuationFactors(own, rho).forEach((factor, i) => (sum += factor * (own[i] ?? 0)));
  }
  return sum;
}
