import type { Check } from '@/lib/diagnose';
import { isUnitOf, parseQuantity, toSi, type Quantity, type UnitOf } from '@/lib/units';
import { InputError } from './input-error';

/** A unit of a quantity, as checks name it. */
function unitOf<Q extends Quantity>(quantity: Q, check: Check): UnitOf<Q> {
  const { unit = '' } = check;
  if (!isUnitOf(quantity, unit)) throw new InputError(`check "${check.id}": lib/units does not know its unit "${unit}" for ${quantity}`);
  return unit;
}

function quantityOf(check: Check): Quantity {
  if (check.quantity === undefined) throw new InputError(`check "${check.id}" is not measured`);
  return check.quantity;
}

/** An error of 5 degrees is a difference, not a temperature. */
function differenceOf(quantity: Quantity): Quantity {
  return quantity === 'temperature' ? 'temperatureDifference' : quantity;
}

/**
 * A reading in SI.
 *
 * @param check a measured check
 * @param value a number in the check's unit, or text with a unit ("48 s", "34 inH2O")
 * @throws InputError for what is neither
 */
export function readValue(check: Check, value: unknown): number {
  return readAs(quantityOf(check), check, value, 'value');
}

/** The error of a reading in SI; left out, the check's usual error, or none. */
export function readError(check: Check, error: unknown): number {
  if (error === undefined) return check.usualError ?? 0;
  return readAs(differenceOf(quantityOf(check)), check, error, 'error');
}

function readAs(quantity: Quantity, check: Check, value: unknown, key: string): number {
  const unit = unitOf(quantity, check);
  if (typeof value === 'number') return toSi(value, quantity, unit);
  if (typeof value !== 'string') throw new InputError(`check "${check.id}": "${key}" must be a number of ${unit} or a text such as "12 ${unit}"`);
  const parsed = parseQuantity(value, { quantity, defaultUnit: unit });
  if (!parsed.ok) throw new InputError(`check "${check.id}": ${parsed.message}`);
  return parsed.si;
}
