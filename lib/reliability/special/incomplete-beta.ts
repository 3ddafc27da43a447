import { requireProbability } from '../require';
import type { Tails } from './incomplete-gamma';
import { binomialTerm } from './log-gamma';
import { rootBetween } from './root';

const TINY = 1e-300;

/**
 * Regularised incomplete beta function I_x(a, b) and its complement, by its continued fraction.
 *
 * @param a above 0
 * @param b above 0
 * @param x 0 to 1
 * @param complement 1 - x, where it is known better than subtraction gives it
 * @throws RangeError
 * @see Abramowitz and Stegun 26.5.8; Lentz's method
 * @example incompleteBeta(2, 3, 0.5).lower // 0.6875
 */
export function incompleteBeta(a: number, b: number, x: number, complement = 1 - x): Tails {
  if (!(a > 0 && b > 0 && a + b < Infinity && x >= 0 && x <= 1)) throw new RangeError('The incomplete beta function is taken from 0 to 1.');
  if (x === 0) return { lower: 0, upper: 1 };
  if (complement === 0) return { lower: 1, upper: 0 };
  const term = binomialTerm(a, a + b, x, complement);
  if (x < (a + 1) / (a + b + 2)) {
    const lower = Math.min(1, ((term * b) / (a + b)) * fraction(a, b, x));
    return { lower, upper: 1 - lower };
  }
  const upper = Math.min(1, ((term * a) / (a + b)) * fraction(b, a, complement));
  return { lower: 1 - upper, upper };
}

const away = (value: number) => (Math.abs(value) < TINY ? TINY : value);

function fraction(a: number, b: number, x: number): number {
  let c = 1;
  let d = 1 / away(1 - ((a + b) * x) / (a + 1));
  let h = d;
  const most = 500 + 20 * Math.sqrt(Math.max(a, b));
  for (let m = 1; m < most; m += 1) {
    const even = (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m));
    d = 1 / away(1 + even * d);
    c = away(1 + even / c);
    h *= d * c;
    const odd = (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1));
    d = 1 / away(1 + odd * d);
    c = away(1 + odd / c);
    h *= d * c;
    if (Math.abs(d * c - 1) < Number.EPSILON) break;
  }
  return h;
}

/**
 * Quantile of a beta distribution.
 *
 * @param below 0 to 1
 * @throws RangeError
 * @example betaQuantile(2, 3, 0.6875) // 0.5
 */
export function betaQuantile(a: number, b: number, below: number): number {
  requireProbability(below);
  if (below === 0 || below === 1) return below;
  // On the logit a value near either end keeps its digits.
  const at = (logit: number) => {
    const odds = Math.exp(-Math.abs(logit));
    const [small, large] = [odds / (1 + odds), 1 / (1 + odds)];
    const { lower, upper } = logit < 0 ? incompleteBeta(a, b, small, large) : incompleteBeta(a, b, large, small);
    return below <= 0.5 ? lower - below : 1 - below - upper;
  };
  const logit = rootBetween(at, -700, 700);
  if (logit === undefined) throw new RangeError('The quantile is closer to an end than a number can be.');
  return 1 / (1 + Math.exp(-logit));
}
