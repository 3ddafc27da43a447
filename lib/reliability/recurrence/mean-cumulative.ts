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

interface Happening {
  readonly age: number;
  readonly unit: number;
}

/** Ages in order, each with the units to which it happened. */
function inOrder(histories: readonly History[], of: (history: History) => readonly number[]): Happening[] {
  return histories.flatMap((history, unit) => of(history).map((age) => ({ age, unit }))).sort((a, b) => a.age - b.age);
}

/**
 * Mean cumulative function M(t) = sum d / n over ages of repairs, with the robust variance of Lawless and Nadeau:
 *
 * V(t) = sum over units of { sum over ages <= t, while watched, of (own events - d / n) / n }^2
 *
 * In one pass: with A = sum d / n^2 and C = own events / n summed + A at entry, a unit that is still watched adds
 * (C - A)^2, and one that has left what that was when it left. So three sums over those still watched are enough,
 * O(E log E) for the order.
 *
 * @throws RangeError for illegal histories
 * @see J. F. Lawless and C. Nadeau, Technometrics 37, 1995; W. Nelson 1995
 * @example meanAt(meanCumulative(histories), 404).mean // 0.68 repairs per unit
 */
export function meanCumulative(histories: readonly History[], { z = Z_95 }: { z?: number } = {}): MeanStep[] {
  requireHistories(histories);
  const events = inOrder(histories, (history) => history.events);
  // Watched from new means at age 0 as well.
  const entries = inOrder(histories, ({ from = 0 }) => [from === 0 ? -1 : from]);
  const ends = inOrder(histories, ({ until }) => [until]);
  const own = new Float64Array(histories.length);
  let a = 0;
  let mean = 0;
  let watched = 0;
  let [sum, squares, left] = [0, 0, 0];
  let [entered, ended, happened] = [0, 0, 0];
  const steps: MeanStep[] = [];
  while (happened < events.length) {
    const age = events[happened]?.age ?? 0;
    // Those who left before this age keep what they came to; A has not moved since.
    for (let at = ends[ended]; at && at.age < age; at = ends[(ended += 1)]) {
      const c = own[at.unit] ?? 0;
      // One that came and left between two events never was among those watched.
      for (; entered < entries.length && (entries[entered]?.age ?? Infinity) < at.age; entered += 1) enter(entries[entered]?.unit ?? 0);
      const now = own[at.unit] ?? c;
      left += (now - a) ** 2;
      watched -= 1;
      sum -= now;
      squares -= now * now;
    }
    for (; entered < entries.length && (entries[entered]?.age ?? Infinity) < age; entered += 1) enter(entries[entered]?.unit ?? 0);
    const atRisk = watched;
    let count = 0;
    for (; events[happened]?.age === age; happened += 1) {
      const unit = events[happened]?.unit ?? 0;
      const before = own[unit] ?? 0;
      const after = before + 1 / atRisk;
      own[unit] = after;
      sum += after - before;
      squares += after * after - before * before;
      count += 1;
    }
    mean += count / atRisk;
    a += count / (atRisk * atRisk);
    const variance = Math.max(0, left + squares - 2 * a * sum + watched * a * a);
    steps.push({ age, atRisk, events: count, mean, ...spread(mean, variance, histories.length, z) });
  }
  return steps;

  function enter(unit: number): void {
    own[unit] = a;
    watched += 1;
    sum += a;
    squares += a * a;
  }
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
