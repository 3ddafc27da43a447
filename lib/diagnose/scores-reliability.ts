/** Do things given 70 % happen in 70 % of cases? Bins, and the figures drawn from them. */
import { max, mean, sum } from 'simple-statistics';
import { brierScore, type Forecasted } from './scores';

/** Forecasts that fell into one bin; bins without any are left out. */
export interface ReliabilityBin {
  /** Half-open [low, high); the last bin holds 1 too. */
  low: number;
  high: number;
  count: number;
  /** Mean of the probabilities given. */
  meanForecast: number;
  /** Share that came true. */
  observed: number;
  forecasts: readonly Forecasted[];
}

/**
 * Sorts forecasts into bins of equal width.
 *
 * @param bins how many, 1 or more
 * @returns the bins that hold anything, in order
 * @throws RangeError when bins isn't a whole number above 0, or a probability lies outside [0, 1]
 * @see DeGroot and Fienberg (1983), The comparison and evaluation of forecasters
 * @example reliabilityBins([{ p: 0.8, happened: true }], 10)[0]?.observed; // 1
 */
export function reliabilityBins(forecasts: readonly Forecasted[], bins = 10): ReliabilityBin[] {
  if (!Number.isInteger(bins) || bins < 1) throw new RangeError(`bins: expected a whole number above 0, got ${bins}`);
  const held = new Map<number, Forecasted[]>();
  for (const forecast of forecasts) {
    if (!(forecast.p >= 0 && forecast.p <= 1)) throw new RangeError(`p: expected 0 to 1, got ${forecast.p}`);
    const bin = Math.min(bins - 1, Math.floor(forecast.p * bins));
    const inside = held.get(bin);
    if (inside) inside.push(forecast);
    else held.set(bin, [forecast]);
  }
  return [...held].sort(([a], [b]) => a - b).map(([bin, inside]) => ({
    low: bin / bins,
    high: (bin + 1) / bins,
    count: inside.length,
    meanForecast: mean(inside.map(({ p }) => p)),
    observed: mean(inside.map(({ happened }) => (happened ? 1 : 0))),
    forecasts: inside,
  }));
}

/**
 * Expected calibration error: the mean gap between what was said and what happened, weighted by count. Never show it
 * bare: a perfect engine has an ECE-10 near 0.12 over 30 cases.
 *
 * @returns [0, 1]; undefined without forecasts
 * @see Naeini, Cooper and Hauskrecht (2015), Obtaining well calibrated probabilities using Bayesian binning
 * @example expectedCalibrationError(reliabilityBins(topClass(predictions)));
 */
export function expectedCalibrationError(bins: readonly ReliabilityBin[]): number | undefined {
  const total = sum(bins.map(({ count }) => count));
  if (total === 0) return undefined;
  return sum(bins.map((bin) => (bin.count / total) * Math.abs(bin.observed - bin.meanForecast)));
}

/**
 * Largest calibration error: the widest gap of any bin.
 *
 * @returns [0, 1]; undefined without forecasts
 * @example largestCalibrationError(reliabilityBins(topClass(predictions)));
 */
export function largestCalibrationError(bins: readonly ReliabilityBin[]): number | undefined {
  if (bins.length === 0) return undefined;
  return max(bins.map((bin) => Math.abs(bin.observed - bin.meanForecast)));
}

/** Parts of a Brier score: brier = reliability - resolution + uncertainty + withinVariance - withinCovariance. */
export interface BrierParts {
  brier: number;
  /** REL: how far bins are from what happened in them; 0 is perfect. */
  reliability: number;
  /** RES: how far bins tell cases apart; more is better. */
  resolution: number;
  /** UNC: how uncertain the event is in itself; no forecaster's doing. */
  uncertainty: number;
  /** WBV and WBC: what binning hides, variance of forecasts and twice their covariance with events, inside bins. */
  withinVariance: number;
  withinCovariance: number;
}

/**
 * Splits the Brier score of yes/no forecasts. The two last parts vanish when all forecasts of a bin are equal
 * (Murphy's case), and make the identity hold when they aren't.
 *
 * @returns parts; undefined without forecasts
 * @see Murphy (1973), A new vector partition of the probability score; Stephenson, Coelho and Jolliffe (2008), Two
 * extra components in the Brier score decomposition
 * @example brierParts(reliabilityBins(forecasts))?.reliability;
 */
export function brierParts(bins: readonly ReliabilityBin[]): BrierParts | undefined {
  const all = bins.flatMap(({ forecasts }) => forecasts);
  if (all.length === 0) return undefined;
  const outcome = ({ happened }: Forecasted): number => (happened ? 1 : 0);
  const base = mean(all.map(outcome));
  const overBins = (part: (bin: ReliabilityBin) => number): number => sum(bins.map(part)) / all.length;
  const within = (part: (bin: ReliabilityBin, forecast: Forecasted) => number): number =>
    overBins((bin) => sum(bin.forecasts.map((forecast) => part(bin, forecast))));
  return {
    brier: brierScore(all),
    reliability: overBins((bin) => bin.count * (bin.meanForecast - bin.observed) ** 2),
    resolution: overBins((bin) => bin.count * (bin.observed - base) ** 2),
    uncertainty: base * (1 - base),
    withinVariance: within((bin, { p }) => (p - bin.meanForecast) ** 2),
    withinCovariance: 2 * within((bin, f) => (outcome(f) - bin.observed) * (f.p - bin.meanForecast)),
  };
}
