import { requireAmount, requirePositive } from '../require';

/** A fit, on a scale of days with any beginning. */
export interface FollowedFit {
  readonly fittedOn: number;
  /** When it came back; null when it did not. */
  readonly cameBackOn: number | null;
  /** When it was no longer watched (sold, out of service) without having come back; null while it is. */
  readonly lostOn: number | null;
}

export interface Comebacks {
  readonly horizonDays: number;
  /** Fits that the calendar lets follow for the whole horizon, whatever happened to them: the denominator. */
  readonly of: number;
  readonly count: number;
  /** Of these, lost before the horizon: they may have come back elsewhere. */
  readonly lost: number;
  /** Too recent to say, comebacks among them. */
  readonly tooRecent: number;
}

/**
 * How many fits came back within a horizon, of those that could be followed for all of it. Which could is decided by the
 * calendar alone: were recent fits counted once they have come back, comebacks would seem more than they are.
 *
 * @param today on the same scale of days
 * @throws RangeError for a fit after today, or an end before the fit
 * @example comebacks([{ fittedOn: 0, cameBackOn: 40, lostOn: null }], { today: 100 }) // 1 of 1
 */
export function comebacks(fits: readonly FollowedFit[], { today, horizonDays = 90 }: { today: number; horizonDays?: number }): Comebacks {
  requirePositive(horizonDays, 'A horizon');
  for (const { fittedOn, cameBackOn, lostOn } of fits) {
    requireAmount(today - fittedOn, 'The time since a fit');
    for (const day of [cameBackOn, lostOn]) if (day !== null) requireAmount(day - fittedOn, 'The time from a fit');
  }
  const followed = fits.filter(({ fittedOn }) => fittedOn + horizonDays <= today);
  const within = (fittedOn: number, day: number | null) => day !== null && day - fittedOn <= horizonDays;
  const count = followed.filter(({ fittedOn, cameBackOn }) => within(fittedOn, cameBackOn)).length;
  const lost = followed.filter(({ fittedOn, cameBackOn, lostOn }) => !within(fittedOn, cameBackOn) && lostOn !== null && lostOn - fittedOn < horizonDays).length;
  return { horizonDays, of: followed.length, count, lost, tooRecent: fits.length - followed.length };
}
