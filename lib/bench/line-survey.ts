import { BEYOND_READING_K, lineSurvey, MUCH_FASTER, type Stretch, type SurveyPoint } from '@/lib/air-and-oil/line-survey';
import { OutOfRange, outOfRangeSentence, requireWithin } from '@/lib/air-and-oil/out-of-range';
import { input, type SumInput } from '@/lib/air-and-oil/sums/sum';
import { temperature, toSi, unitDefinition, unitFor } from '@/lib/units';
import { readTexts, type SumTexts, type UsedInput, type Writing } from './read-texts';
import { shown, symbolOf } from './show';

/** The temperature survey along the discharge line: a page of the bench that is no sum. */
export const LINE_SURVEY = {
  id: 'line-survey',
  name: 'Temperatures along the line',
  purpose: 'Read the discharge line from the compressor to the dryer, and see where it cools suddenly.',
} as const;

const MOST_POINTS = 8;

/** A point's two readings; empty ones are points that were not taken. */
export interface PointInputs {
  readonly number: number;
  readonly distance: SumInput;
  readonly temperature: SumInput;
}

export const SURVEY_POINTS: readonly PointInputs[] = Array.from({ length: MOST_POINTS }, (_, index) => {
  const number = index + 1;
  return {
    number,
    distance: { id: `distance${number}`, ...input(`Distance of point ${number}`, `x_${number}`, 'length', 'ft', { optional: true, byDefault: 0, least: 0, most: 60 }) },
    temperature: { id: `temperature${number}`, ...input(`Temperature at point ${number}`, `T_${number}`, 'temperature', 'degF', { optional: true, byDefault: 70, least: -60, most: 900 }) },
  };
});

/** All of its fields, as the address and the reader take them. */
export const SURVEY_FIELDS = { inputs: SURVEY_POINTS.flatMap(({ distance, temperature: hot }) => [distance, hot]) };

export type Surveyed =
  /** Points from the port on, and the stretches between them. */
  | { kind: 'read'; points: readonly SurveyPoint[]; stretches: readonly Stretch[] }
  /** Messages by field. */
  | { kind: 'refused'; errors: Readonly<Record<string, string>> };

/**
 * What was typed, as a survey. A point counts once it has both readings; a distance that waits for its temperature is no mistake.
 *
 * @example survey({ distance1: { value: '0' }, temperature1: { value: '350' } }, { units: US_UNITS })
 */
export function survey(texts: SumTexts, writing: Writing): Surveyed {
  const { inputs, errors } = readTexts(SURVEY_FIELDS, texts, writing);
  const given = new Map(inputs.filter(({ typed }) => typed !== null).map((used) => [used.id, used]));
  const problems = { ...errors };
  const points = SURVEY_POINTS.flatMap((point) => {
    const [at, hot] = [given.get(point.distance.id), given.get(point.temperature.id)];
    for (const [field, used] of [[point.distance, at], [point.temperature, hot]] as const) {
      const problem = used && outside(field, used, writing);
      if (problem) problems[field.id] = problem;
    }
    if (hot && !at && !problems[point.distance.id]) problems[point.distance.id] = 'Give the distance of this point too.';
    return at && hot ? [{ field: point.distance.id, distanceM: at.si, temperatureK: temperature(hot.si) }] : [];
  });
  points.forEach(({ field, distanceM }, index) => {
    if (points.slice(0, index).some((other) => other.distanceM === distanceM)) problems[field] = 'Another point is at this distance. Keep one of them.';
  });
  if (Object.keys(problems).length > 0) return { kind: 'refused', errors: problems };
  const sorted = [...points].sort((a, b) => a.distanceM - b.distanceM);
  return { kind: 'read', points: sorted, stretches: lineSurvey(sorted) };
}

function outside({ id, label, quantity, like, least, most }: SumInput, { si }: UsedInput, { units }: Writing): string | undefined {
  try {
    requireWithin(id, quantity, si, { least, most });
    return undefined;
  } catch (error) {
    if (!(error instanceof OutOfRange)) throw error;
    return outOfRangeSentence(error, { label, units, like });
  }
}

export const DISTANCE = { label: 'Distance from the port', quantity: 'length', like: 'ft' } as const;
export const TEMPERATURE = { label: 'Temperature of the line', quantity: 'temperature', like: 'degF' } as const;
const FALL = { quantity: 'temperatureDifference', like: 'degF' } as const;

/** How far it falls, in the person's degrees. */
export const fallText = ({ fallK }: Stretch, writing: Writing): string => shown(fallK, FALL, writing);

/** K/m in the person's degrees and length: "12 °F per ft". */
export function perLength(kPerM: number, writing: Writing): string {
  const unit = unitFor(writing.units, 'length', DISTANCE.like);
  return `${shown(kPerM * toSi(1, 'length', unit), FALL, writing, 2)} per ${unitDefinition('length', unit).symbol}`;
}

/** What the survey says, in one line and in sentences; nothing is said of a line with fewer than three points. */
export function surveyText({ points, stretches }: Extract<Surveyed, { kind: 'read' }>, writing: Writing): { headline: string; sentences: readonly string[] } {
  if (points.length < 3) return { headline: '—', sentences: ['Give three points or more, each with its distance and its temperature.'] };
  const place = ({ fromM, toM }: Stretch) => `${shown(fromM, DISTANCE, writing)} and ${shown(toM, DISTANCE, writing)}`;
  const sudden = stretches.filter((stretch) => stretch.sudden);
  if (sudden.length === 0) return { headline: 'No sudden fall', sentences: ['No stretch cools much faster than those beside it. A restriction before the first point, or one that is short and lies between two, would not show.'] };
  return {
    headline: sudden.length === 1 ? 'A sudden fall' : `${sudden.length} sudden falls`,
    sentences: [
      ...sudden.map((stretch) => `Between ${place(stretch)} it falls ${perLength(stretch.fallPerM, writing)}; beside it ${perLength(stretch.sudden?.besideKPerM ?? 0, writing)} at most.`),
      'Hot up to a place and suddenly cooler behind it hints at a restriction there: carbon, a kink or a narrow fitting. Read it once more, then look inside with the line cold, drained and taken off.',
    ],
  };
}

/** What is called sudden, with the figures that it is decided by. */
export const suddenText = (writing: Writing): string =>
  `A free line gives off less the cooler it gets. A stretch is called sudden when it loses at least ${MUCH_FASTER} times as much for its length as either stretch beside it, and ${shown(BEYOND_READING_K, FALL, writing)} more than that would come to: less, the thermometer could be off. The first stretch has nothing before it and is never called so.`;

/** The plot in words. */
export function surveySummary({ points }: Extract<Surveyed, { kind: 'read' }>, writing: Writing): string {
  const [first, last] = [points[0], points.at(-1)];
  if (!first || !last || first === last) return 'The plot comes with the second point.';
  const at = ({ temperatureK, distanceM }: SurveyPoint) => `${shown(temperatureK, TEMPERATURE, writing)} at ${shown(distanceM, DISTANCE, writing)}`;
  return `${TEMPERATURE.label}: from ${at(first)} to ${at(last)}, read at ${points.length} points.`;
}

/** "Distance from the port, ft" */
export const axisOf = (of: typeof DISTANCE | typeof TEMPERATURE, writing: Writing): string => `${of.label}, ${symbolOf(of, writing)}`;
