import { STATION_IDS, type StationId } from './stations';
import type { Cause, RankedCause, Ranking } from './types';

/**
 * How much of the suspicion sits at each station of the oil path.
 *
 * @param causes the rulebook's causes, which say where each sits
 * @param ranked the ranked causes
 * @returns sum of p by station; "none" holds the causes that sit on no part. All together they sum to 1.
 */
export function suspicionByStation(causes: readonly Cause[], ranked: readonly RankedCause[]): Ranking['suspicion'] {
  const stationOf = new Map(causes.map((cause) => [cause.id, cause.station]));
  const places: readonly (StationId | 'none')[] = [...STATION_IDS, 'none'];
  const sumAt = (place: StationId | 'none') =>
    ranked.filter(({ causeId }) => (stationOf.get(causeId) ?? 'none') === place).reduce((sum, { p }) => sum + p, 0);
  return Object.fromEntries(places.map((place) => [place, sumAt(place)])) as Ranking['suspicion'];
}
