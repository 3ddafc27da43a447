import type { FitRow } from '@/db/queries/fit';
import { selectReadings } from '@/db/queries/unit-reading';
import type { Work } from '../define';
import { strikeOut } from '../unit/strike-reading';
import { writeReading, type MeasuredReading } from '../unit/write-reading';

type Moment = 'installed' | 'removed';

/** What a fit says about one of its two days. */
type Columns = Pick<
  FitRow,
  'installedOn' | 'installedOdometerM' | 'installedEngineS' | 'removedOn' | 'removedOdometerM' | 'removedEngineS' | 'asTyped'
>;

type Replaced = { [Flag in `${Moment}${'Odometer' | 'EngineHours'}Replaced`]?: boolean };

/** The day and figures of one of the moments, as a reading of the unit has them. */
const momentOf = (fit: Columns, moment: Moment) =>
  moment === 'installed'
    ? { readOn: fit.installedOn, odometerM: fit.installedOdometerM, engineS: fit.installedEngineS }
    : { readOn: fit.removedOn, odometerM: fit.removedOdometerM, engineS: fit.removedEngineS };

/** Writes the readings of a fit's moments down with the unit, so that there is one history of each instrument. */
export async function writeFitReading(work: Work<unknown>, fit: Columns & { unitId: string }, moment: Moment, replaced: Replaced): Promise<void> {
  const { readOn, odometerM, engineS } = momentOf(fit, moment);
  if (readOn === null) return;
  const asTyped = Object.fromEntries(
    (['odometerM', 'engineS'] as const).flatMap((column) => {
      const text = fit.asTyped[column === 'odometerM' ? `${moment}OdometerM` : `${moment}EngineS`];
      return text === undefined ? [] : [[column, text]];
    }),
  );
  const reading: MeasuredReading = {
    unitId: fit.unitId,
    readOn,
    odometerM,
    engineS,
    asTyped,
    odometerReplaced: replaced[`${moment}OdometerReplaced`] ?? false,
    engineHoursReplaced: replaced[`${moment}EngineHoursReplaced`] ?? false,
    source: 'fit',
    note: null,
  };
  await writeReading(work, reading, { odometer: `${moment}Odometer`, engineHours: `${moment}EngineHours` });
}

/** The reading that was written down with a moment of a fit. */
async function findFitReading({ tx, ctx }: Work<unknown>, fit: FitRow, moment: Moment) {
  const { readOn, odometerM, engineS } = momentOf(fit, moment);
  const readings = await selectReadings(tx, { organisationId: ctx.organisation.id, unitId: fit.unitId });
  return readings.find((row) => row.source === 'fit' && row.readOn === readOn && row.odometerM === odometerM && row.engineS === engineS);
}

/** Readings are never changed: where a moment of a fit was, the old one is struck out and a new one written. */
export async function rewriteFitReading(work: Work<unknown>, before: FitRow, next: Columns, moment: Moment, replaced: Replaced): Promise<void> {
  const was = momentOf(before, moment);
  const is = momentOf(next, moment);
  if (was.readOn === is.readOn && was.odometerM === is.odometerM && was.engineS === is.engineS) return;
  const old = await findFitReading(work, before, moment);
  if (old) await strikeOut(work, { readingId: old.id, reason: 'Corrected with its fit' });
  await writeFitReading(work, { ...next, unitId: before.unitId }, moment, {
    [`${moment}OdometerReplaced`]: replaced[`${moment}OdometerReplaced`] || (old?.odometerReplaced && is.odometerM === was.odometerM),
    [`${moment}EngineHoursReplaced`]: replaced[`${moment}EngineHoursReplaced`] || (old?.engineHoursReplaced && is.engineS === was.engineS),
  });
}

/** For a fit that never was: its readings were of another unit too. */
export async function strikeFitReadings(work: Work<unknown>, fit: FitRow): Promise<void> {
  for (const moment of ['installed', 'removed'] as const) {
    const reading = await findFitReading(work, fit, moment);
    if (reading) await strikeOut(work, { readingId: reading.id, reason: 'Removed with its fit' });
  }
}
