import type { ComponentProps } from 'react';
import { NumberWithUnitField } from '@/components/ui/NumberWithUnitField';
import { TextField } from '@/components/ui/TextField';
import { measureUnit, type MeasureField as Measure } from '@/lib/schemas/measures';
import { formatQuantity, unitDefinition, type Quantity, type UnitPreferences } from '@/lib/units';

type Props = Pick<ComponentProps<typeof NumberWithUnitField>, 'label' | 'hint' | 'id' | 'error' | 'required' | 'className'> & {
  name: string;
  defaultValue: string;
  measure: Pick<Measure, 'quantity' | 'like'>;
  units: UnitPreferences;
};

/** A measured figure in the person's unit; a figure with a unit of its own is read as well. */
export function MeasureField({ measure, units, ...field }: Props) {
  const { symbol } = unitDefinition<Quantity>(measure.quantity, measureUnit(units, measure));
  return symbol === '' ? <TextField inputMode="decimal" autoComplete="off" {...field} /> : <NumberWithUnitField {...field} unit={symbol} />;
}

/**
 * A stored measure as the person reads it; nothing where there is none. No line breaks between figure and unit, and
 * thousands are grouped whatever the quantity: as people write volumes of reservoirs themselves.
 */
export function measureText(si: number | null, measure: Pick<Measure, 'quantity' | 'like'>, units: UnitPreferences): string | null {
  if (si === null) return null;
  const text = formatQuantity<Quantity>(si, { quantity: measure.quantity, unit: measureUnit(units, measure) });
  return text.replace(/^\d{4,}/, (whole) => Number(whole).toLocaleString('en-GB')).replaceAll(' ', '\u00a0');
}
