import { requireAmount } from '../require';

/** One installed component, from when it was watched until it failed, was removed for another reason, or is still running. */
export interface Spell {
  /** Age at which watching began, in days or miles (never both in one list): 0 or absent when it was watched from new. */
  readonly entryAge?: number;
  readonly exitAge: number;
  /** Failed at `exitAge`; otherwise it was still working then. */
  readonly failed: boolean;
}

/** @throws RangeError for a negative or endless age, or an exit before entry */
export function requireSpells(spells: readonly Spell[]): void {
  for (const { entryAge = 0, exitAge } of spells) {
    requireAmount(entryAge, 'An age');
    requireAmount(exitAge, 'An age');
    if (exitAge < entryAge) throw new RangeError('A spell ends before it begins.');
  }
}

/**
 * Whether a spell was ever at risk. One that began late and ended at the same age was watched for no time: it counts nowhere.
 */
export const everAtRisk = ({ entryAge = 0, exitAge }: Spell): boolean => exitAge > entryAge || entryAge === 0;

/** What a list of spells comes to: failures, and the sum of ages run under watch. */
export function totals(spells: readonly Spell[]): { failures: number; exposure: number } {
  requireSpells(spells);
  const counted = spells.filter(everAtRisk);
  return {
    failures: counted.filter(({ failed }) => failed).length,
    exposure: counted.reduce((sum, { entryAge = 0, exitAge }) => sum + exitAge - entryAge, 0),
  };
}
