import { noLimits, onLogScale, Z_95, type Limits } from '../result';
import { requireAmount } from '../require';
import { riskTable, rowAt, type RiskRow } from './risk-table';
import type { Spell } from './spell';

export interface HazardStep extends RiskRow {
  readonly hazard: number;
  readonly standardError: number;
  readonly limits: Limits<'no-failures-yet'>;
}

/** How failures at one age are counted: all at once (Nelson, Aalen), or one after another (Fleming, Harrington). */
export type Ties = 'together' | 'one-after-another';

/**
 * Cumulative hazard H = sum d / n with se sqrt(sum d / n^2) and limits H exp(±z se / H); one after another, each failure at
 * an age meets one fewer at risk.
 *
 * @throws RangeError for illegal spells
 * @see W. Nelson 1969; O. Aalen 1978; T. R. Fleming and D. P. Harrington 1984
 * @example hazardAt(cumulativeHazard(spells), 56).hazard // 0.161
 */
export function cumulativeHazard(spells: readonly Spell[], { ties = 'together', z = Z_95 }: { ties?: Ties; z?: number } = {}): HazardStep[] {
  let hazard = 0;
  let variance = 0;
  return riskTable(spells).map((row): HazardStep => {
    const { atRisk, failed } = row;
    for (let k = 0; k < failed; k += 1) {
      const n = ties === 'together' ? atRisk : atRisk - k;
      hazard += 1 / n;
      variance += 1 / (n * n);
    }
    const standardError = Math.sqrt(variance);
    return { ...row, hazard, standardError, limits: hazard > 0 ? onLogScale(hazard, standardError / hazard, z) : noLimits('no-failures-yet') };
  });
}

/** The hazard that has been met by an age; 0 before the first step. */
export function hazardAt(steps: readonly HazardStep[], age: number): Pick<HazardStep, 'hazard' | 'standardError' | 'limits'> {
  requireAmount(age, 'An age');
  return rowAt(steps, age) ?? { hazard: 0, standardError: 0, limits: noLimits('no-failures-yet') };
}
