/** Shares of answers learned from counts, with what was believed before. */
import { digamma, trigamma } from '@/lib/reliability/special/digamma';

/** A Dirichlet distribution over the answers of a check: what is believed of their shares. */
export interface Dirichlet {
  /** Of each answer, above 0. */
  alphas: readonly number[];
  /** Their sum. */
  total: number;
}

/**
 * Belief after counting: what was believed counts as m cases.
 *
 * @param counts cases with each answer; parts of cases where an answer was unsure
 * @param shares theta0, what was believed of each answer's share, above 0, summing to 1
 * @param m how many cases that belief is worth, above 0
 * @returns alphas n_v + m theta0_v
 * @throws RangeError when m or a share isn't above 0
 * @example believed([3, 1], [0.5, 0.5], 4) // alphas 5 and 3
 */
export function believed(counts: readonly number[], shares: readonly number[], m: number): Dirichlet {
  if (!(m > 0)) throw new RangeError(`m: expected more than 0, got ${m}`);
  const alphas = shares.map((share, answer) => {
    if (!(share > 0)) throw new RangeError(`a share of an answer: expected more than 0, got ${share}`);
    return (counts[answer] ?? 0) + m * share;
  });
  return { alphas, total: alphas.reduce((a, b) => a + b, 0) };
}

/**
 * theta = (n_v + m theta0_v) / (n + m), the mean share of each answer.
 *
 * @example meanShares({ alphas: [5, 3], total: 8 }) // [0.625, 0.375]
 */
export const meanShares = ({ alphas, total }: Dirichlet): number[] => alphas.map((alpha) => alpha / total);

/** A share of one answer, or of several together, as a part of a Dirichlet distribution: a beta variable. */
export interface ShareBelief {
  alpha: number;
  total: number;
}

/** What a weight is believed to be, nats. */
export interface WeightBelief {
  mean: number;
  standardDeviation: number;
}

/**
 * Belief about w = ln(theta / b).
 *
 * Mean psi(a) - psi(A) - [psi(beta) - psi(B)]; variance psi'(a) - psi'(A), and of the background likewise.
 *
 * @param share theta, the share of the answer with the cause
 * @param background b: a share believed likewise, or a rate that is taken as it stands
 * @returns nats
 * @see Johnson, Kotz and Balakrishnan, Continuous Univariate Distributions 2 (1995), chapter 25, for ln of a beta variable
 * @example weightBelief({ alpha: 8, total: 12 }, { alpha: 3, total: 22 }) // mean 1.718, standard deviation 0.628
 */
export function weightBelief(share: ShareBelief, background: ShareBelief | { rate: number }): WeightBelief {
  const own = logShare(share);
  const other = 'rate' in background ? { mean: Math.log(background.rate), variance: 0 } : logShare(background);
  return { mean: own.mean - other.mean, standardDeviation: Math.sqrt(own.variance + other.variance) };
}

function logShare({ alpha, total }: ShareBelief): { mean: number; variance: number } {
  return { mean: digamma(alpha) - digamma(total), variance: trigamma(alpha) - trigamma(total) };
}
