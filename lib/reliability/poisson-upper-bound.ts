import { gammaQuantile } from './special/gamma-quantile';

/**
 * The highest failure rate that so few failures still allow: chi2(confidence; 2 (count + 1)) / (2 exposure), the mean at
 * which so few or fewer would be seen only with probability 1 - confidence.
 *
 * @param count failures seen, a whole number from 0
 * @param exposure hours, miles or whatever the rate is per; above zero
 * @param confidence one-sided, above 0 and below 1
 * @returns failures per unit of exposure
 * @throws RangeError
 * @see F. Garwood, Biometrika 28, 1936
 * @example poissonUpperBound({ count: 0, exposure: 1000, confidence: 0.9 }) // 0.0023
 */
export function poissonUpperBound({ count, exposure, confidence }: { count: number; exposure: number; confidence: number }): number {
  if (!(Number.isSafeInteger(count) && count >= 0)) throw new RangeError('A count is a whole number, 0 or more.');
  if (!(exposure > 0) || !(confidence > 0 && confidence < 1)) throw new RangeError('A bound needs an exposure and a confidence.');
  return gammaQuantile(count + 1, { above: 1 - confidence }) / exposure;
}
