import { waysTo } from '@/lib/air-and-oil/sums';
import type { InputText, Writing } from '@/lib/bench/read-texts';
import type { Check } from '@/lib/diagnose/types';
import { METRIC_UNITS } from '@/lib/units';

/** The sum that a catch of several weighings is worked out by. */
export const SUM_BY_WEIGHT = 'carry-over-by-weight';

/** How `textsOfWeighings` writes: every figure with its unit, with a point, whoever weighed. */
export const WRITTEN_HERE: Writing = { units: METRIC_UNITS, decimal: '.' };

/** What was in the bottle since the weighing before. */
export interface Weighed {
  massKg: number;
  /** How far the scale can be off. */
  massErrorKg: number;
  ranS: number;
}

/** Whether a check is answered by what is caught over days: an amount an hour, by the sum or one that it stands in for. */
export function isCaught({ sum }: Pick<Check, 'sum'>): boolean {
  return sum?.output === 'perHour' && waysTo(sum.id).some(({ id }) => id === SUM_BY_WEIGHT);
}

/**
 * Weighings as the sum by weight takes them, written with a point: what went in is then kept with the finding like what
 * somebody typed on the bench. The error is of one weighing, the largest of them.
 *
 * @example textsOfWeighings([{ massKg: 0.0125, massErrorKg: 5e-4, ranS: 72_000 }]) // { weight: { value: '12.5 g', error: '0.5 g' }, readings: { value: '1' }, time: { value: '20 h' } }
 */
export function textsOfWeighings(weighed: readonly Weighed[]): Record<string, InputText> {
  const total = (of: (one: Weighed) => number) => weighed.reduce((sum, one) => sum + of(one), 0);
  return {
    weight: { value: `${hundredths(total(({ massKg }) => massKg) * 1000)} g`, error: `${hundredths(Math.max(...weighed.map(({ massErrorKg }) => massErrorKg)) * 1000)} g` },
    readings: { value: String(weighed.length) },
    time: { value: `${hundredths(total(({ ranS }) => ranS) / 3600)} h` },
  };
}

/** Two places, so that nobody takes the point for one that groups thousands. */
const hundredths = (value: number) => String(Math.round(value * 100) / 100);
