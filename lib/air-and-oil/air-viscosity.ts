import type { Temperature } from '@/lib/units';
import { requireWithin } from './out-of-range';

const REFERENCE_VISCOSITY = 1.716e-5;
const REFERENCE_TEMPERATURE = 273.15;
const SUTHERLAND = 110.4;

/**
 * Dynamic viscosity of air by Sutherland's law.
 *
 * mu = mu0 (T / T0)^(3/2) (T0 + S) / (T + S), with mu0 = 17.16 uPa s at T0 = 273.15 K and S = 110.4 K.
 *
 * @param airTemperatureK K, 170 to 1900, where the law is within about 2 % of measurements
 * @returns Pa s
 * @throws OutOfRange
 * @see F. M. White, Viscous Fluid Flow, table 1-2 (constants from memory)
 * @example airViscosity(temperature(293.15)) // 1.81e-5
 */
export function airViscosity(airTemperatureK: Temperature): number {
  requireWithin('airTemperatureK', 'temperature', airTemperatureK, { least: 170, most: 1900 });
  return (
    (REFERENCE_VISCOSITY * (airTemperatureK / REFERENCE_TEMPERATURE) ** 1.5 * (REFERENCE_TEMPERATURE + SUTHERLAND)) / (airTemperatureK + SUTHERLAND)
  );
}
