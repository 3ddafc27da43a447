import { z } from 'zod';
import { FIGURES } from '@/lib/baseline/figures';
import { OCCASIONS } from '@/lib/baseline/set';
import { optionalLine, rowId } from './common';
import type { MeasureField } from './measures';
import { day, measureText, reason } from './record';

/** What a set was measured in. By the names of `Conditions`. */
export const CONDITION_MEASURES = [
  { field: 'ambient', column: 'ambientK', quantity: 'temperature' },
  { field: 'engineSpeed', column: 'engineSpeedPerS', quantity: 'rotationalSpeed' },
  { field: 'loadedFor', column: 'loadedS', quantity: 'duration', like: 'min' },
] as const satisfies readonly MeasureField[];

type FigureField = 'buildUp' | 'headTemperature' | 'leakDown' | 'shareLoaded' | 'oilCarried';
type Fields = Record<FigureField | `${FigureField}Error`, typeof measureText>;

/** The figures with their errors, as FIGURES names their fields. */
const figures = Object.fromEntries(FIGURES.flatMap(({ field }) => [[field, measureText], [`${field}Error`, measureText]])) as Fields;

export const recordBaselineInput = z.strictObject({
  id: rowId,
  unitId: rowId,
  occasion: z.enum(OCCASIONS, 'Say whether it was at a service or at a proved repair.'),
  measuredOn: day('the day of the set'),
  ...figures,
  ambient: measureText,
  engineSpeed: measureText,
  loadedFor: measureText,
  note: optionalLine(500),
});

/** Not `reason`: its form stands on one page with that of hiding the unit, and a field's name is its id. */
export const hideBaselineInput = z.strictObject({ unitId: rowId, setId: rowId, whyHidden: reason });
