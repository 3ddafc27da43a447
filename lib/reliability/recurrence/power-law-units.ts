import { notEstimable, type NotEstimable } from '../result';
import { rootBeyond } from '../special/root';
import { requireHistories, type History } from './history';

/** M(t) = lambda t^beta for each of several like units. */
export interface PowerLawFit {
  readonly kind: 'estimated';
  readonly failures: number;
  readonly shape: number;
  /** lambda. */
  readonly rate: number;
}

export type PowerLawWhy = 'no-failures' | 'too-few-failures' | 'failure-at-age-zero' | 'no-likeliest-shape';

const LEAST_EVENTS = 3;

/** A sum of powers and its slope in the power. */
interface Powers {
  readonly total: number;
  readonly slope: number;
}

/** Solves N / b + sum ln t - N P'(b) / P(b) = 0 for the shape; ages are divided by their greatest before. */
function solve(failures: number, sumOfLogs: number, powers: (shape: number) => Powers, greatest: number): PowerLawFit | NotEstimable<PowerLawWhy> {
  const slope = (logShape: number) => {
    const shape = Math.exp(logShape);
    const { total, slope: steep } = powers(shape);
    return failures + shape * (sumOfLogs - (failures * steep) / total);
  };
  const logShape = rootBeyond(slope, 0, slope(0) > 0 ? 0.25 : -0.25, 10);
  if (logShape === undefined) return notEstimable('no-likeliest-shape');
  return ratedFit(failures, Math.exp(logShape), powers(Math.exp(logShape)).total, greatest);
}

function ratedFit(failures: number, shape: number, total: number, greatest: number): PowerLawFit | NotEstimable<PowerLawWhy> {
  const rate = failures / total / greatest ** shape;
  return rate > 0 && rate < Infinity ? { kind: 'estimated', failures, shape, rate } : notEstimable('no-likeliest-shape');
}

const powerAndSlope = (x: number, shape: number): Powers => {
  if (x === 0) return { total: 0, slope: 0 };
  const power = x ** shape;
  return { total: power, slope: power * Math.log(x) };
};

/**
 * One power-law process through many like units, each watched over its own time.
 *
 * @returns not estimable below three failures, with one at age 0, or where all lie at the ends
 * @throws RangeError for illegal histories
 * @see MIL-HDBK-189 (1981); L. H. Crow 1974
 * @example powerLawOfUnits([{ until: 300, events }, { until: 200, events: [] }]) // shape 0.71
 */
export function powerLawOfUnits(histories: readonly History[]): PowerLawFit | NotEstimable<PowerLawWhy> {
  requireHistories(histories);
  const ages = histories.flatMap(({ events }) => events);
  if (ages.length === 0) return notEstimable('no-failures');
  if (ages.length < LEAST_EVENTS) return notEstimable('too-few-failures');
  if (ages.includes(0)) return notEstimable('failure-at-age-zero');
  const greatest = histories.reduce((most, { until }) => Math.max(most, until), 0);
  const sumOfLogs = ages.reduce((sum, age) => sum + Math.log(age / greatest), 0);
  const powers = (shape: number) =>
    histories.reduce<Powers>((sum, { from = 0, until }) => {
      const [end, begin] = [powerAndSlope(until / greatest, shape), powerAndSlope(from / greatest, shape)];
      return { total: sum.total + end.total - begin.total, slope: sum.slope + end.slope - begin.slope };
    }, { total: 0, slope: 0 });
  return solve(ages.length, sumOfLogs, powers, greatest);
}

/** Failures between two ages of one unit. */
export interface IntervalCount {
  readonly from: number;
  readonly to: number;
  readonly failures: number;
}

/**
 * One power-law process through counts over intervals that follow one another from age 0.
 *
 * sum n [ (u^b ln u - l^b ln l) / (u^b - l^b) - ln T ] = 0
 *
 * @throws RangeError for intervals that leave gaps, or counts that are none
 * @see MIL-HDBK-189 (1981), grouped data
 * @example powerLawOfIntervals([{ from: 0, to: 20, failures: 13 }, …]) // shape 0.753, rate 1.53
 */
export function powerLawOfIntervals(intervals: readonly IntervalCount[]): PowerLawFit | NotEstimable<PowerLawWhy> {
  let end = 0;
  for (const { from, to, failures } of intervals) {
    if (from !== end || !(to > from && to < Infinity)) throw new RangeError('Intervals follow one another from age 0.');
    if (!(Number.isSafeInteger(failures) && failures >= 0)) throw new RangeError('A count is a whole number, 0 or more.');
    end = to;
  }
  const failures = intervals.reduce((sum, { failures: count }) => sum + count, 0);
  if (failures === 0) return notEstimable('no-failures');
  if (failures < LEAST_EVENTS) return notEstimable('too-few-failures');
  const slope = (logShape: number) => {
    const shape = Math.exp(logShape);
    return intervals.reduce((sum, { from, to, failures: count }) => {
      if (count === 0) return sum;
      const [upper, lower] = [powerAndSlope(to / end, shape), powerAndSlope(from / end, shape)];
      return sum + (count * shape * (upper.slope - lower.slope)) / (upper.total - lower.total);
    }, 0);
  };
  const logShape = rootBeyond(slope, 0, slope(0) > 0 ? 0.25 : -0.25, 8);
  if (logShape === undefined) return notEstimable('no-likeliest-shape');
  return ratedFit(failures, Math.exp(logShape), 1, end);
}
