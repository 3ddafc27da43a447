import { mean } from 'simple-statistics';
import { notEstimable, type NotEstimable } from '../result';
import { requireCount } from '../require';
import { leastCount } from '../special/root';

/** Probability below the lower limit, the centre and the upper limit: those of three standard deviations. */
const BELOW = { lower: 0.00135, centre: 0.5, upper: 0.99865 } as const;

export interface RareEventChart {
  readonly kind: 'estimated';
  readonly mean: number;
  readonly lower: number;
  readonly centre: number;
  readonly upper: number;
}

/**
 * Chart of times between events: quantiles of an exponential distribution, -mean ln(1 - p). A long time is good news.
 *
 * @returns not estimable from no gaps, or gaps that are all 0
 * @throws RangeError for a negative gap
 * @example tChart(gapsInDays) // mean 213, limits 0.29 and 1410
 */
export function tChart(gaps: readonly number[]): RareEventChart | NotEstimable<'nothing-counted' | 'no-spread'> {
  if (!gaps.every((gap) => gap >= 0 && gap < Infinity)) throw new RangeError('A gap is a finite number, 0 or more.');
  if (gaps.length === 0) return notEstimable('nothing-counted');
  const average = mean([...gaps]);
  if (average === 0) return notEstimable('no-spread');
  const quantile = (below: number) => -average * Math.log1p(-below);
  return { kind: 'estimated', mean: average, lower: quantile(BELOW.lower), centre: quantile(BELOW.centre), upper: quantile(BELOW.upper) };
}

/**
 * Chart of how many went well between events: quantiles of a geometric distribution with p = 1 / (mean + 1), which are right
 * where the usual three standard deviations, `threeSigma`, are not.
 *
 * @returns not estimable from no counts, or counts that are all 0
 * @throws RangeError for what is no count
 * @example gChart([34, 12, 5]).upper
 */
export function gChart(between: readonly number[]): (RareEventChart & { threeSigma: number }) | NotEstimable<'nothing-counted' | 'no-spread'> {
  for (const count of between) requireCount(count);
  if (between.length === 0) return notEstimable('nothing-counted');
  const average = mean([...between]);
  if (average === 0) return notEstimable('no-spread');
  const logRest = Math.log(average / (average + 1));
  const quantile = (below: number) => leastCount((count) => -Math.expm1((count + 1) * logRest) >= below * (1 - 64 * Number.EPSILON));
  return {
    kind: 'estimated',
    mean: average,
    lower: quantile(BELOW.lower),
    centre: quantile(BELOW.centre),
    upper: quantile(BELOW.upper),
    threeSigma: average + 3 * Math.sqrt(average * (average + 1)),
  };
}
