import { lockUnit } from '@/db/queries/unit';
import { insertReading, selectReadings } from '@/db/queries/unit-reading';
import { invalid, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { formatQuantity, unitFor } from '@/lib/units';
import type { Work } from '../define';
import { readMeasure } from '../units-of-measure';
import { findContradiction } from './reading-order';

export interface NewReading {
  unitId: string;
  /** YYYY-MM-DD, a day of the unit's site. */
  readOn: string;
  /** As typed. */
  odometer?: string | null;
  engineHours?: string | null;
  odometerReplaced?: boolean;
  engineHoursReplaced?: boolean;
  /** What it was entered with. */
  source: 'unit' | 'fit' | 'case';
  note?: string | null;
}

export interface NotedReading {
  odometerM: number | null;
  engineS: number | null;
  /** By column name. */
  asTyped: Record<string, string>;
}

/** The two instruments, by what a form calls them. */
const INSTRUMENTS = {
  odometer: { quantity: 'distance', column: 'odometerM', replaced: 'odometerReplaced', called: 'odometer' },
  engineHours: { quantity: 'engineHours', column: 'engineS', replaced: 'engineHoursReplaced', called: 'hour meter' },
} as const;

type Field = keyof typeof INSTRUMENTS;

/**
 * Writes down odometer and engine hours of a unit on a day, within a service's transaction; null when neither was
 * given.
 *
 * @param fields what the form calls the two, where it isn't `odometer` and `engineHours`
 * @throws AppError "invalid" beside the field when it can't be read, or when it contradicts the readings before and
 *   after and nobody said that the instrument was replaced
 */
export async function noteReading(
  { tx, ctx, audit }: Work<unknown>,
  reading: NewReading,
  fields: Record<Field, string> = { odometer: 'odometer', engineHours: 'engineHours' },
): Promise<NotedReading | null> {
  const { unitId, readOn, source, note } = reading;
  const noted: NotedReading = { odometerM: null, engineS: null, asTyped: {} };
  const given = (['odometer', 'engineHours'] as const).filter((field) => reading[field]?.trim());
  if (given.length === 0) return null;

  const organisationId = ctx.organisation.id;
  if (!(await lockUnit(tx, { organisationId, unitId }))) throw notFound('unit');
  const earlier = await selectReadings(tx, { organisationId, unitId });
  const problems: Record<string, string> = {};
  for (const field of given) {
    const { quantity, column, replaced, called } = INSTRUMENTS[field];
    const read = readMeasure(ctx, reading[field] ?? '', { quantity });
    if (!read.ok) {
      problems[fields[field]] = read.message;
      continue;
    }
    const { si, asTyped } = read;
    const series = earlier.map((row) => ({ readOn: row.readOn, value: row[column], replaced: row[replaced] }));
    const contradicted = findContradiction(series, { readOn, value: si, replaced: reading[replaced] ?? false });
    if (contradicted) {
      const shown = formatQuantity(contradicted.value ?? 0, { quantity, unit: unitFor(ctx.person.units, quantity) });
      problems[fields[field]] =
        contradicted.readOn <= readOn
          ? `The record has ${shown} on ${contradicted.readOn}. If the ${called} was replaced since, say so.`
          : `The record has only ${shown} later, on ${contradicted.readOn}. Check the date and the figure.`;
    }
    noted[column] = si;
    noted.asTyped[column] = asTyped;
  }
  if (Object.keys(problems).length > 0) throw invalid(problems);

  const row = {
    ...noted,
    unitId,
    readOn,
    odometerReplaced: noted.odometerM !== null && (reading.odometerReplaced ?? false),
    engineHoursReplaced: noted.engineS !== null && (reading.engineHoursReplaced ?? false),
    source,
    note: note || null,
  };
  const id = newId(ctx.now().getTime());
  await insertReading(tx, { ...row, organisationId, id, createdBy: ctx.person.id, createdAt: ctx.now() });
  audit({ entity: 'unit-reading', entityId: id, changed: row });
  return noted;
}
