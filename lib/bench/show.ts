import type { SumQuantity } from '@/lib/air-and-oil/sums/sum';
import { formatQuantity, formatValue, fromSi, unitDefinition, unitFor, type Quantity, type UnitOf } from '@/lib/units';
import type { Writing } from './read-texts';

type Shown = Pick<SumQuantity, 'quantity' | 'like'>;

const optionsFor = ({ quantity, like }: Shown, { units, decimal }: Writing, significant?: number) => ({
  quantity,
  unit: unitFor<Quantity>(units, quantity, like as UnitOf<Quantity>),
  significant,
  decimal,
});

/** A quantity of a sum in the person's unit: "15.3 s". */
export const shown = (si: number, of: Shown, writing: Writing, significant?: number): string => formatQuantity<Quantity>(si, optionsFor(of, writing, significant));

/** The number alone. */
export const shownValue = (si: number, of: Shown, writing: Writing, significant?: number): string => formatValue<Quantity>(si, optionsFor(of, writing, significant));

/** The same as a bare number, for a plot. */
export function shownNumber(si: number, of: Shown, { units }: Pick<Writing, 'units'>): number {
  const { quantity, unit } = optionsFor(of, { units });
  return fromSi(si, quantity, unit);
}

/** The symbol of the unit that it is shown in: "psi"; empty for a bare number. */
export function symbolOf(of: Shown, { units }: Pick<Writing, 'units'>): string {
  const { quantity, unit } = optionsFor(of, { units });
  return unitDefinition(quantity, unit).symbol;
}
