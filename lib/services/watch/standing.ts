import type { Transaction } from '@/db/connect';
import { selectWatchReadings, type WatchReadingRow, type WatchRow } from '@/db/queries/watch';
import { siteDay } from '@/lib/case/site-day';
import { measureUnit } from '@/lib/schemas/measures';
import { ODOMETER } from '@/lib/schemas/watch';
import { formatQuantity, type Quantity, type UnitPreferences } from '@/lib/units';
import { dueReadings, type Read, type ReadingDue, type Watched } from '@/lib/watch';

/** A watch as lib/watch takes it. */
export const watchedOf = ({ plan, startedAt, odometerM }: Pick<WatchRow, 'plan' | 'startedAt' | 'odometerM'>, timeZone: string): Watched => ({ plan, startedOn: siteDay(startedAt, timeZone), startOdometerM: odometerM });

/** A distance of a watch, as somebody reads it. @param metres m */
export const distanceTextFor = (units: UnitPreferences) => (metres: number): string => formatQuantity<Quantity>(metres, { quantity: ODOMETER.quantity, unit: measureUnit(units, ODOMETER) });

/** The readings that stand, oldest first. */
export const standingReads = (rows: readonly WatchReadingRow[], timeZone: string): Read[] =>
  rows.filter(({ row }) => row.takenBackAt === null).map(({ row }) => ({ checkId: row.checkId, onDay: siteDay(row.at, timeZone), inOrder: row.verdict === 'in-order', odometerM: row.odometerM }));

/** What of a watch is due, by its readings that stand. @param today of the site */
export async function dueOfWatch(tx: Transaction, watch: WatchRow, { timeZone, today }: { timeZone: string; today: string }): Promise<ReadingDue[]> {
  const readings = await selectWatchReadings(tx, { organisationId: watch.organisationId, watchId: watch.id });
  return dueReadings(watchedOf(watch, timeZone), standingReads(readings, timeZone), { today });
}
