import type { z } from 'zod';
import type { FitRow } from '@/db/queries/fit';
import { invalid, type FieldErrors } from '@/lib/errors';
import { dayText } from '@/lib/schemas/day-text';
import type { changeFitInput } from '@/lib/schemas/fit';
import { INSTALLED_MEASURES, REMOVED_MEASURES } from '@/lib/schemas/measures';
import type { Ctx } from '../context';
import { refuseFutureDay } from '../days';
import { readMeasures } from '../units-of-measure';

type Typed = Omit<z.output<typeof changeFitInput>, 'fitId' | 'version'>;

/**
 * The columns of a fit from what its form holds; `before` is the row that is being changed.
 *
 * @param today a day of the unit's site
 * @throws AppError "invalid" when it comes out before it went on, or only half of its coming out is told
 */
export function fitColumns(ctx: Ctx, typed: Typed, today: string, before?: FitRow) {
  const { installedOdometer, installedEngineHours, removedOdometer, removedEngineHours, ...others } = typed;
  const { installedOdometerReplaced: _a, installedEngineHoursReplaced: _b, removedOdometerReplaced: _c, removedEngineHoursReplaced: _d, ...plain } = others;
  const measures = { installedOdometer, installedEngineHours, removedOdometer, removedEngineHours };
  const { columns, asTyped } = readMeasures(ctx, [...INSTALLED_MEASURES, ...REMOVED_MEASURES], measures, before);
  refuseFutureDay({ installedOn: plain.installedOn, removedOn: plain.removedOn }, today);
  refuseHalfTold({ ...plain, hasReadings: removedOdometer !== null || removedEngineHours !== null });
  return { ...plain, ...columns, asTyped };
}

function refuseHalfTold({ installedOn, removedOn, whyOut, hasReadings }: { installedOn: string; removedOn: string | null; whyOut: string | null; hasReadings: boolean }): void {
  const problems: FieldErrors = {};
  if (!removedOn && (whyOut || hasReadings)) problems.removedOn = 'Give the day on which it came out, or leave all of its coming out empty.';
  if (removedOn && !whyOut) problems.whyOut = 'Say why it came out.';
  if (removedOn && removedOn < installedOn) problems.removedOn = `It can’t come out before it was fitted, on ${dayText(installedOn)}.`;
  if (Object.keys(problems).length > 0) throw invalid(problems);
}
