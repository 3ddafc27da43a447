import { quantile } from 'simple-statistics';
import type { Forecasted } from '@/lib/diagnose/scores';
import { expectedCalibrationError, reliabilityBins } from '@/lib/diagnose/scores-reliability';
import type { Interval } from '../learning/small-laws';

/** What chance alone does to the reliability of an engine whose probabilities are all true. */
export interface ChanceBand {
  /** 95th percentile, and median, of its expected calibration error: an error below the first is no sign of anything. */
  error95: number;
  errorMedian: number;
  /** By bin that holds anything, in order: where 95 % of its observed shares lie. */
  bins: { low: number; high: number; count: number; observed: Interval }[];
}

/**
 * Draws what would have happened had every probability been true, again and again, from the forecasts' own
 * probabilities. No calibration error is to be shown without it.
 *
 * @param forecasts what was said; what happened is not looked at
 * @param random uniform in [0, 1)
 * @param options how many bins, and how often to draw
 * @returns undefined without forecasts
 * @see Bröcker and Smith, Increasing the reliability of reliability diagrams, Weather and Forecasting 22, 2007
 * @example chanceBand(topClass(predictions), random)?.error95
 */
export function chanceBand(forecasts: readonly Forecasted[], random: () => number, { bins = 10, draws = 1000 } = {}): ChanceBand | undefined {
  if (forecasts.length === 0) return undefined;
  const errors: number[] = [];
  const observed = new Map<number, number[]>();
  for (let draw = 0; draw < draws; draw += 1) {
    const drawn = reliabilityBins(forecasts.map(({ p }) => ({ p, happened: random() < p })), bins);
    errors.push(expectedCalibrationError(drawn) ?? 0);
    for (const bin of drawn) {
      const held = observed.get(bin.low);
      if (held) held.push(bin.observed);
      else observed.set(bin.low, [bin.observed]);
    }
  }
  return {
    error95: quantile(errors, 0.95),
    errorMedian: quantile(errors, 0.5),
    bins: reliabilityBins(forecasts, bins).map(({ low, high, count }) => {
      const shares = observed.get(low) ?? [];
      return { low, high, count, observed: { low: quantile(shares, 0.025), high: quantile(shares, 0.975) } };
    }),
  };
}
