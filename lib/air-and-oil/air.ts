import { absolutePressure, temperature, type AbsolutePressure, type Temperature } from '@/lib/units';

/** Specific gas constant of dry air, J/(kg K): 8.314 462 618 / 0.028 964 6 (CIPM-2007 composition, rounded). */
export const GAS_CONSTANT_AIR = 287.05;

/** Ratio of specific heats of air near room temperature. */
export const HEAT_CAPACITY_RATIO = 1.4;

/** Free air where nobody says otherwise: 1 atm and 20 °C (68 °F). */
export const FREE_AIR_PRESSURE = absolutePressure(101_325);
export const FREE_AIR_TEMPERATURE = temperature(293.15);

/**
 * Density of air by the gas law: p / (R T).
 *
 * @returns kg/m3
 * @example airDensity(absolutePressure(101_325), temperature(293.15)) // 1.204
 */
export function airDensity(pressurePa: AbsolutePressure, temperatureK: Temperature): number {
  return pressurePa / (GAS_CONSTANT_AIR * temperatureK);
}

/** Density of free air, kg/m3: 1.204, or 0.0752 lb/ft3. */
export const FREE_AIR_DENSITY = airDensity(FREE_AIR_PRESSURE, FREE_AIR_TEMPERATURE);

/** Standard acceleration of free fall, m/s2. */
export const GRAVITY = 9.80665;
