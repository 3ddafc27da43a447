import { lockUnit } from '@/db/queries/unit';
import { insertReading, selectReadings } from '@/db/queries/unit-reading';
import { invalid, notFound, type FieldErrors } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { dayText } from '@/lib/schemas/day-text';
import { measureUnit } from '@/lib/schemas/measures';
import { formatQuantity, type Quantity } from '@/lib/units';
import type { Work } from '../define';
import { findContradiction } from './reading-order';

export interface MeasuredReading {
  unitId: string;
  /** YYYY-MM-DD, a day of the unit's site. */
  readOn: string;
  odometerM: number | null;
  engineS: number | null;
  odometerReplaced: boolean;
  engineHoursReplaced: boolean;
  /** By column name. */
  asTyped: Record<string, string>;
  /** What it was entered with. */
  source: 'unit' | 'fit' | 'case';
  note: string | null;
}

const INSTRUMENTS = [
  { field: 'odometer', column: 'odometerM', replaced: 'odometerReplaced', quantity: 'distance', called: 'odometer' },
  { field: 'engineHours', column: 'engineS', replaced: 'engineHoursReplaced', quantity: 'engineHours', called: 'hour meter' },
] as const;

/** What a form calls the two figures. */
export interface ReadingFields {
  odometer: string;
  engineHours: string;
}

/**
 * Writes a reading down, within a service's transaction; nothing when it holds neither figure.
 *
 * @throws AppError "invalid" beside the field when a figure contradicts those before and after it and nobody said that
 *   the instrument was replaced
 */
export async function writeReading({ tx, ctx, audit }: Work<unknown>, reading: MeasuredReading, fields: ReadingFields): Promise<void> {
  if (reading.odometerM === null && reading.engineS === null) return;
  const organisationId = ctx.organisation.id;
  if (!(await lockUnit(tx, { organisationId, unitId: reading.unitId }))) throw notFound('unit');

  const others = await selectReadings(tx, { organisationId, unitId: reading.unitId });
  const problems: FieldErrors = {};
  for (const { field, column, replaced, quantity, called } of INSTRUMENTS) {
    const value = reading[column];
    if (value === null) continue;
    const series = others.map((row) => ({ readOn: row.readOn, value: row[column], replaced: row[replaced] }));
    const contradicted = findContradiction(series, { readOn: reading.readOn, value, replaced: reading[replaced] });
    if (!contradicted) continue;
    const shown = formatQuantity<Quantity>(contradicted.value ?? 0, { quantity, unit: measureUnit(ctx.person.units, { quantity }) });
    problems[fields[field]] =
      contradicted.readOn <= reading.readOn
        ? `The record has ${shown} on ${dayText(contradicted.readOn)}. If the ${called} was replaced since, say so.`
        : `The record has only ${shown} later, on ${dayText(contradicted.readOn)}. Check the day and the figure.`;
  }
  if (Object.keys(problems).length > 0) throw invalid(problems);

  const id = newId(ctx.now().getTime());
  const row = {
    ...reading,
    odometerReplaced: reading.odometerReplaced && reading.odometerM !== null,
    engineHoursReplaced: reading.engineHoursReplaced && reading.engineS !== null,
  };
  await insertReading(tx, { ...row, organisationId, id, createdBy: ctx.person.id, createdAt: ctx.now() });
  audit({ entity: 'unit-reading', entityId: id, changed: row });
}
