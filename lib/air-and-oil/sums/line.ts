import { input } from './sum';

/** A discharge line whose first part has lost bore: inputs of the two sums about it. */
export const lineInputs = {
  length: input('Length of the line', 'L', 'length', 'ft', { byDefault: 12, least: 0, most: 60, off: 0.1 }),
  nominalBore: input('Bore of the line when new', 'd_0', 'length', 'in', { byDefault: 0.625, least: 0.1, most: 3, off: 0.005 }),
  narrowedLength: input('Length that carbon has narrowed', 'L_1', 'length', 'ft', {
    byDefault: 6,
    least: 0,
    most: 60,
    off: 0.5,
    note: 'From the head. Carbon sits in the first 6 to 8 feet.',
  }),
  narrowedBore: input('Bore left there', 'd_1', 'length', 'in', {
    byDefault: 0.375,
    least: 0.02,
    most: 3,
    off: 0.01,
    note: 'The largest drill shank or pin that passes, with the line taken off and cold.',
  }),
};

export const LINE_CAUTIONS = [
  'The discharge line burns skin and holds pressure. Measure its bore with the engine off, every reservoir drained, and the line cold and taken off.',
  'Never run the compressor with a line that is blocked, and never gag a safety valve.',
];

export const SMOOTH_WALL = 'The wall is as smooth as drawn tube. Carbon is rough, so that the true loss is larger.';
