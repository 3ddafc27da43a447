import { unitDefinition, type Quantity, type UnitOf } from './quantities';

/**
 * Binary noise is cut at 15 significant digits, so that 57 % is 0.57 and not 0.5700000000000001: a value typed at the
 * edge of a band must not fall outside it.
 */
const SIGNIFICANT = 15;

function clean(value: number): number {
  const rounded = Number(value.toPrecision(SIGNIFICANT));
  return rounded === 0 ? 0 : rounded; // no minus zero
}

/**
 * A value in one of its units, in SI.
 *
 * @param value a finite number in `unit`
 * @returns the value in the quantity's SI unit: Pa, m, m3, K, s, kg, 1/s or a plain number
 * @throws RangeError when the quantity has no such unit
 * @example
 * toSi(120, 'pressure', 'psi')   // 827370.87518...
 * toSi(-40, 'temperature', 'degF') // 233.15
 */
export function toSi<Q extends Quantity>(value: number, quantity: Q, unit: UnitOf<Q>): number {
  const { factor, offset } = unitDefinition(quantity, unit);
  return clean((value + offset) * factor);
}

/**
 * An SI value in one of its units: the inverse of `toSi`.
 *
 * @throws RangeError when the quantity has no such unit
 * @example
 * fromSi(100_000, 'pressure', 'psi') // 14.5037737730...
 */
export function fromSi<Q extends Quantity>(si: number, quantity: Q, unit: UnitOf<Q>): number {
  const { factor, offset } = unitDefinition(quantity, unit);
  return clean(si / factor - offset);
}

/**
 * A value from one unit into another of the same quantity.
 *
 * @throws RangeError when the quantity has no such unit
 * @example
 * convert(-40, 'temperature', 'degF', 'degC') // -40
 */
export function convert<Q extends Quantity>(value: number, quantity: Q, from: UnitOf<Q>, to: UnitOf<Q>): number {
  return fromSi(toSi(value, quantity, from), quantity, to);
}
