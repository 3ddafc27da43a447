import { notEstimable, twoSided, type NotEstimable, type OneSided, type TwoSided } from './result';
import { requireAmount, requireCount, requireShare } from './require';
import { gammaQuantile } from './special/gamma-quantile';

export interface PoissonRate {
  readonly kind: 'estimated';
  /** Failures per unit of exposure. */
  readonly rate: number;
  /** Without failures only an upper limit, at the full confidence on that side. */
  readonly limits: TwoSided | OneSided;
}

/**
 * Garwood's exact limits of a Poisson mean: chi2(a/2; 2x) / 2 and chi2(1 - a/2; 2x + 2) / 2.
 *
 * @see F. Garwood, Biometrika 28, 1936
 * @example garwood(0) // { kind: 'two-sided', lower: 0, upper: 3.689 }
 */
export function garwood(count: number, confidence = 0.95): TwoSided {
  requireCount(count);
  requireShare(confidence, 'A confidence');
  const tail = (1 - confidence) / 2;
  return twoSided(count === 0 ? 0 : gammaQuantile(count, { below: tail }), gammaQuantile(count + 1, { above: tail }));
}

/**
 * A rate of failures: those of an exponential law (failures over time run), of a unit, a cause or a site. Mean time to
 * failure is 1 / rate.
 *
 * @param exposure hours, miles or days; from gaps in an odometer that were filled in, say so where it is shown
 * @returns not estimable without exposure; without failures an upper limit alone: -ln(1 - confidence) / exposure
 * @throws RangeError for a count or exposure that cannot be, or failures without exposure
 * @see NIST/SEMATECH e-Handbook 8.4.5.1
 * @example poissonRate({ count: 12, exposure: 344_440 }).limits // 1.80e-5 to 6.09e-5 per hour
 */
export function poissonRate({ count, exposure, confidence = 0.95 }: { count: number; exposure: number; confidence?: number }): PoissonRate | NotEstimable<'no-exposure'> {
  requireAmount(exposure, 'An exposure');
  requireCount(count);
  if (exposure === 0) {
    if (count > 0) throw new RangeError('Failures need an exposure in which they happened.');
    return notEstimable('no-exposure');
  }
  requireShare(confidence, 'A confidence');
  if (count === 0) return { kind: 'estimated', rate: 0, limits: { kind: 'at-most', upper: -Math.log1p(-confidence) / exposure } };
  const { lower, upper } = garwood(count, confidence);
  return { kind: 'estimated', rate: count / exposure, limits: twoSided(lower / exposure, upper / exposure) };
}

/**
 * Failures per million miles.
 *
 * @param miles run, 0 or more
 * @example ratePerMillionMiles({ count: 0, miles: 250_000 }) // at most 11.98
 */
export const ratePerMillionMiles = ({ count, miles, confidence }: { count: number; miles: number; confidence?: number }) =>
  poissonRate({ count, exposure: miles / 1e6, confidence });
