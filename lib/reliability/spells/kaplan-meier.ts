import { noLimits, twoSided, Z_95, type NoLimits, type Reached, type TwoSided } from '../result';
import { requireAmount, requireShare } from '../require';
import { riskTable, rowAt, type RiskRow } from './risk-table';
import type { Spell } from './spell';

/** Below so many at risk a curve is drawn no further, or marked. Common practice, no source. */
export const LEAST_AT_RISK = 5;

export type SurvivalLimits = TwoSided | NoLimits<'no-failures-yet' | 'none-left'>;

export interface SurvivalStep extends RiskRow {
  /** Share that is still working just after this age. */
  readonly survival: number;
  /** By Greenwood; undefined once none is left, when the formula has no value. */
  readonly standardError: number | undefined;
  /** On the scale of ln(-ln S). */
  readonly limits: SurvivalLimits;
  /** Fewer than five are at risk: what the curve does from here on rests on single components. */
  readonly few: boolean;
}

export interface SurvivalCurve {
  readonly steps: readonly SurvivalStep[];
  readonly failures: number;
  readonly spells: number;
  /** Survival is of those that work at this age: 0, or later where few were watched early. */
  readonly startAge: number;
  /** The oldest that any was seen. */
  readonly watchedTo: number;
}

/**
 * Kaplan and Meier's estimate of how long components last, with Greenwood's standard error and log-log limits.
 *
 * S(t) = prod (1 - d / n); se = S sqrt(G), G = sum d / (n (n - d)); limits S^exp(±z sqrt(G) / ln S)
 *
 * @param startAge later than 0, the curve is S(t | T > startAge): for records that begin so late that the first failures
 *   would meet hardly any at risk, which alone could bring the curve to zero for ever
 * @param z normal deviate of the limits
 * @throws RangeError for illegal spells
 * @see E. L. Kaplan and P. Meier 1958; NIST/SEMATECH e-Handbook 8.2.1.5
 * @example survivalAt(kaplanMeier(spells), 365).survival // 0.82
 */
export function kaplanMeier(spells: readonly Spell[], { startAge = 0, z = Z_95 }: { startAge?: number; z?: number } = {}): SurvivalCurve {
  requireAmount(startAge, 'An age');
  const rows = riskTable(spells).filter(({ age }) => startAge === 0 || age > startAge);
  let survival = 1;
  let greenwood = 0;
  const steps = rows.map((row): SurvivalStep => {
    const { atRisk, failed } = row;
    survival *= 1 - failed / atRisk;
    if (failed < atRisk) greenwood += failed / (atRisk * (atRisk - failed));
    const standardError = survival > 0 ? survival * Math.sqrt(greenwood) : undefined;
    return { ...row, survival, standardError, limits: logLogLimits(survival, greenwood, z), few: atRisk < LEAST_AT_RISK };
  });
  return {
    steps,
    failures: rows.reduce((sum, { failed }) => sum + failed, 0),
    spells: rows.reduce((sum, { failed, censored }) => sum + failed + censored, 0),
    startAge,
    watchedTo: rows.at(-1)?.age ?? startAge,
  };
}

function logLogLimits(survival: number, greenwood: number, z: number): SurvivalLimits {
  if (survival === 0) return noLimits('none-left');
  if (survival === 1) return noLimits('no-failures-yet');
  const theta = (z * Math.sqrt(greenwood)) / Math.log(survival);
  return twoSided(survival ** Math.exp(-theta), survival ** Math.exp(theta));
}

export type SurvivalAt = Pick<SurvivalStep, 'survival' | 'standardError' | 'limits'>;

/**
 * Survival at an age: that of the last step before it. Beyond `watchedTo` nothing was seen; ask no further.
 *
 * @returns survival 1, without limits, before the first step
 */
export function survivalAt({ steps }: SurvivalCurve, age: number): SurvivalAt {
  requireAmount(age, 'An age');
  return rowAt(steps, age) ?? { survival: 1, standardError: 0, limits: noLimits('no-failures-yet') };
}

/** So much may a product of shares miss 1 - p by rounding alone. */
const ROUNDING = 1e-12;

/**
 * The age by which a share has failed (0.1: B10; 0.5: the median), and its limits: the first at which the curve, its lower
 * and its upper limit have come down to 1 - share. Never extrapolated.
 *
 * @param share above 0 and below 1
 * @throws RangeError
 * @example ageAtShareFailed(curve, 0.5).estimate // { kind: 'not-reached', watchedTo: 200 }
 */
export function ageAtShareFailed(curve: SurvivalCurve, share: number): { estimate: Reached; lower: Reached; upper: Reached } {
  requireShare(share);
  const first = (of: (step: SurvivalStep) => number | undefined): Reached => {
    const step = curve.steps.find((each) => (of(each) ?? 1) <= 1 - share + ROUNDING);
    return step ? { kind: 'reached', age: step.age } : { kind: 'not-reached', watchedTo: curve.watchedTo };
  };
  return {
    estimate: first(({ survival }) => survival),
    lower: first(({ limits }) => (limits.kind === 'two-sided' ? limits.lower : undefined)),
    upper: first(({ limits }) => (limits.kind === 'two-sided' ? limits.upper : undefined)),
  };
}

/**
 * Difference in the share that has failed by an age, first less second, with normal limits from both Greenwood variances.
 *
 * @returns limits of kind none when either curve has no standard error there
 */
export function differenceInShareFailed(first: SurvivalCurve, second: SurvivalCurve, age: number, z = Z_95) {
  const [one, two] = [survivalAt(first, age), survivalAt(second, age)];
  const difference = two.survival - one.survival;
  if (one.standardError === undefined || two.standardError === undefined) return { difference, limits: noLimits('none-left') };
  const standardError = Math.hypot(one.standardError, two.standardError);
  if (standardError === 0) return { difference, limits: noLimits('no-failures-yet') };
  return { difference, standardError, limits: twoSided(difference - z * standardError, difference + z * standardError) };
}
