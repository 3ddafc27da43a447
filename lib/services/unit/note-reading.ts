import { READING_MEASURES } from '@/lib/schemas/measures';
import type { Work } from '../define';
import { readMeasures } from '../units-of-measure';
import { writeReading } from './write-reading';

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

/**
 * Reads what was typed for odometer and engine hours and writes it down, within a service's transaction; null when
 * neither was given.
 *
 * @throws AppError "invalid" beside `odometer` or `engineHours` when it can't be read, or contradicts the readings
 *   before and after it and nobody said that the instrument was replaced
 */
export async function noteReading(work: Work<unknown>, reading: NewReading): Promise<NotedReading | null> {
  const { odometer, engineHours, unitId, readOn, source, odometerReplaced = false, engineHoursReplaced = false, note = null } = reading;
  const { columns, asTyped } = readMeasures(work.ctx, READING_MEASURES, { odometer: odometer?.trim(), engineHours: engineHours?.trim() });
  const noted = { ...columns, asTyped };
  if (noted.odometerM === null && noted.engineS === null) return null;
  await writeReading(work, { ...noted, unitId, readOn, source, odometerReplaced, engineHoursReplaced, note }, { odometer: 'odometer', engineHours: 'engineHours' });
  return noted;
}
