import { mean, sampleStandardDeviation } from 'simple-statistics';
import { notEstimable, type NotEstimable } from '../result';
import { chiSquaredTails } from '../special/gamma-quantile';
import { twoSidedP } from '../special/normal';
import { requireHistories, type History } from './history';

/** Whether watching ended at a set time, or with the last failure, which then tells nothing of a trend. */
export type Ending = 'time' | 'failure';

export interface WatchedTrend extends History {
  readonly ending?: Ending;
}

/** Above 0, failures come faster and faster; p is two-sided. */
export interface TrendTest {
  readonly kind: 'estimated';
  readonly statistic: number;
  readonly p: number;
}

export type TrendWhy = 'too-few-events' | 'no-spread';

/** From where, to where and with what events a history speaks of a trend. */
function telling({ from = 0, until, events, ending = 'time' }: WatchedTrend): { from: number; until: number; events: readonly number[] } {
  const ordered = events.toSorted((a, b) => a - b);
  const last = ordered.at(-1);
  return ending === 'failure' && last !== undefined ? { from, until: last, events: ordered.slice(0, -1) } : { from, until, events: ordered };
}

/**
 * Laplace's test of whether failures come evenly, over one unit or many.
 *
 * U = sum (t - (a + b) / 2) / sqrt(sum n (b - a)^2 / 12)
 *
 * @returns U, normal when they do: above 0 worsening, below improving; not estimable without events
 * @throws RangeError for illegal histories
 * @see D. R. Cox and P. A. W. Lewis 1966; MIL-HDBK-189
 * @example laplace([{ until: 1500, events }]) // statistic -1.33
 */
export function laplace(histories: readonly WatchedTrend[]): TrendTest | NotEstimable<TrendWhy> {
  requireHistories(histories);
  let [over, square] = [0, 0];
  for (const history of histories) {
    const { from, until, events } = telling(history);
    for (const age of events) over += age - (from + until) / 2;
    square += (events.length * (until - from) ** 2) / 12;
  }
  if (square === 0) return notEstimable('too-few-events');
  const statistic = over / Math.sqrt(square);
  return { kind: 'estimated', statistic, p: twoSidedP(statistic) };
}

/** Times between failures of one unit, the first from when watching began. */
export function gapsOf({ from = 0, events }: History): number[] {
  const ordered = events.toSorted((a, b) => a - b);
  return ordered.map((age, i) => age - (ordered[i - 1] ?? from));
}

/**
 * Lewis and Robinson's test: Laplace's U over the coefficient of variation of the gaps, for gaps that are not exponential.
 *
 * @returns not estimable from fewer than two gaps, or gaps that are all alike
 * @see P. A. W. Lewis and D. W. Robinson 1974
 */
export function lewisRobinson(history: WatchedTrend): TrendTest | NotEstimable<TrendWhy> {
  const even = laplace([history]);
  const gaps = gapsOf(history);
  if (even.kind === 'not-estimable' || gaps.length < 2) return notEstimable('too-few-events');
  const variation = sampleStandardDeviation(gaps) / mean(gaps);
  if (!(variation > 0)) return notEstimable('no-spread');
  const statistic = even.statistic / variation;
  return { kind: 'estimated', statistic, p: twoSidedP(statistic) };
}

/**
 * The handbook's test against a power law: 2 sum ln (T / t) is chi-squared when failures come evenly. Large: improving.
 *
 * @returns with its degrees of freedom, 2N or 2 (N - 1); not estimable without events, or with one at the very beginning
 * @see MIL-HDBK-189 (1981)
 * @example milHandbookTrend({ until: 300, events }) // statistic 75.4, 54 degrees, p 0.058
 */
export function milHandbookTrend(history: WatchedTrend): (TrendTest & { degrees: number }) | NotEstimable<TrendWhy | 'event-at-beginning'> {
  requireHistories([history]);
  const { from, until, events } = telling(history);
  if (events.length === 0) return notEstimable('too-few-events');
  if (events.some((age) => age === from)) return notEstimable('event-at-beginning');
  const statistic = 2 * events.reduce((sum, age) => sum + Math.log(until - from) - Math.log(age - from), 0);
  const degrees = 2 * events.length;
  const { lower, upper } = chiSquaredTails(statistic, degrees);
  return { kind: 'estimated', statistic, degrees, p: Math.min(1, 2 * Math.min(lower, upper)) };
}

/**
 * Reverse arrangements: how many pairs of gaps have the later the longer. Many: improving. O(n log n).
 *
 * E = r (r - 1) / 4, Var = (2 r + 5) (r - 1) r / 72
 *
 * @returns with a normal deviate (good from about ten gaps on); not estimable from fewer than two
 * @throws RangeError for a gap that is no amount
 * @see NIST/SEMATECH e-Handbook 8.2.3.4
 * @example reverseArrangements([5, 35, 3]).arrangements // 1
 */
export function reverseArrangements(gaps: readonly number[]): (TrendTest & { arrangements: number; pairs: number }) | NotEstimable<'too-few-events'> {
  if (!gaps.every((gap) => gap >= 0 && gap < Infinity)) throw new RangeError('A gap is a finite number, 0 or more.');
  const r = gaps.length;
  if (r < 2) return notEstimable('too-few-events');
  const arrangements = risingPairs(gaps);
  // Above 0 worsening, as with the other tests: fewer later gaps are longer.
  const statistic = ((r * (r - 1)) / 4 - arrangements) / Math.sqrt(((2 * r + 5) * (r - 1) * r) / 72);
  return { kind: 'estimated', arrangements, pairs: (r * (r - 1)) / 2, statistic, p: twoSidedP(statistic) };
}

/** Pairs whose later one is greater, counted over a tree of ranks. */
function risingPairs(values: readonly number[]): number {
  const ranks = new Map([...new Set(values)].sort((a, b) => a - b).map((value, i) => [value, i + 1]));
  const tree = new Float64Array(ranks.size + 1);
  let pairs = 0;
  for (const value of values) {
    const rank = ranks.get(value) ?? 0;
    for (let i = rank - 1; i > 0; i -= i & -i) pairs += tree[i] ?? 0;
    for (let i = rank; i < tree.length; i += i & -i) tree[i] = (tree[i] ?? 0) + 1;
  }
  return pairs;
}
