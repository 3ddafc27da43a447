/** Laws of counts that a rulebook's pages quote beside what was learned. */
import { betaQuantile } from '@/lib/reliability/special/incomplete-beta';
import { normalQuantile } from '@/lib/reliability/special/normal';

/** Two-sided 95 %. */
export const Z_95 = normalQuantile(0.975);

export interface Interval {
  low: number;
  high: number;
}

/**
 * Central 95 % of a beta distribution: what counts leave open of one share.
 *
 * @param alpha,total as in a Dirichlet distribution, 0 < alpha < total
 * @throws RangeError
 * @example shareInterval({ alpha: 8, total: 12 }) // 0.390 to 0.891
 */
export function shareInterval({ alpha, total }: { alpha: number; total: number }): Interval {
  return { low: betaQuantile(alpha, total - alpha, 0.025), high: betaQuantile(alpha, total - alpha, 0.975) };
}

/** Cases by truth and answer. */
export interface FourFold {
  /** With the cause: answer given, and not. */
  with: { given: number; not: number };
  /** Without the cause. */
  without: { given: number; not: number };
}

/**
 * Likelihood ratio of an answer with its 95 % interval, on the log scale.
 *
 * @returns undefined where a ratio can't be formed from the counts
 * @see D. L. Simel, G. P. Samsa and D. B. Matchar, Likelihood ratios with confidence, J Clin Epidemiol 44(8), 1991
 * @example likelihoodRatio({ with: { given: 731, not: 78 }, without: { given: 270, not: 1500 } })?.ratio // 5.92
 */
export function likelihoodRatio(counts: FourFold): { ratio: number; standardErrorNats: number; interval: Interval } | undefined {
  const { given: a, not: c } = counts.with;
  const { given: b, not: d } = counts.without;
  if (a === 0 || b === 0) return undefined;
  const ratio = a / (a + c) / (b / (b + d));
  const standardErrorNats = Math.sqrt(1 / a - 1 / (a + c) + 1 / b - 1 / (b + d));
  const reach = Math.exp(Z_95 * standardErrorNats);
  return { ratio, standardErrorNats, interval: { low: ratio / reach, high: ratio * reach } };
}

/**
 * Chance that the next proved case has a cause that was never seen: causes seen once over cases.
 *
 * @returns [0, 1]; undefined without cases
 * @see I. J. Good, The population frequencies of species and the estimation of population parameters, Biometrika 40, 1953
 * @example unseenShare(['a', 'a', 'b']) // 1 of 3
 */
export function unseenShare(causes: readonly string[]): number | undefined {
  if (causes.length === 0) return undefined;
  const times = new Map<string, number>();
  for (const cause of causes) times.set(cause, (times.get(cause) ?? 0) + 1);
  return [...times.values()].filter((seen) => seen === 1).length / causes.length;
}
