import { notEstimable, type NotEstimable } from '../result';
import { chiSquaredTails } from '../special/gamma-quantile';
import { jointRows, type TwoGroups } from './two-groups';

export interface LogRank {
  readonly kind: 'estimated';
  /** Failures of the treated, and how many they would have had if it made no difference. */
  readonly observed: number;
  readonly expected: number;
  readonly chiSquared: number;
  readonly p: number;
}

/**
 * Log-rank test of whether the treated fail as the others do, summed over strata.
 *
 * @returns not estimable when at no failure both groups were at risk
 * @throws RangeError for illegal spells
 * @see N. Mantel 1966; R. Peto and J. Peto 1972
 * @example logRank([{ treated, others }]).chiSquared // 16.79
 */
export function logRank(strata: readonly TwoGroups[]): LogRank | NotEstimable<'nothing-to-compare'> {
  let [observed, expected, variance] = [0, 0, 0];
  for (const { treatedAtRisk, treatedFailed, atRisk, failed } of strata.flatMap(jointRows)) {
    const share = treatedAtRisk / atRisk;
    observed += treatedFailed;
    expected += failed * share;
    if (atRisk > 1) variance += (failed * share * (1 - share) * (atRisk - failed)) / (atRisk - 1);
  }
  if (variance === 0) return notEstimable('nothing-to-compare');
  const chiSquared = (observed - expected) ** 2 / variance;
  return { kind: 'estimated', observed, expected, chiSquared, p: chiSquaredTails(chiSquared, 1).upper };
}
