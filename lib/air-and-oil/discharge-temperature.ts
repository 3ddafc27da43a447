import { temperature, type AbsolutePressure, type Temperature } from '@/lib/units';
import { requirePositive, requireWithin } from './out-of-range';

export interface Compression {
  readonly inletTemperatureK: Temperature;
  readonly inletPressurePa: AbsolutePressure;
  readonly dischargePressurePa: AbsolutePressure;
}

/** The index of compression taken for a small, partly cooled piston compressor: a reference, not a bound. */
export const REFERENCE_INDEX = { least: 1.3, most: 1.4 } as const;

/** Throws unless the three make a compression: a discharge pressure no lower than the inlet's. */
export function requireCompression({ inletTemperatureK, inletPressurePa, dischargePressurePa }: Compression): void {
  requireWithin('inletTemperatureK', 'temperature', inletTemperatureK, { least: 200, most: 400 });
  requirePositive('inletPressurePa', 'absolutePressure', inletPressurePa);
  requireWithin('dischargePressurePa', 'absolutePressure', dischargePressurePa, { least: inletPressurePa, most: 1e7 });
}

/**
 * Temperature of air after a polytropic compression.
 *
 * T2 = T1 (p2 / p1)^((n - 1) / n), absolute pressures and temperatures. n = 1.4 is the isentropic case of a perfect gas.
 *
 * @param index n, 1 to 2: 1.3 to 1.4 is a reference band. A cooled head reads below it; air that a leaking valve lets
 *   be compressed again and again can pass it
 * @returns K
 * @throws OutOfRange
 * @see any text on thermodynamics; engdesign.co.nz/hrcompress.htm
 * @example
 * // 70 °F, 14.7 to 134.7 psia, n = 1.3
 * dischargeTemperature({ inletTemperatureK, inletPressurePa, dischargePressurePa, index: 1.3 }) // 490.6 K, 423 °F
 */
export function dischargeTemperature({ index, ...compression }: Compression & { readonly index: number }): Temperature {
  requireCompression(compression);
  requireWithin('index', 'ratio', index, { least: 1, most: 2 });
  const { inletTemperatureK, inletPressurePa, dischargePressurePa } = compression;
  return temperature(inletTemperatureK * (dischargePressurePa / inletPressurePa) ** ((index - 1) / index));
}
