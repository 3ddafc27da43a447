import { toSi, unitFor } from '@/lib/units';
import type { Writing } from './read-texts';
import { shown } from './show';

const PSI = { quantity: 'pressure', like: 'psi' } as const;

/** Figures of a pressure gauge: the pressure that is meant stands behind, as it was written. */
const FIGURES = 3;

/**
 * A pressure that a regulation sets, in the person's unit with the figure of the regulation behind it: rounding moves no limit.
 *
 * @param psi gauge, as it is written in the regulation
 * @example regulationPressure(85, { units: METRIC_UNITS }) // '586 kPa (85 psi)'; '85 psi' to who reads psi
 */
export function regulationPressure(psi: number, writing: Writing): string {
  const written = `${psi} psi`;
  return unitFor(writing.units, 'pressure', 'psi') === 'psi' ? written : `${shown(toSi(psi, 'pressure', 'psi'), PSI, writing, FIGURES)} (${written})`;
}
