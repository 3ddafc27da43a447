import type { AbsolutePressure } from '@/lib/units';
import { HEAT_CAPACITY_RATIO } from './air';
import { requirePositive, requireWithin } from './out-of-range';

interface Ends {
  readonly inletPressurePa: AbsolutePressure;
  readonly dischargePressurePa: AbsolutePressure;
}

function pressureRatio({ inletPressurePa, dischargePressurePa }: Ends): number {
  requirePositive('inletPressurePa', 'absolutePressure', inletPressurePa);
  requireWithin('dischargePressurePa', 'absolutePressure', dischargePressurePa, { least: inletPressurePa });
  return dischargePressurePa / inletPressurePa;
}

/**
 * Mean effective pressure of an adiabatic compression: the work of one intake, spread over the volume that it took in.
 * A pressure times the free air taken in per second is a power.
 *
 * MEP = N p1 k / (k - 1) ((p2 / p1)^((k - 1) / (N k)) - 1), N stages with perfect cooling between them
 *
 * @param stages 1 or more; an integer
 * @param friction share of the work added for friction: 0.15 is what handbooks add
 * @returns Pa
 * @throws OutOfRange
 * @see Machinery's Handbook, 31st edition, tables 36 and 37 (k about 1.406, so some 0.4 % above k = 1.4)
 * @example
 * // 14.7 to 114.7 psia
 * adiabaticMeanEffectivePressure({ inletPressurePa, dischargePressurePa }) // 283 300 Pa, 41.1 psi
 */
export function adiabaticMeanEffectivePressure({ stages = 1, friction = 0, ...ends }: Ends & { readonly stages?: number; readonly friction?: number }): number {
  requireWithin('stages', 'count', stages, { least: 1, most: 8 });
  requireWithin('friction', 'ratio', friction, { least: 0, most: 1 });
  const ratio = pressureRatio(ends);
  const k = HEAT_CAPACITY_RATIO;
  return stages * ends.inletPressurePa * (k / (k - 1)) * (ratio ** ((k - 1) / (stages * k)) - 1) * (1 + friction);
}

/**
 * Mean effective pressure of a compression without any warming: the least work there is.
 *
 * MEP = p1 ln(p2 / p1)
 *
 * @returns Pa
 * @throws OutOfRange
 * @see Machinery's Handbook, 31st edition, table 36
 * @example isothermalMeanEffectivePressure({ inletPressurePa, dischargePressurePa }) // 14.7 to 134.7 psia: 32.6 psi
 */
export function isothermalMeanEffectivePressure(ends: Ends): number {
  return ends.inletPressurePa * Math.log(pressureRatio(ends));
}

/**
 * The power that goes into the air: mean effective pressure times free air taken in.
 *
 * @param meanEffectivePressurePa Pa
 * @param freeAirFlowM3PerS m3/s, at the pressure and temperature of the inlet
 * @returns W
 * @example compressionPower({ meanEffectivePressurePa: 283_300, freeAirFlowM3PerS: 0.00566 }) // 1603 W for 12 cfm
 */
export function compressionPower({ meanEffectivePressurePa, freeAirFlowM3PerS }: { meanEffectivePressurePa: number; freeAirFlowM3PerS: number }): number {
  requireWithin('meanEffectivePressurePa', 'pressure', meanEffectivePressurePa, { least: 0 });
  requireWithin('freeAirFlowM3PerS', 'flow', freeAirFlowM3PerS, { least: 0 });
  return meanEffectivePressurePa * freeAirFlowM3PerS;
}

/**
 * The pressure between two stages that shares the work evenly: p = sqrt(p1 p2).
 *
 * @returns Pa, absolute
 * @example interstagePressure({ inletPressurePa, dischargePressurePa }) // 14.7 and 134.7 psia: 44.5 psia, 29.8 psig
 */
export function interstagePressure(ends: Ends): AbsolutePressure {
  return (ends.inletPressurePa * Math.sqrt(pressureRatio(ends))) as AbsolutePressure;
}
