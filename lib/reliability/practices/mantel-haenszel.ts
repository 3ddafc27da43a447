import { notEstimable, onLogScale, twoSided, Z_95, type NotEstimable, type OneSided, type TwoSided } from '../result';
import { requireCount } from '../require';
import { chiSquaredTails } from '../special/gamma-quantile';
import type { CountOf } from './risk-difference';

/** With and without a practice, among the like: one model, one band of age. */
export interface Stratum {
  readonly treated: CountOf;
  readonly others: CountOf;
}

export interface MantelHaenszel {
  readonly kind: 'estimated';
  readonly difference: number;
  readonly differenceLimits: TwoSided;
  /** Undefined with its limits where a sum is 0. */
  readonly oddsRatio: number | undefined;
  readonly oddsRatioLimits: TwoSided | OneSided | undefined;
  /** One degree of freedom, without continuity correction. */
  readonly chiSquared: number;
  readonly p: number;
  /** Strata that have both groups: the others say nothing. */
  readonly strata: number;
}

/**
 * Difference in risk and odds ratio over strata, so that what the groups differ in besides the practice cannot make a
 * difference between them.
 *
 * @returns not estimable when no stratum has both groups, or all came out alike in every one
 * @throws RangeError when counts cannot be
 * @see N. Mantel and W. Haenszel 1959; S. Greenland and J. M. Robins 1985 (difference); J. M. Robins, N. Breslow and
 *   S. Greenland 1986 (odds ratio); from memory
 * @example mantelHaenszel([{ treated: { count: 2, of: 17 }, others: { count: 10, of: 13 } }]).oddsRatio // 0.04
 */
export function mantelHaenszel(strata: readonly Stratum[], z = Z_95): MantelHaenszel | NotEstimable<'nothing-to-compare'> {
  let [gap, weight, gapVariance] = [0, 0, 0];
  let [excess, variance] = [0, 0];
  let [r, s, pr, both, qs, compared] = [0, 0, 0, 0, 0, 0];
  for (const { treated, others } of strata) {
    for (const { count, of } of [treated, others]) {
      requireCount(count);
      requireCount(of);
      if (count > of) throw new RangeError('A share is not of fewer than were counted.');
    }
    const [a, c, n1, n0] = [treated.count, others.count, treated.of, others.of];
    if (n1 === 0 || n0 === 0) continue;
    const [b, d, n, m] = [n1 - a, n0 - c, n1 + n0, a + c];
    compared += 1;
    gap += (a * n0 - c * n1) / n;
    weight += (n1 * n0) / n;
    gapVariance += (a * b * n0 ** 3 + c * d * n1 ** 3) / (n1 * n0 * n * n);
    excess += a - (m * n1) / n;
    variance += (m * (n - m) * n1 * n0) / (n * n * (n - 1));
    const [rk, sk, p, q] = [(a * d) / n, (b * c) / n, (a + d) / n, (b + c) / n];
    r += rk;
    s += sk;
    pr += p * rk;
    both += p * sk + q * rk;
    qs += q * sk;
  }
  if (variance === 0) return notEstimable('nothing-to-compare');
  const difference = gap / weight;
  const reach = (z * Math.sqrt(gapVariance)) / weight;
  const oddsRatio = r > 0 && s > 0 ? r / s : undefined;
  const chiSquared = (excess * excess) / variance;
  return {
    kind: 'estimated',
    difference,
    differenceLimits: twoSided(Math.max(-1, difference - reach), Math.min(1, difference + reach)),
    oddsRatio,
    oddsRatioLimits: oddsRatio === undefined ? undefined : onLogScale(oddsRatio, Math.sqrt(pr / (2 * r * r) + both / (2 * r * s) + qs / (2 * s * s)), z),
    chiSquared,
    p: chiSquaredTails(chiSquared, 1).upper,
    strata: compared,
  };
}
