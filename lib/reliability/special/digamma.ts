const ASYMPTOTIC_FROM = 15;

/**
 * Digamma, psi(x) = d ln G(x) / dx: the mean of ln of a gamma variable of shape x. Its asymptotic series from 15 on, by
 * the recurrence below.
 *
 * @param x above 0
 * @throws RangeError
 * @see Abramowitz and Stegun 6.3.5, 6.3.18
 * @example digamma(1) // -0.5772156649, Euler's constant below 0
 */
export function digamma(x: number): number {
  requireAbove0(x);
  let shifted = x;
  let sum = 0;
  while (shifted < ASYMPTOTIC_FROM) {
    sum += 1 / shifted;
    shifted += 1;
  }
  const y = 1 / (shifted * shifted);
  const series = y * (1 / 12 - y * (1 / 120 - y * (1 / 252 - y * (1 / 240 - y * (1 / 132 - (y * 691) / 32760)))));
  return Math.log(shifted) - 0.5 / shifted - series - sum;
}

/**
 * Trigamma, psi'(x): the variance of ln of a gamma variable of shape x.
 *
 * @param x above 0
 * @throws RangeError
 * @see Abramowitz and Stegun 6.4.6, 6.4.12
 * @example trigamma(1) // pi^2 / 6 = 1.644934067
 */
export function trigamma(x: number): number {
  requireAbove0(x);
  let shifted = x;
  let sum = 0;
  while (shifted < ASYMPTOTIC_FROM) {
    sum += 1 / (shifted * shifted);
    shifted += 1;
  }
  const y = 1 / (shifted * shifted);
  const series = (y / shifted) * (1 / 6 - y * (1 / 30 - y * (1 / 42 - y * (1 / 30 - (y * 5) / 66))));
  return sum + 1 / shifted + y / 2 + series;
}

function requireAbove0(x: number): void {
  if (!(x > 0 && x < Infinity)) throw new RangeError(`psi is taken above 0, got ${x}`);
}
