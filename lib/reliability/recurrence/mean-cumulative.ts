import { noLimits, onLogScale, twoSided, Z_95, type Limits } from '../result';
import { requireAmount } from '../require';
import { rowAt } from '../spells/risk-table';
import { requireHistories, type History } from './history';

export type MeanLimits = Limits<'no-events-yet' | 'one-unit' | 'no-spread'>;

export interface MeanStep {
  readonly age: number;
  /** Units with from < age <= until. */
  readonly atRisk: number;
  readonly events: number;
  /** M: events per unit up to this age. */
  readonly mean: number;
  /** Robust: between units, whatever happens within one. Undefined for one unit, whose spread nobody knows. */
  readonly standardError: number | undefined;
  readonly limits: MeanLimits;
}

/** How many values of an ordered list are below, or up to, a value. */
function countOf(ordered: Float64Array, value: number, upTo: boolean): number {
  let [low, high] = [0, ordered.length];
  while (low < high) {
    const middle = (low + high) >>> 1;
    const each = ordered[middle] ?? Infinity;
    if (each < value || (upTo && each === value)) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** Ages with events, in order, each with how many there were and how many units were watched. */
function eventTable(histories: readonly History[]) {
  const all = new Float64Array(histories.reduce((count, { events }) => count + events.length, 0));
  let filled = 0;
  for (const { events } of histories) for (const age of events) all[filled++] = age;
  all.sort();
  const ages = all.filter((age, i) => i === 0 || age !== all[i - 1]);
  // Watched from new means at age 0 as well.
  const entries = Float64Array.from(histories, ({ from = 0 }) => (from === 0 ? -1 : from)).sort();
  const ends = Float64Array.from(histories, ({ until }) => until).sort();
  const atRisk = ages.map((age) => countOf(entries, age, false) - countOf(ends, age, false));
  const counts = ages.map((age) => countOf(all, age, true) - countOf(all, age, false));
  return { ages, atRisk, counts };
}

/** Running totals, in place. */
function accumulate(values: Float64Array): Float64Array {
  let total = 0;
  for (let i = 0; i < values.length; i += 1) values[i] = total += values[i] ?? 0;
  return values;
}

/**
 * Mean cumulative function M(t) = sum d / n over ages of repairs, with the robust variance of Lawless and Nadeau:
 *
 * V(t) = sum over units of { sum over ages <= t, while watched, of (own events - d / n) / n }^2
 *
 * With A = sum d / n^2 and C = own events / n summed + A at entry, a unit that is still watched adds (C - A)^2, and one that
 * has left what that was when it left. So each unit notes at its own events what it changes in the sum of C, of C^2 and of
 * what those who left have kept; running totals of these are enough. O(E log E).
 *
 * @throws RangeError for illegal histories
 * @see J. F. Lawless and C. Nadeau, Technometrics 37, 1995; W. Nelson 1995
 * @example meanAt(meanCumulative(histories), 404).mean // 0.68 repairs per unit
 */
export function meanCumulative(histories: readonly History[], { z = Z_95 }: { z?: number } = {}): MeanStep[] {
  requireHistories(histories);
  const { ages, atRisk, counts } = eventTable(histories);
  const a = accumulate(counts.map((count, i) => count / (atRisk[i] ?? 1) ** 2));
  const means = accumulate(counts.map((count, i) => count / (atRisk[i] ?? 1)));
  // What changes at each age with events.
  const [sums, squares, left] = [new Float64Array(ages.length), new Float64Array(ages.length), new Float64Array(ages.length)];
  const change = (at: number, before: number, after: number) => {
    sums[at] = (sums[at] ?? 0) + after - before;
    squares[at] = (squares[at] ?? 0) + after * after - before * before;
  };
  for (const { from = 0, until, events } of histories) {
    const entered = from === 0 ? 0 : countOf(ages, from, true);
    const gone = countOf(ages, until, true);
    if (entered >= gone) continue;
    let c = a[entered - 1] ?? 0;
    change(entered, 0, c);
    for (const age of events.toSorted((one, two) => one - two)) {
      const at = countOf(ages, age, false);
      const next = c + 1 / (atRisk[at] ?? 1);
      change(at, c, next);
      c = next;
    }
    if (gone < ages.length) {
      change(gone, c, 0);
      left[gone] = (left[gone] ?? 0) + (c - (a[gone - 1] ?? 0)) ** 2;
    }
  }
  for (const changes of [sums, squares, left]) accumulate(changes);
  return Array.from(ages, (age, i): MeanStep => {
    const [n, mean, now] = [atRisk[i] ?? 0, means[i] ?? 0, a[i] ?? 0];
    const variance = Math.max(0, (left[i] ?? 0) + (squares[i] ?? 0) - 2 * now * (sums[i] ?? 0) + n * now * now);
    return { age, atRisk: n, events: counts[i] ?? 0, mean, ...spread(mean, variance, histories.length, z) };
  });
}

/** So much of the mean is rounding: units that do exactly alike show no spread. */
const ROUNDING = 1e-7;

function spread(mean: number, variance: number, units: number, z: number): Pick<MeanStep, 'standardError' | 'limits'> {
  if (units < 2) return { standardError: undefined, limits: noLimits('one-unit') };
  const standardError = Math.sqrt(variance);
  if (standardError < ROUNDING * mean) return { standardError: 0, limits: noLimits('no-spread') };
  return { standardError, limits: onLogScale(mean, standardError / mean, z) };
}

export type MeanAt = Pick<MeanStep, 'mean' | 'standardError' | 'limits'>;

/** The function at an age; 0 before the first event. */
export function meanAt(steps: readonly MeanStep[], age: number): MeanAt {
  requireAmount(age, 'An age');
  return rowAt(steps, age) ?? { mean: 0, standardError: 0, limits: noLimits('no-events-yet') };
}

/** Units watched at an age: from < age <= until, or from new. @example unitsAtRisk(histories, 653) // 9 */
export function unitsAtRisk(histories: readonly History[], age: number): number {
  requireHistories(histories);
  return histories.filter(({ from = 0, until }) => (from === 0 || from < age) && age <= until).length;
}

/**
 * First less second at an age, with normal limits: D ± z sqrt(V1 + V2).
 *
 * @example differenceOfMeans(meanCumulative(batch2), meanCumulative(batch1), 300).difference // 0.889
 */
export function differenceOfMeans(first: readonly MeanStep[], second: readonly MeanStep[], age: number, z = Z_95) {
  const [one, two] = [meanAt(first, age), meanAt(second, age)];
  const difference = one.mean - two.mean;
  if (one.standardError === undefined || two.standardError === undefined) return { difference, limits: noLimits('one-unit') };
  const standardError = Math.hypot(one.standardError, two.standardError);
  if (standardError === 0) return { difference, limits: noLimits('no-spread') };
  return { difference, standardError, limits: twoSided(difference - z * standardError, difference + z * standardError) };
}
