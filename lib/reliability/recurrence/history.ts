import { requireAmount } from '../require';

/** One repaired unit: watched from an age to an age, and the ages at which it was repaired. */
export interface History {
  /** 0 or absent when it was watched from new. */
  readonly from?: number;
  readonly until: number;
  /** Any order; two repairs at one visit stand twice. */
  readonly events: readonly number[];
}

/** @throws RangeError for a negative or endless age, or an event when the unit was not watched */
export function requireHistories(histories: readonly History[]): void {
  for (const { from = 0, until, events } of histories) {
    requireAmount(from, 'An age');
    requireAmount(until, 'An age');
    if (until < from) throw new RangeError('A unit was watched to before it was watched from.');
    for (const age of events) {
      requireAmount(age, 'An age');
      if (age > until || (from > 0 && age <= from)) throw new RangeError('An event lies outside the time watched.');
    }
  }
}
