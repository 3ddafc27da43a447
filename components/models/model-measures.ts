import { MODEL_MEASURES } from '@/lib/schemas/measures';

const WORDS: Record<(typeof MODEL_MEASURES)[number]['field'], { label: string; hint?: string }> = {
  displacement: { label: 'Displacement', hint: 'Swept by all cylinders in one turn' },
  bore: { label: 'Bore' },
  stroke: { label: 'Stroke' },
  driveRatio: { label: 'Drive ratio', hint: 'Turns of the compressor for one of the engine, such as 1.5:1' },
  portBore: { label: 'Bore of the discharge port' },
  lineSize: { label: 'Size of the discharge line', hint: 'Inside, where it is new' },
};

/** The measures of a model with their words. */
export const MODEL_MEASURE_FIELDS = MODEL_MEASURES.map((measure) => ({ measure, ...WORDS[measure.field] }));
