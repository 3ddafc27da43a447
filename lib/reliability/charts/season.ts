import { LEAST_SEASON_EVENTS, LEAST_SEASON_YEARS } from '../honesty';
import { notEstimable, type NotEstimable } from '../result';
import { chiSquaredTails } from '../special/gamma-quantile';
import { requireExposed, totalOf, type Exposed } from '../repeats/exposed';
import { fitHarmonic, type Harmonic } from './harmonic';

/** One month of one year: its failures, and days or miles. */
export interface Month extends Exposed {
  readonly year: number;
  /** 1 to 12. */
  readonly month: number;
}

export interface Season {
  readonly kind: 'estimated';
  /** Of the twelve months against their share of exposure, 11 degrees of freedom. */
  readonly chiSquared: number;
  /** Rate of each month over that of all, January first. */
  readonly indices: readonly number[];
  readonly harmonic: Harmonic;
  /** Rate at the peak over that at the trough. */
  readonly peakToTrough: number;
  /** Months from the first of January, 0 to 12. */
  readonly peakMonth: number;
  /** Of the harmonic, two degrees of freedom, divided by the dispersion where that is above 1. */
  readonly chiSquaredOfHarmonic: number;
  readonly p: number;
}

export type SeasonWhy = 'under-two-years' | 'too-few-events' | 'no-exposure' | 'no-likeliest-season';

/**
 * Whether failures follow the season: by month against its exposure, and by one wave a year.
 *
 * @returns not estimable under two full years or sixty failures
 * @throws RangeError for months that are none or come twice
 * @example season(months) // peakToTrough 1.24, peakMonth 6.9
 */
export function season(months: readonly Month[]): Season | NotEstimable<SeasonWhy> {
  requireExposed(months);
  const seen = new Set<number>();
  for (const { year, month } of months) {
    const key = 12 * year + month;
    if (!Number.isSafeInteger(year) || !(Number.isInteger(month) && month >= 1 && month <= 12)) throw new RangeError('A month is from 1 to 12.');
    if (seen.has(key)) throw new RangeError('A month comes twice.');
    seen.add(key);
  }
  const total = totalOf(months);
  if (total.exposure === 0) return notEstimable('no-exposure');
  const calendar = Array.from({ length: 12 }, (_, i) => totalOf(months.filter(({ month }) => month === i + 1)));
  const years = calendar.map((_, i) => months.filter(({ month, exposure }) => month === i + 1 && exposure > 0).length);
  if (years.some((count) => count < LEAST_SEASON_YEARS)) return notEstimable('under-two-years');
  if (total.count < LEAST_SEASON_EVENTS) return notEstimable('too-few-events');
  const rate = total.count / total.exposure;
  const chiSquared = calendar.reduce((sum, { count, exposure }) => sum + (count - rate * exposure) ** 2 / (rate * exposure), 0);
  const harmonic = fitHarmonic(months.filter(({ exposure }) => exposure > 0));
  if (!harmonic) return notEstimable('no-likeliest-season');
  const [, cosine, sine] = harmonic.coefficients;
  const chiSquaredOfHarmonic = harmonic.likelihoodRatio / Math.max(1, harmonic.dispersion);
  return {
    kind: 'estimated',
    chiSquared,
    indices: calendar.map(({ count, exposure }) => count / exposure / rate),
    harmonic,
    peakToTrough: Math.exp(2 * Math.hypot(cosine, sine)),
    peakMonth: (12 * (Math.atan2(sine, cosine) / (2 * Math.PI) + 1)) % 12,
    chiSquaredOfHarmonic,
    p: chiSquaredTails(chiSquaredOfHarmonic, 2).upper,
  };
}
