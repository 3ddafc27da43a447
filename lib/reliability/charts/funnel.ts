import { requireAmount, requirePositive } from '../require';
import { negativeBinomialQuantile, poissonQuantile } from '../special/counts';
import type { Exposed } from '../repeats/exposed';

/** One-sided probabilities of the two pairs of limits: 95 % and 99.8 %. */
const TAILS = { inner: 0.025, outer: 0.001 } as const;

export interface FunnelLimits {
  readonly exposure: number;
  /** As counts; over exposure, as rates. */
  readonly inner: { readonly lower: number; readonly upper: number };
  readonly outer: { readonly lower: number; readonly upper: number };
}

/**
 * Limits of a funnel plot at an exposure: counts that units at the fleet's rate stay within.
 *
 * @param rate of the fleet
 * @param shape of the gamma distribution by which units' rates vary; absent for an even fleet
 * @throws RangeError
 * @see D. J. Spiegelhalter, Statistics in Medicine 24, 2005
 * @example funnelLimits({ rate: 0.214, exposure: 10.48 }).outer // 0 to 8
 */
export function funnelLimits({ rate, exposure, shape }: { rate: number; exposure: number; shape?: number }): FunnelLimits {
  requireAmount(rate, 'A rate');
  requirePositive(exposure, 'An exposure');
  const mean = rate * exposure;
  const quantile = (below: number) => (shape === undefined ? poissonQuantile(below, mean) : negativeBinomialQuantile(below, { shape, mean }));
  const pair = (tail: number) => ({ lower: quantile(tail), upper: quantile(1 - tail) });
  return { exposure, inner: pair(TAILS.inner), outer: pair(TAILS.outer) };
}

/** On which side of the outer limits a unit lies, if on either. @throws RangeError for a unit without exposure */
export function outsideFunnel({ count, exposure }: Exposed, fleet: { rate: number; shape?: number }): 'above' | 'below' | null {
  const { outer } = funnelLimits({ ...fleet, exposure });
  return count > outer.upper ? 'above' : count < outer.lower ? 'below' : null;
}
