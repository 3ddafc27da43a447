import { wilson, type Proportion } from './wilson';

/** Below so many failures no percentage and no fitted law are shown. A judgement of our own. */
export const LEAST_FAILURES = 5;
/** Below so many points a chart runs no rules. */
export const LEAST_CHART_POINTS = 20;
/** Below either, nothing is said of a season. */
export const LEAST_SEASON_YEARS = 2;
export const LEAST_SEASON_EVENTS = 60;

export type HonestShare =
  | { readonly kind: 'nothing-counted' }
  /** No failures: what they still allow, as a share of those counted. */
  | { readonly kind: 'at-most'; readonly of: number; readonly upper: number }
  /** Print "3 of 8 trucks". */
  | { readonly kind: 'count-alone'; readonly count: number; readonly of: number }
  | Proportion;

/**
 * How a share of failures may be shown: a percentage with its limits only from five failures on; none at all gives the
 * one-sided 95 % limit, 1 - 0.05^(1/n).
 *
 * @throws RangeError when counts cannot be
 * @example honestShare(3, 8) // { kind: 'count-alone', count: 3, of: 8 }
 */
export function honestShare(count: number, of: number): HonestShare {
  const share = wilson(count, of);
  if (share.kind === 'not-estimable') return { kind: 'nothing-counted' };
  if (count === 0) return { kind: 'at-most', of, upper: -Math.expm1(Math.log(0.05) / of) };
  return count < LEAST_FAILURES ? { kind: 'count-alone', count, of } : share;
}

/** A p-value is shown only beside its interval, and with how many comparisons were made. */
export interface Compared<Interval> {
  readonly p: number;
  readonly limits: Interval;
  readonly comparisons: number;
  /** Bonferroni's: what the least of so many p-values is worth. */
  readonly adjustedP: number;
}

/**
 * @param comparisons made on the page, this one among them
 * @throws RangeError
 * @example compared({ p: 0.01, limits, comparisons: 6 }).adjustedP // 0.06
 */
export function compared<Interval>({ p, limits, comparisons }: { p: number; limits: Interval; comparisons: number }): Compared<Interval> {
  if (!(p >= 0 && p <= 1)) throw new RangeError('A probability is from 0 to 1.');
  if (!(Number.isSafeInteger(comparisons) && comparisons >= 1)) throw new RangeError('At least one comparison was made.');
  return { p, limits, comparisons, adjustedP: Math.min(1, p * comparisons) };
}
