import { requireProbability } from '../require';
import { gammaQuantile } from './gamma-quantile';
import { incompleteGamma, type Tails } from './incomplete-gamma';

/**
 * Tails of the standard normal distribution, from the incomplete gamma function of shape 1/2.
 *
 * @example normalTails(1.959963984540054).upper // 0.025
 */
export function normalTails(z: number): Tails {
  const { upper, lower } = incompleteGamma(0.5, (z * z) / 2);
  const [outer, inner] = [upper / 2, 0.5 + lower / 2];
  return z >= 0 ? { lower: inner, upper: outer } : { lower: outer, upper: inner };
}

/** P(|Z| > |z|). @example twoSidedP(1.959963984540054) // 0.05 */
export const twoSidedP = (z: number): number => incompleteGamma(0.5, (z * z) / 2).upper;

/**
 * Quantile of the standard normal distribution.
 *
 * @param below above 0 and below 1
 * @throws RangeError
 * @example normalQuantile(0.975) // 1.959963984540054
 */
export function normalQuantile(below: number): number {
  requireProbability(below);
  if (below === 0 || below === 1) throw new RangeError('The normal distribution has no ends.');
  if (below === 0.5) return 0;
  const size = Math.sqrt(2 * gammaQuantile(0.5, below < 0.5 ? { above: 2 * below } : { above: 2 * (1 - below) }));
  return below < 0.5 ? -size : size;
}
