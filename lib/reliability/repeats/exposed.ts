import { requireAmount, requireCount } from '../require';
import { notEstimable, type NotEstimable } from '../result';

/** A unit's failures, and what it ran or how long it was watched. */
export interface Exposed {
  readonly count: number;
  /** Miles, hours or days, all units alike. 0: never ran; such a unit is compared with nothing. */
  readonly exposure: number;
}

/** @throws RangeError for what is no count or exposure, or failures without exposure */
export function requireExposed(units: readonly Exposed[]): void {
  for (const { count, exposure } of units) {
    requireCount(count);
    requireAmount(exposure, 'An exposure');
    if (exposure === 0 && count > 0) throw new RangeError('Failures need an exposure in which they happened.');
  }
}

export function totalOf(units: readonly Exposed[]): Exposed {
  return units.reduce((sum, { count, exposure }) => ({ count: sum.count + count, exposure: sum.exposure + exposure }), { count: 0, exposure: 0 });
}

/** Failures of all over exposure of all. */
export function fleetRate(units: readonly Exposed[]): number | NotEstimable<'no-exposure'> {
  requireExposed(units);
  const { count, exposure } = totalOf(units);
  return exposure > 0 ? count / exposure : notEstimable('no-exposure');
}

/** A unit with more than this share of all exposure is compared with the others alone. */
export const LARGE_SHARE = 0.05;

/**
 * Failures that a unit would have at the rate of the fleet. With `leaveOneOut`, a unit that is a large part of the fleet is
 * compared with the rate of the others.
 *
 * @returns one for each unit, in order; 0 for a unit without exposure
 * @throws RangeError
 * @example expectedCounts([{ count: 4, exposure: 1 }, { count: 0, exposure: 3 }]) // [1, 3]
 */
export function expectedCounts(units: readonly Exposed[], { leaveOneOut = false }: { leaveOneOut?: boolean } = {}): number[] {
  requireExposed(units);
  const all = totalOf(units);
  return units.map(({ count, exposure }) => {
    if (exposure === 0) return 0;
    const others = all.exposure - exposure;
    const alone = leaveOneOut && exposure > LARGE_SHARE * all.exposure && others > 0;
    return exposure * (alone ? (all.count - count) / others : all.count / all.exposure);
  });
}
