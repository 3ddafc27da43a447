import type { AbsolutePressure, Temperature } from '@/lib/units';
import { delivery, volumetricEfficiency } from './delivery';
import { FREE_AIR_TEMPERATURE, airDensity } from './air';
import { openingForFlow } from './orifice-flow';

export interface BreakIn {
  readonly sweptVolumeM3: number;
  /** Turns of the compressor in a second: the engine's times the drive's ratio. */
  readonly speedHz: number;
  readonly clearance: number;
  readonly otherLosses: number;
  readonly index: number;
  readonly inletTemperatureK: Temperature;
  readonly inletPressurePa: AbsolutePressure;
  /** Pa, absolute, to be held in the wet tank. */
  readonly holdPressurePa: AbsolutePressure;
  readonly tankTemperatureK: Temperature;
  readonly dischargeCoefficient?: number;
}

/**
 * The bleed that holds a pressure while a fitted compressor is broken in, so that it never unloads: the hole that passes
 * just what it delivers against that pressure.
 *
 * @returns m, the diameter of a round hole; m3/s that it passes, counted at the pressure of the inlet and 20 °C
 * @throws OutOfRange
 * @example
 * // 19.4 in3, 1000 rpm, 80 psi
 * breakInBleed({ sweptVolumeM3: 0.000318, speedHz: 16.7, ... }) // some 2.7 mm, 9 cfm
 */
export function breakInBleed(run: BreakIn): { diameterM: number; freeAirFlowM3PerS: number } {
  const efficiency = volumetricEfficiency({ ...run, dischargePressurePa: run.holdPressurePa });
  const asTakenIn = delivery({ ...run, efficiency });
  const freeAirFlowM3PerS = asTakenIn * (FREE_AIR_TEMPERATURE / run.inletTemperatureK);
  const diameterM = openingForFlow({
    freeAirFlowM3PerS,
    upstreamPressurePa: run.holdPressurePa,
    downstreamPressurePa: run.inletPressurePa,
    upstreamTemperatureK: run.tankTemperatureK,
    dischargeCoefficient: run.dischargeCoefficient,
    freeAirDensityKgPerM3: airDensity(run.inletPressurePa, FREE_AIR_TEMPERATURE),
  });
  return { diameterM, freeAirFlowM3PerS };
}
