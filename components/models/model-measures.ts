import { BREAK_IN_MEASURES, MODEL_MEASURES } from '@/lib/schemas/measures';

const WORDS: Record<(typeof MODEL_MEASURES)[number]['field'], { label: string; hint?: string }> = {
  displacement: { label: 'Displacement', hint: 'Swept by all cylinders in one turn' },
  bore: { label: 'Bore' },
  stroke: { label: 'Stroke' },
  driveRatio: { label: 'Drive ratio', hint: 'Turns of the compressor for one of the engine, such as 1.5:1' },
  portBore: { label: 'Bore of the discharge port' },
  lineSize: { label: 'Size of the discharge line', hint: 'Inside, where it is new' },
};

const BREAK_IN_WORDS: Record<(typeof BREAK_IN_MEASURES)[number]['field'], { label: string; hint?: string }> = {
  breakInPressure: { label: 'Pressure to hold', hint: 'Below cut-in, so that it never unloads' },
  breakInLeast: { label: 'At least' },
  breakInMost: { label: 'At most' },
};

/** How it is run in, with the words for each. */
export const BREAK_IN_FIELDS = BREAK_IN_MEASURES.map((measure) => ({ measure, ...BREAK_IN_WORDS[measure.field] }));

/** The measures of a model with their words. */
export const MODEL_MEASURE_FIELDS = MODEL_MEASURES.map((measure) => ({ measure, ...WORDS[measure.field] }));
