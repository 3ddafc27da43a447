import { mean } from 'simple-statistics';
import { notEstimable, type NotEstimable } from '../result';
import { poissonQuantile } from '../special/counts';
import { totalOf, requireExposed, type Exposed } from '../repeats/exposed';

export interface ChartPoint {
  readonly rate: number;
  readonly lower: number;
  readonly upper: number;
  /** In standard errors from the centre. */
  readonly z: number;
}

export interface UChart {
  readonly kind: 'estimated';
  /** Rate of all points together. */
  readonly centre: number;
  readonly points: readonly ChartPoint[];
  /** How much wider than chance points spread about each other; undefined from fewer than two. */
  readonly spread: number | undefined;
  /** Limits were widened by the spread (Laney). */
  readonly widened: boolean;
}

/** Mean moving range of normal values, in standard deviations: 2 / sqrt(pi) to three digits, as charts have it. */
const MOVING_RANGE = 1.128;
/** Above it a chart is widened. */
const WIDEN_ABOVE = 1.2;
/** Below so many in a point its limits are exact: the normal ones would be wrong. */
const FEW = 5;
const THREE_SIGMA = 0.0013498980316301;

interface Options {
  /** `auto` widens when the spread is above 1.2 (Laney's u'). */
  readonly widen?: 'auto' | 'never';
  /** `auto` takes quantiles of the Poisson distribution where fewer than five are expected. */
  readonly exact?: 'auto' | 'never';
}

/**
 * Chart of counts over changing exposures: u ± 3 sqrt(u / n), each point with its own limits.
 *
 * @returns not estimable without exposure; points without exposure are refused
 * @throws RangeError
 * @see NIST/SEMATECH e-Handbook 6.3.3.1; D. B. Laney, Quality Engineering 14, 2002
 * @example uChart([{ count: 14, exposure: 10 }, …]).centre // 1.42
 */
export function uChart(counts: readonly Exposed[], { widen = 'auto', exact = 'auto' }: Options = {}): UChart | NotEstimable<'nothing-counted' | 'no-failures'> {
  requireExposed(counts);
  if (counts.some(({ exposure }) => exposure === 0)) throw new RangeError('Each point of a chart needs an exposure.');
  if (counts.length === 0) return notEstimable('nothing-counted');
  const total = totalOf(counts);
  if (total.count === 0) return notEstimable('no-failures');
  const centre = total.count / total.exposure;
  const zs = counts.map(({ count, exposure }) => (count / exposure - centre) / Math.sqrt(centre / exposure));
  const spread = spreadOf(zs);
  const widened = widen === 'auto' && spread !== undefined && spread > WIDEN_ABOVE;
  const factor = widened ? spread : 1;
  const points = counts.map(({ count, exposure }, i): ChartPoint => {
    const few = exact === 'auto' && !widened && centre * exposure < FEW;
    const reach = 3 * factor * Math.sqrt(centre / exposure);
    const quantile = (below: number) => poissonQuantile(below, centre * exposure) / exposure;
    return {
      rate: count / exposure,
      lower: few ? quantile(THREE_SIGMA) : Math.max(0, centre - reach),
      upper: few ? quantile(1 - THREE_SIGMA) : centre + reach,
      z: (zs[i] ?? 0) / factor,
    };
  });
  return { kind: 'estimated', centre, points, spread, widened };
}

function spreadOf(zs: readonly number[]): number | undefined {
  if (zs.length < 2) return undefined;
  return mean(zs.slice(1).map((z, i) => Math.abs(z - (zs[i] ?? 0)))) / MOVING_RANGE;
}

/** 1-based places of points outside their own limits. */
export const outsideLimits = ({ points }: UChart): number[] =>
  points.flatMap(({ rate, lower, upper }, i) => (rate < lower || rate > upper ? [i + 1] : []));
