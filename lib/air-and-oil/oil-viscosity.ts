import type { Temperature } from '@/lib/units';
import { requirePositive, requireWithin } from './out-of-range';

/** One line of an oil's data sheet. */
export interface ViscosityPoint {
  readonly temperatureK: Temperature;
  /** m2/s, kinematic. */
  readonly viscosityM2PerS: number;
}

const CENTISTOKE = 1e-6;
const lg = Math.log10;

/** lg lg (nu + 0.7), nu in cSt: straight in lg T. */
const twofold = (viscosityM2PerS: number) => lg(lg(viscosityM2PerS / CENTISTOKE + 0.7));

/** The straight line through an oil's two points: lg lg (nu + 0.7) = A - B lg T. */
export interface ViscosityLine {
  readonly a: number;
  readonly b: number;
}

/**
 * The line of ASTM D341 through two measured points.
 *
 * @param first,second two temperatures that differ, each with its viscosity of 2 to 2e7 cSt (below, the standard has
 *   further terms)
 * @throws OutOfRange
 * @see ASTM D341, annex A1, for viscosities of 2 cSt and more
 * @example viscosityLine({ temperatureK: 313, viscosityM2PerS: 32e-6 }, { temperatureK: 373, viscosityM2PerS: 5.4e-6 }) // a = 9.526
 */
export function viscosityLine(first: ViscosityPoint, second: ViscosityPoint): ViscosityLine {
  for (const { temperatureK, viscosityM2PerS } of [first, second]) {
    requirePositive('temperatureK', 'temperature', temperatureK);
    requireWithin('viscosityM2PerS', 'kinematicViscosity', viscosityM2PerS, { least: 2 * CENTISTOKE, most: 2e7 * CENTISTOKE });
  }
  const apart = lg(second.temperatureK) - lg(first.temperatureK);
  requirePositive('temperatureK', 'temperatureDifference', Math.abs(apart));
  const b = (twofold(first.viscosityM2PerS) - twofold(second.viscosityM2PerS)) / apart;
  return { a: twofold(first.viscosityM2PerS) + b * lg(first.temperatureK), b };
}

/**
 * Kinematic viscosity of an oil at a temperature, by ASTM D341.
 *
 * nu = 10^(10^(A - B lg T)) - 0.7, nu in cSt
 *
 * @returns m2/s. Below about -20 °C an engine oil is thicker than this says
 * @throws OutOfRange
 * @example
 * // 110 cSt at 40 °C, 14.8 cSt at 100 °C
 * oilViscosity(line, temperature(393.15)) // 9.6 cSt at 120 °C
 */
export function oilViscosity({ a, b }: ViscosityLine, temperatureK: Temperature): number {
  requireWithin('temperatureK', 'temperature', temperatureK, { least: 200, most: 600 });
  return (10 ** (10 ** (a - b * lg(temperatureK))) - 0.7) * CENTISTOKE;
}
