import { absolutePressure, type AbsolutePressure } from '@/lib/units';
import { requireWithin } from './out-of-range';

/**
 * Pressure of the air around at an altitude, by the standard atmosphere.
 *
 * p = 101 325 (1 - 2.25577e-5 h)^5.25588
 *
 * @param altitudeM m above sea level, -500 to 5000
 * @returns Pa, absolute. Weather moves it by some 3 %.
 * @throws OutOfRange
 * @see U.S. Standard Atmosphere 1976 / ISO 2533, troposphere
 * @example standardAtmosphere(1609.344) // 83 437: a mile up, 12.1 psia
 */
export function standardAtmosphere(altitudeM: number): AbsolutePressure {
  requireWithin('altitudeM', 'length', altitudeM, { least: -500, most: 5000 });
  return absolutePressure(101_325 * (1 - 2.25577e-5 * altitudeM) ** 5.25588);
}
