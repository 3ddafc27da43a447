import { notEstimable, twoSided, Z_95, type NotEstimable, type TwoSided } from '../result';
import { wilson } from '../wilson';

/** So many of so many. */
export interface CountOf {
  readonly count: number;
  readonly of: number;
}

export interface RiskDifference {
  readonly kind: 'estimated';
  readonly difference: number;
  readonly limits: TwoSided;
}

/**
 * First share less the second, with Newcombe's limits from Wilson's of each.
 *
 * L = D - sqrt((p1 - l1)^2 + (u2 - p2)^2), U = D + sqrt((u1 - p1)^2 + (p2 - l2)^2)
 *
 * @returns not estimable when one is of none
 * @throws RangeError when counts cannot be
 * @see R. G. Newcombe, Statistics in Medicine 17, 1998, method 10
 * @example riskDifference({ count: 56, of: 70 }, { count: 48, of: 80 }) // 0.2, 0.052 to 0.334
 */
export function riskDifference(first: CountOf, second: CountOf, z = Z_95): RiskDifference | NotEstimable<'nothing-counted'> {
  const [one, two] = [wilson(first.count, first.of, z), wilson(second.count, second.of, z)];
  if (one.kind === 'not-estimable' || two.kind === 'not-estimable') return notEstimable('nothing-counted');
  const difference = one.share - two.share;
  return {
    kind: 'estimated',
    difference,
    limits: twoSided(
      difference - Math.hypot(one.share - one.limits.lower, two.limits.upper - two.share),
      difference + Math.hypot(one.limits.upper - one.share, two.share - two.limits.lower),
    ),
  };
}
