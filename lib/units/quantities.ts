import type { QuantityDefinition, UnitDefinition } from './definition';
import { pressure, pressureRate, temperature, temperatureDifference, vacuum } from './tables/air';
import { absolutePressure, angle, concentration, density, dynamicViscosity, kinematicViscosity, power } from './tables/fluid';
import { count, ratio } from './tables/number';
import { area, displacement, distance, flow, length, mass, oilRate, volume } from './tables/size';
import { cycleRate, duration, engineHours, rotationalSpeed } from './tables/time';

/**
 * Everything that is typed with a unit or shown with one. Order matters twice: units are offered in this order, and a
 * spelling that belongs to several quantities is named in messages by the first.
 */
const TABLE = {
  pressure,
  pressureRate,
  vacuum,
  temperature,
  temperatureDifference,
  length,
  area,
  volume,
  displacement,
  mass,
  flow,
  oilRate,
  distance,
  duration,
  engineHours,
  cycleRate,
  rotationalSpeed,
  ratio,
  count,
  absolutePressure,
  kinematicViscosity,
  dynamicViscosity,
  density,
  concentration,
  power,
  angle,
};

/** The id of a quantity: 'pressure', 'length', ... */
export type Quantity = keyof typeof TABLE;

/**
 * The ids of the units of a quantity: UnitOf<'temperature'> is 'degF' | 'degC' | 'K'. Ids are plain ASCII, for storing;
 * what is shown is the unit's symbol.
 */
export type UnitOf<Q extends Quantity> = Q extends Quantity ? keyof (typeof TABLE)[Q]['units'] & string : never;

/** The id of any unit. */
export type UnitId = UnitOf<Quantity>;

/** The definitions, by quantity. */
export const QUANTITIES: Readonly<Record<Quantity, QuantityDefinition>> = TABLE;

/** The ids of all quantities, in the order they are offered. */
export const QUANTITY_IDS = Object.keys(TABLE) as readonly Quantity[];

/**
 * Whether a string, from a form or the database say, is the id of a quantity.
 *
 * @example
 * isQuantity('pressure') // true
 * isQuantity('colour')   // false
 */
export function isQuantity(id: string): id is Quantity {
  return Object.hasOwn(TABLE, id);
}

/**
 * Whether a string is the id of a unit of this quantity.
 *
 * @example
 * isUnitOf('pressure', 'psi') // true
 * isUnitOf('pressure', 'mm')  // false
 */
export function isUnitOf<Q extends Quantity>(quantity: Q, id: string): id is UnitOf<Q> {
  return Object.hasOwn(QUANTITIES[quantity].units, id);
}

/**
 * The ids of a quantity's units, in the order to offer them.
 *
 * @example
 * unitsOf('temperature') // ['degF', 'degC', 'K']
 */
export function unitsOf<Q extends Quantity>(quantity: Q): readonly UnitOf<Q>[] {
  return Object.keys(QUANTITIES[quantity].units) as UnitOf<Q>[];
}

/**
 * The definition of a unit: symbol, name, factor, decimals.
 *
 * @throws RangeError when the quantity has no such unit. That is a mistake in the program, not in what was typed.
 * @example
 * unitDefinition('temperature', 'degF').symbol // '°F'
 */
export function unitDefinition<Q extends Quantity>(quantity: Q, id: UnitOf<Q>): UnitDefinition {
  const { units } = QUANTITIES[quantity];
  const definition = Object.hasOwn(units, id) ? units[id] : undefined;
  if (!definition) throw new RangeError(`${quantity} has no unit '${id}'; it has ${Object.keys(units).join(', ')}`);
  return definition;
}

/**
 * The quantity that a difference, or an error, of a quantity is: 2 °F of error is 1.1 K, not −16.7 °C.
 *
 * @example differenceOf('temperature') // 'temperatureDifference'
 * @example differenceOf('pressure')    // 'pressure'
 */
export const differenceOf = (quantity: Quantity): Quantity => (quantity === 'temperature' ? 'temperatureDifference' : quantity);
