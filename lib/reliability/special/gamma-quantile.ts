import { requireProbability, requirePositive } from '../require';
import { incompleteGamma } from './incomplete-gamma';
import { rootBetween } from './root';

/** A probability below a quantile, or above it: whichever is known without subtracting from 1. */
export type Tail = { readonly below: number } | { readonly above: number };

/**
 * Quantile of a gamma distribution of rate 1. Found on logarithms of the value and of the smaller tail, on which the tail is
 * nearly straight.
 *
 * @param shape above 0
 * @returns 0 for a probability below of 0
 * @throws RangeError also for a probability below of 1, at which there is no quantile
 * @example gammaQuantile(1, { above: 0.05 }) // -ln 0.05 = 2.9957…
 */
export function gammaQuantile(shape: number, tail: Tail): number {
  requirePositive(shape, 'A shape');
  const given = 'below' in tail ? tail.below : tail.above;
  requireProbability(given);
  const [below, above] = 'below' in tail ? [given, 1 - given] : [1 - given, given];
  if (below === 0) return 0;
  if (above === 0) throw new RangeError('No quantile has nothing above it.');
  const side = below <= above ? 'lower' : 'upper';
  const aim = Math.log(side === 'lower' ? below : above);
  const off = (u: number) => {
    const there = incompleteGamma(shape, Math.exp(u))[side];
    // Outside the range of doubles the sign alone counts.
    const gap = (there > 0 ? Math.log(there) : -800) - aim;
    return side === 'lower' ? gap : -gap;
  };
  const start = Math.log(guess(shape, below, above));
  let [low, high, step] = [start, start, 0.5 / Math.sqrt(shape)];
  for (; off(low) > 0; step *= 2) low -= step;
  for (step = 0.5 / Math.sqrt(shape); off(high) < 0; step *= 2) high += step;
  return Math.exp(rootBetween(off, low, high) ?? start);
}

/** Wilson and Hilferty's cube; for small shapes and probabilities, the first term of the series. */
function guess(shape: number, below: number, above: number): number {
  const z = roughNormal(below, above);
  const cube = 1 - 1 / (9 * shape) + z / (3 * Math.sqrt(shape));
  return cube > 0.2 ? shape * cube ** 3 : Math.max(1e-300, below ** (1 / shape) * Math.max(shape, 0.1));
}

/** Good to two digits, a place to start from. */
function roughNormal(below: number, above: number): number {
  const t = Math.sqrt(-2 * Math.log(Math.min(below, above)));
  const z = t - (2.30753 + 0.27061 * t) / (1 + t * (0.99229 + t * 0.04481));
  return below < above ? -z : z;
}

/**
 * Quantile of chi-squared.
 *
 * @param degrees of freedom, above 0
 * @example chiSquaredQuantile(2, { above: 0.05 }) // 5.9915
 */
export const chiSquaredQuantile = (degrees: number, tail: Tail): number => 2 * gammaQuantile(degrees / 2, tail);

/**
 * Tails of chi-squared.
 *
 * @example chiSquaredTails(3.841459, 1).upper // 0.05
 */
export const chiSquaredTails = (value: number, degrees: number) => incompleteGamma(degrees / 2, value / 2);
