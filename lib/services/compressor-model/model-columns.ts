import type { z } from 'zod';
import type { ModelRow } from '@/db/queries/compressor-model';
import { MODEL_MEASURES } from '@/lib/schemas/measures';
import type { changeModelInput } from '@/lib/schemas/compressor-model';
import type { Ctx } from '../context';
import { readMeasures } from '../units-of-measure';

type Facts = Omit<z.output<typeof changeModelInput>, 'modelId' | 'version'>;

/** The columns of a model from what its form holds; `before` is the row that is being changed. */
export function modelColumns(ctx: Ctx, { displacement, bore, stroke, driveRatio, portBore, lineSize, ...plain }: Facts, before?: ModelRow) {
  const { columns, asTyped } = readMeasures(ctx, MODEL_MEASURES, { displacement, bore, stroke, driveRatio, portBore, lineSize }, before);
  return { ...plain, ...columns, asTyped };
}
