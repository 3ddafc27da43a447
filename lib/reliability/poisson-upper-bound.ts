/** P(N <= count) of a Poisson distribution. */
function cumulative(count: number, mean: number): number {
  let term = Math.exp(-mean);
  let sum = term;
  for (let n = 1; n <= count; n += 1) {
    term *= mean / n;
    sum += term;
  }
  return sum;
}

/**
 * The highest failure rate that so few failures still allow: chi2(confidence; 2 (count + 1)) / (2 exposure), found as the
 * mean at which so few or fewer would be seen only with probability 1 - confidence.
 *
 * @param count failures seen, a whole number from 0 to 500
 * @param exposure hours, miles or whatever the rate is per; above zero
 * @param confidence one-sided, above 0 and below 1
 * @returns failures per unit of exposure
 * @throws RangeError
 * @see F. Garwood, Biometrika 28, 1936
 * @example poissonUpperBound({ count: 0, exposure: 1000, confidence: 0.9 }) // 0.0023
 */
export function poissonUpperBound({ count, exposure, confidence }: { count: number; exposure: number; confidence: number }): number {
  if (!(Number.isInteger(count) && count >= 0 && count <= 500)) throw new RangeError('A count is a whole number from 0 to 500.');
  if (!(exposure > 0) || !(confidence > 0 && confidence < 1)) throw new RangeError('A bound needs an exposure and a confidence.');
  let [low, high] = [0, count + 1];
  while (cumulative(count, high) > 1 - confidence) high *= 2;
  for (let halvings = 0; halvings < 200 && high - low > 1e-15 * high; halvings += 1) {
    const middle = (low + high) / 2;
    if (cumulative(count, middle) > 1 - confidence) low = middle;
    else high = middle;
  }
  return (low + high) / 2 / exposure;
}
