import type { AbsolutePressure } from '@/lib/units';
import { requireNotNegative, requirePositive, requireWithin } from './out-of-range';

/**
 * Volume swept in one turn: pi / 4 bore2 stroke, by the number of cylinders.
 *
 * @returns m3
 * @throws OutOfRange
 * @example sweptVolume({ boreM: 0.08, strokeM: 0.05, cylinders: 2 }) // 0.000503 m3
 */
export function sweptVolume({ boreM, strokeM, cylinders }: { boreM: number; strokeM: number; cylinders: number }): number {
  requireNotNegative('boreM', 'length', boreM);
  requireNotNegative('strokeM', 'length', strokeM);
  requireNotNegative('cylinders', 'count', cylinders);
  return (Math.PI / 4) * boreM ** 2 * strokeM * cylinders;
}

export interface Clearance {
  /** Volume left above the piston as a share of the swept volume. */
  readonly clearance: number;
  readonly inletPressurePa: AbsolutePressure;
  readonly dischargePressurePa: AbsolutePressure;
  /** Index at which the air left behind expands again. */
  readonly index: number;
}

/**
 * The share of the swept volume that takes in fresh air: air left in the clearance expands first.
 *
 * E = 1 + c - c (p2 / p1)^(1/n)
 *
 * @returns a ratio, 0 where the air left behind fills the whole cylinder
 * @throws OutOfRange
 * @see E. G. Harris, Compressed Air, formula 11
 * @example volumetricEfficiency({ clearance: 0.05, inletPressurePa, dischargePressurePa, index: 1.3 }) // 0.775 at 120 psig
 */
export function volumetricEfficiency({ clearance, inletPressurePa, dischargePressurePa, index }: Clearance): number {
  requireWithin('clearance', 'ratio', clearance, { least: 0, most: 1 });
  requirePositive('inletPressurePa', 'absolutePressure', inletPressurePa);
  requireWithin('dischargePressurePa', 'absolutePressure', dischargePressurePa, { least: inletPressurePa });
  requireWithin('index', 'ratio', index, { least: 1, most: 2 });
  return Math.max(0, 1 + clearance - clearance * (dischargePressurePa / inletPressurePa) ** (1 / index));
}

/**
 * The clearance at which nothing is delivered any more: 1 / ((p2 / p1)^(1/n) - 1).
 *
 * @param dischargePressurePa Pa, absolute, above the inlet's
 * @returns a ratio
 * @throws OutOfRange
 * @example clearanceWithoutDelivery({ inletPressurePa, dischargePressurePa, index: 1.3 }) // 0.222 at 120 psig
 */
export function clearanceWithoutDelivery({ inletPressurePa, dischargePressurePa, index }: Omit<Clearance, 'clearance'>): number {
  requirePositive('inletPressurePa', 'absolutePressure', inletPressurePa);
  requireWithin('dischargePressurePa', 'absolutePressure', dischargePressurePa, { least: inletPressurePa * (1 + 1e-9) });
  requireWithin('index', 'ratio', index, { least: 1, most: 2 });
  return 1 / ((dischargePressurePa / inletPressurePa) ** (1 / index) - 1);
}

/**
 * Free air delivered: swept volume, turns and volumetric efficiency. It is counted at the pressure of the inlet; where
 * the air around is thinner than at the sea, the same volume holds less.
 *
 * @param speedHz turns of the compressor in a second
 * @param otherLosses share lost past valves and rings and by warming on the way in
 * @returns m3/s of air as it is at the inlet
 * @throws OutOfRange
 * @example
 * // 80 x 50 mm, two cylinders, 1250 rpm, no losses
 * delivery({ sweptVolumeM3: 0.000503, speedHz: 20.8, efficiency: 1, otherLosses: 0 }) // 0.01047: 628 L/min
 */
export function delivery({ sweptVolumeM3, speedHz, efficiency, otherLosses }: { sweptVolumeM3: number; speedHz: number; efficiency: number; otherLosses: number }): number {
  requireNotNegative('sweptVolumeM3', 'displacement', sweptVolumeM3);
  requireNotNegative('speedHz', 'rotationalSpeed', speedHz);
  requireWithin('efficiency', 'ratio', efficiency, { least: 0, most: 1 });
  requireWithin('otherLosses', 'ratio', otherLosses, { least: 0, most: 1 });
  return sweptVolumeM3 * speedHz * efficiency * (1 - otherLosses);
}
