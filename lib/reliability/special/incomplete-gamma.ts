import { poissonTerm } from './log-gamma';

/** Both tails of a distribution: each is right where it is small, where 1 less the other would not be. */
export interface Tails {
  readonly lower: number;
  readonly upper: number;
}

/** How many terms are needed grows with sqrt(a), about 8.5 of them. */
const mostTerms = (a: number) => 500 + 20 * Math.sqrt(a);
const TINY = 1e-300;

/**
 * Regularised incomplete gamma functions P(a, x) and Q(a, x): the tails of a gamma distribution of rate 1. Series below
 * x = a + 1, continued fraction above.
 *
 * @param a shape, above 0
 * @param x 0 or more
 * @throws RangeError
 * @see Abramowitz and Stegun 6.5.29, 6.5.31; Lentz's method for the fraction
 * @example incompleteGamma(1, 2).upper // exp(-2) = 0.1353…
 */
export function incompleteGamma(a: number, x: number): Tails {
  if (!(a > 0 && a < Infinity && x >= 0)) throw new RangeError('The incomplete gamma function is taken for a shape above 0 from 0 on.');
  if (x === 0) return { lower: 0, upper: 1 };
  if (x === Infinity) return { lower: 1, upper: 0 };
  const prefix = poissonTerm(a, x);
  if (prefix === 0) return x < a ? { lower: 0, upper: 1 } : { lower: 1, upper: 0 };
  if (x < a + 1) {
    const lower = Math.min(1, prefix * series(a, x));
    return { lower, upper: 1 - lower };
  }
  const upper = Math.min(1, prefix * a * fraction(a, x));
  return { lower: 1 - upper, upper };
}

function series(a: number, x: number): number {
  let term = 1;
  let sum = 1;
  const most = mostTerms(a);
  for (let n = 1; n < most && term > sum * 1e-17; n += 1) {
    term *= x / (a + n);
    sum += term;
  }
  return sum;
}

function fraction(a: number, x: number): number {
  let b = x + 1 - a;
  let c = 1 / TINY;
  let d = 1 / (Math.abs(b) < TINY ? TINY : b);
  let h = d;
  const most = mostTerms(a);
  for (let i = 1; i < most; i += 1) {
    const an = -i * (i - a);
    b += 2;
    d = an * d + b;
    c = b + an / c;
    d = 1 / (Math.abs(d) < TINY ? TINY : d);
    if (Math.abs(c) < TINY) c = TINY;
    h *= d * c;
    if (Math.abs(d * c - 1) < Number.EPSILON) break;
  }
  return h;
}
