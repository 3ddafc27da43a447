/**
 * What people type and what they are shown: quantities with their units, parsed into SI and back. Pure, without
 * dependencies, for server and browser alike.
 */
export {
  ATMOSPHERE,
  absolutePressure,
  gaugePressure,
  hotterBy,
  temperature,
  temperatureDifference,
  toAbsolute,
  toGauge,
  warmed,
  type AbsolutePressure,
  type GaugePressure,
  type Temperature,
  type TemperatureDifference,
} from './absolute';
export { convert, fromSi, toSi } from './convert';
export type { QuantityDefinition, UnitDefinition } from './definition';
export { formatQuantity, formatValue, type FormatOptions } from './format';
export type { DecimalMark } from './number';
export { parseError, withoutPlusMinus } from './parse-error';
export { parseQuantity, type ParsedQuantity, type ParseOptions } from './parse';
export { METRIC_UNITS, US_UNITS, unitFor, withUnits, type UnitPreferences } from './preferences';
export {
  QUANTITIES,
  QUANTITY_IDS,
  differenceOf,
  isQuantity,
  isUnitOf,
  unitDefinition,
  unitsOf,
  type Quantity,
  type UnitId,
  type UnitOf,
} from './quantities';
export type { RefusedQuantity } from './refusal';
