import { STATION_IDS, type StationId } from '@/lib/diagnose/stations';

/** A station, or what sits on no part. */
export type Place = StationId | 'none';
export const PLACES: readonly Place[] = [...STATION_IDS, 'none'];

/**
 * Shares as whole percents that add up to 100 as printed: each is rounded down, and what is missing goes to those that
 * lost most by it (largest remainder).
 *
 * @param shares from 0 to 1, together 1
 * @example wholePercents({ dryer: 0.335, none: 0.665, … }) // 34 and 66, never 34 and 67
 */
export function wholePercents(shares: Readonly<Record<Place, number>>): Record<Place, number> {
  const total = PLACES.reduce((sum, place) => sum + shares[place], 0);
  const exact = PLACES.map((place) => ({ place, value: total > 0 ? (shares[place] / total) * 100 : 0 }));
  const missing = Math.round(exact.reduce((sum, { value }) => sum + value - Math.floor(value), 0));
  const lifted = new Set(
    [...exact]
      .sort((a, b) => (b.value % 1) - (a.value % 1))
      .slice(0, missing)
      .map(({ place }) => place),
  );
  return Object.fromEntries(exact.map(({ place, value }) => [place, Math.floor(value) + (lifted.has(place) ? 1 : 0)])) as Record<Place, number>;
}
