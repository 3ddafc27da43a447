import { absolutePressure, type AbsolutePressure, type Temperature } from '@/lib/units';
import { FREE_AIR_DENSITY, GAS_CONSTANT_AIR } from './air';
import { airViscosity } from './air-viscosity';
import { DRAWN_TUBE_ROUGHNESS, frictionFactor, reynolds } from './friction-factor';
import { requireLine, type StraightLine } from './harris-loss';
import { requireNotNegative, requirePositive } from './out-of-range';

export interface HotAir {
  /** kg/s. A flow of free air times the density of free air. */
  readonly massFlowKgPerS: number;
  readonly airTemperatureK: Temperature;
  /** m, of the wall; a drawn tube where nothing is said. */
  readonly roughnessM?: number;
}

/**
 * The mass flow that a flow of free air is.
 *
 * @example massFlowOf(0.00708) // 0.00853 kg/s: 15 cfm
 */
export function massFlowOf(freeAirFlowM3PerS: number, freeAirDensityKgPerM3 = FREE_AIR_DENSITY): number {
  requireNotNegative('freeAirFlowM3PerS', 'flow', freeAirFlowM3PerS);
  requirePositive('freeAirDensityKgPerM3', 'density', freeAirDensityKgPerM3);
  return freeAirFlowM3PerS * freeAirDensityKgPerM3;
}

/** Mass flow through each square metre of a bore, kg/(s m2). */
export function massFlux(massFlowKgPerS: number, boreM: number): number {
  return massFlowKgPerS / ((Math.PI / 4) * boreM ** 2);
}

/** Below this, as good as nothing flows. */
const LEAST_REYNOLDS = 1e-9;

/** Darcy's friction factor of hot air in a line; 0 where nothing flows. */
export function lineFrictionFactor({ boreM, massFlowKgPerS, airTemperatureK, roughnessM = DRAWN_TUBE_ROUGHNESS }: HotAir & { readonly boreM: number }): number {
  const viscosityPaS = airViscosity(airTemperatureK);
  const re = reynolds({ massFlowKgPerS, boreM, viscosityPaS });
  return re > LEAST_REYNOLDS ? frictionFactor({ reynolds: re, relativeRoughness: roughnessM / boreM }) : 0;
}

/** f (L / d) G2 R T: what friction takes from the square of the pressure, Pa2. */
function squareLost(line: StraightLine, air: HotAir): number {
  requireLine(line);
  requireNotNegative('massFlowKgPerS', 'flow', air.massFlowKgPerS);
  const { lengthM, boreM } = line;
  const f = lineFrictionFactor({ boreM, ...air });
  return f * (lengthM / boreM) * massFlux(air.massFlowKgPerS, boreM) ** 2 * GAS_CONSTANT_AIR * air.airTemperatureK;
}

/**
 * Pressure lost along a line with a smooth wall, after Darcy and Weisbach, air of one temperature and one density.
 *
 * dP = f (L / d) G2 / (2 rho), G the mass flux, rho = p / (R T), f by Churchill, viscosity by Sutherland
 *
 * @param linePressurePa Pa, absolute; the loss should be below a tenth of it, else use `upstreamPressure`
 * @returns Pa
 * @throws OutOfRange
 * @see F. M. White, Fluid Mechanics, chapter 6
 * @example
 * // 10 ft of 1/2 in, 15 cfm, 150 °F, 120 psig
 * darcyWeisbachLoss({ lengthM: 3.048, boreM: 0.0127, massFlowKgPerS: 0.0085, airTemperatureK, linePressurePa }) // 1250 Pa
 */
export function darcyWeisbachLoss({ linePressurePa, lengthM, boreM, ...air }: StraightLine & HotAir & { readonly linePressurePa: AbsolutePressure }): number {
  requirePositive('linePressurePa', 'absolutePressure', linePressurePa);
  return squareLost({ lengthM, boreM }, air) / (2 * linePressurePa);
}

/**
 * Pressure at the head's end of a line, for losses of any size: Darcy and Weisbach with the density at the mean of both
 * pressures, which is the flow of a gas at one temperature without what it takes to speed it up.
 *
 * p1 = sqrt(p2^2 + f (L / d) G2 R T)
 *
 * @param downstreamPressurePa Pa, absolute
 * @returns Pa, absolute
 * @throws OutOfRange
 * @see B. S. Massey, Mechanics of Fluids, isothermal flow in a pipe
 * @example upstreamPressure({ lengthM, boreM, massFlowKgPerS, airTemperatureK, downstreamPressurePa })
 */
export function upstreamPressure({ downstreamPressurePa, lengthM, boreM, ...air }: StraightLine & HotAir & { readonly downstreamPressurePa: AbsolutePressure }): AbsolutePressure {
  requirePositive('downstreamPressurePa', 'absolutePressure', downstreamPressurePa);
  return absolutePressure(Math.sqrt(downstreamPressurePa ** 2 + squareLost({ lengthM, boreM }, air)));
}
