import { notEstimable, type NotEstimable } from '../result';
import { requireAmount, requireCount } from '../require';
import { poissonAtLeast, poissonProbability } from '../special/counts';
import { chiSquaredTails } from '../special/gamma-quantile';
import { expectedCounts, requireExposed, type Exposed } from './exposed';

/**
 * How likely so many failures or more are by chance, in a fleet whose units are all alike. See `heterogeneity` first: in one
 * whose units differ this takes ordinary units for remarkable ones.
 *
 * @param expected above 0, or 0 with no failures
 * @returns p: P(X >= count); midP: less half of P(X = count)
 * @throws RangeError
 * @example byChance(14, 26.9).p // 0.998
 */
export function byChance(count: number, expected: number): { p: number; midP: number } {
  requireCount(count);
  requireAmount(expected, 'An expected count');
  const p = poissonAtLeast(count, expected);
  return { p, midP: p - poissonProbability(count, expected) / 2 };
}

export interface Heterogeneity {
  readonly kind: 'estimated';
  /** sum (x - E)^2 / E. */
  readonly pearson: number;
  /** 2 sum x ln (x / E). */
  readonly deviance: number;
  readonly degrees: number;
  /** Pearson's over its degrees: 1 when units are alike. */
  readonly dispersion: number;
  readonly p: number;
}

/**
 * Whether units differ by more than chance.
 *
 * @returns not estimable from fewer than two units that ran, or without any failure
 * @throws RangeError
 * @example heterogeneity(units).dispersion // 28.6
 */
export function heterogeneity(units: readonly Exposed[]): Heterogeneity | NotEstimable<'too-few-units' | 'no-failures'> {
  requireExposed(units);
  const ran = units.filter(({ exposure }) => exposure > 0);
  if (ran.length < 2) return notEstimable('too-few-units');
  const expected = expectedCounts(ran);
  let [pearson, half] = [0, 0];
  for (const [i, { count }] of ran.entries()) {
    const e = expected[i] ?? 0;
    if (e === 0) return notEstimable('no-failures');
    pearson += (count - e) ** 2 / e;
    if (count > 0) half += count * Math.log(count / e);
  }
  const degrees = ran.length - 1;
  return { kind: 'estimated', pearson, deviance: 2 * half, degrees, dispersion: pearson / degrees, p: chiSquaredTails(pearson, degrees).upper };
}
