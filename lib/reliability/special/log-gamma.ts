const LOG_SQRT_2_PI = 0.9189385332046727;
const ASYMPTOTIC_FROM = 15;

/** ln G(x) - Stirling's (x - 1/2) ln x - x + ln sqrt(2 pi), for x of 15 or more: Bernoulli's numbers over x. */
function tail(x: number): number {
  const y = 1 / (x * x);
  return (1 / 12 - y * (1 / 360 - y * (1 / 1260 - y * (1 / 1680 - y * (1 / 1188 - (y * 691) / 360360))))) / x;
}

/**
 * ln of the gamma function: Stirling's series from 15 on, by the recurrence below.
 *
 * @param x above 0
 * @throws RangeError
 * @see Abramowitz and Stegun 6.1.41
 * @example logGamma(5) // ln 24 = 3.178…
 */
export function logGamma(x: number): number {
  if (!(x > 0 && x < Infinity)) throw new RangeError('The gamma function is taken above 0.');
  let shifted = x;
  let product = 1;
  while (shifted < ASYMPTOTIC_FROM) {
    product *= shifted;
    shifted += 1;
  }
  return (shifted - 0.5) * Math.log(shifted) - shifted + LOG_SQRT_2_PI + tail(shifted) - Math.log(product);
}

/** ln n! less Stirling's ln(sqrt(2 pi n) (n/e)^n): what is left is small, and so exact for a large n. */
export function stirlingError(n: number): number {
  return n >= ASYMPTOTIC_FROM ? tail(n) : logGamma(n + 1) - (n + 0.5) * Math.log(n) + n - LOG_SQRT_2_PI;
}

/** x ln(x / mean) + mean - x, without cancellation where x is near the mean. */
export function deviance(x: number, mean: number): number {
  const difference = x - mean;
  if (Math.abs(difference) >= 0.1 * (x + mean)) return x * Math.log(x / mean) + mean - x;
  const v = difference / (x + mean);
  let sum = difference * v;
  let term = 2 * x * v;
  for (let j = 1; j < 1000; j += 1) {
    term *= v * v;
    const next = sum + term / (2 * j + 1);
    if (next === sum) break;
    sum = next;
  }
  return sum;
}

/**
 * x^a e^-x / G(a + 1): a Poisson probability for a whole a. By its deviance from the saddle point, which stays exact where
 * a and x are large.
 *
 * @param a 0 or more
 * @param x 0 or more
 * @see C. Loader, Fast and Accurate Computation of Binomial Probabilities, 2000
 */
export function poissonTerm(a: number, x: number): number {
  if (x === 0) return a === 0 ? 1 : 0;
  if (a === 0) return Math.exp(-x);
  if (a < 1) return Math.exp(a * Math.log(x) - x - logGamma(a + 1));
  return Math.exp(-stirlingError(a) - deviance(a, x)) / Math.sqrt(2 * Math.PI * a);
}

/**
 * G(n+1) / (G(a+1) G(n-a+1)) x^a (1-x)^(n-a): a binomial probability for whole numbers, by the same deviances.
 *
 * @param complement 1 - x, handed in because it may be smaller than what subtraction leaves
 * @see C. Loader 2000
 */
export function binomialTerm(a: number, n: number, x: number, complement: number): number {
  if (x === 0) return a === 0 ? 1 : 0;
  if (complement === 0) return a === n ? 1 : 0;
  const b = n - a;
  if (a === 0) return Math.exp(n * (x < 0.5 ? Math.log1p(-x) : Math.log(complement)));
  if (b === 0) return Math.exp(n * (complement < 0.5 ? Math.log1p(-complement) : Math.log(x)));
  const logarithm = stirlingError(n) - stirlingError(a) - stirlingError(b) - deviance(a, n * x) - deviance(b, n * complement);
  return Math.exp(logarithm) * Math.sqrt(n / (2 * Math.PI * a * b));
}
