import type { z } from 'zod';
import type { ModelRow } from '@/db/queries/compressor-model';
import { invalid } from '@/lib/errors';
import { BREAK_IN_MEASURES, MODEL_MEASURES } from '@/lib/schemas/measures';
import type { changeModelInput } from '@/lib/schemas/compressor-model';
import type { Ctx } from '../context';
import { readMeasures } from '../units-of-measure';

type Facts = Omit<z.output<typeof changeModelInput>, 'modelId' | 'version'>;

/** The columns of a model from what its form holds; `before` is the row that is being changed. */
export function modelColumns(ctx: Ctx, { displacement, bore, stroke, driveRatio, portBore, lineSize, breakInPressure, breakInLeast, breakInMost, ...plain }: Facts, before?: ModelRow) {
  const typed = { displacement, bore, stroke, driveRatio, portBore, lineSize, breakInPressure, breakInLeast, breakInMost };
  const { columns, asTyped } = readMeasures(ctx, [...MODEL_MEASURES, ...BREAK_IN_MEASURES], typed, before);
  refuseHalfTold({ ...plain, ...columns });
  return { ...plain, ...columns, asTyped };
}

/** Figures of a break-in run stand with where they are from, or not at all. */
function refuseHalfTold(told: Pick<ModelRow, 'breakInEngineRpm' | 'breakInPressurePa' | 'breakInLeastS' | 'breakInMostS' | 'breakInSource'>): void {
  const { breakInSource, breakInLeastS: least, breakInMostS: most } = told;
  const hasFigures = [told.breakInEngineRpm, told.breakInPressurePa, least, most].some((figure) => figure !== null);
  if (hasFigures && !breakInSource) throw invalid({ breakInSource: 'Say where these figures are from.' });
  if (!hasFigures && breakInSource) throw invalid({ breakInSource: 'Give at least one figure that is from there, or leave this empty.' });
  if (least !== null && most !== null && least > most) throw invalid({ breakInMost: 'The longest time can’t be shorter than the least.' });
}
