import type { Check } from '@/lib/diagnose/types';
import { differenceOf, isUnitOf, unitFor, type Quantity, type UnitId, type UnitPreferences } from '@/lib/units';

export interface Measure {
  quantity: Quantity;
  /** What a value without a unit is in: as the person set it, of the size that the check is thought of in. */
  unit: UnitId;
  /** An error is a difference: 2 °F of error is 1.1 K, not −16.7 °C. */
  difference: Quantity;
  differenceUnit: UnitId;
}

/** How a measured check's value is typed and shown; null for a check that isn't measured. */
export function measureOf({ quantity, unit }: Pick<Check, 'quantity' | 'unit'>, units: UnitPreferences): Measure | null {
  if (!quantity || !unit || !isUnitOf(quantity, unit)) return null;
  const shown = unitFor(units, quantity, unit);
  return { quantity, unit: shown, difference: differenceOf(quantity), differenceUnit: shown };
}
