import { STANDARD_ATMOSPHERE } from './factors';

declare const meaning: unique symbol;

/** Pascals above the air around, as a gauge shows them. */
export type GaugePressure = number & { readonly [meaning]: 'gauge pressure' };

/** Pascals above a perfect vacuum, as the gas laws need them. */
export type AbsolutePressure = number & { readonly [meaning]: 'absolute pressure' };

/** Kelvin: a point on the scale. */
export type Temperature = number & { readonly [meaning]: 'temperature' };

/** Kelvin: how much hotter, of either sign. */
export type TemperatureDifference = number & { readonly [meaning]: 'temperature difference' };

/** Says that a number of pascals is a gauge pressure. `gaugePressure(toSi(120, 'pressure', 'psi'))` */
export const gaugePressure = (pa: number): GaugePressure => pa as GaugePressure;

/** Says that a number of pascals is an absolute pressure. `absolutePressure(101_325)` */
export const absolutePressure = (pa: number): AbsolutePressure => pa as AbsolutePressure;

/** Says that a number of kelvin is a temperature. `temperature(toSi(70, 'temperature', 'degF'))` */
export const temperature = (kelvin: number): Temperature => kelvin as Temperature;

/** Says that a number of kelvin is a difference. `temperatureDifference(toSi(20, 'temperatureDifference', 'degF'))` */
export const temperatureDifference = (kelvin: number): TemperatureDifference => kelvin as TemperatureDifference;

/** The standard atmosphere, 101 325 Pa: the air around where nobody says otherwise. */
export const ATMOSPHERE = absolutePressure(STANDARD_ATMOSPHERE);

/**
 * What a gauge shows, counted from a perfect vacuum.
 *
 * @param gaugePa Pa, gauge
 * @param atmospherePa Pa, absolute: the air around
 * @example toAbsolute(gaugePressure(827_371)) // 928 696
 */
export function toAbsolute(gaugePa: GaugePressure, atmospherePa: AbsolutePressure = ATMOSPHERE): AbsolutePressure {
  return absolutePressure(gaugePa + atmospherePa);
}

/**
 * What a gauge would show: the inverse of `toAbsolute`.
 *
 * @example toGauge(absolutePressure(928_696)) // 827 371
 */
export function toGauge(absolutePa: AbsolutePressure, atmospherePa: AbsolutePressure = ATMOSPHERE): GaugePressure {
  return gaugePressure(absolutePa - atmospherePa);
}

/**
 * How much hotter one thing is than another.
 *
 * @example hotterBy(temperature(373.15), temperature(293.15)) // 80
 */
export function hotterBy(hotK: Temperature, coldK: Temperature): TemperatureDifference {
  return temperatureDifference(hotK - coldK);
}

/**
 * A temperature so much hotter, or colder where the difference is negative.
 *
 * @example warmed(temperature(293.15), temperatureDifference(80)) // 373.15
 */
export function warmed(fromK: Temperature, byK: TemperatureDifference): Temperature {
  return temperature(fromK + byK);
}
