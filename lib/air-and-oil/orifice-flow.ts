import type { AbsolutePressure, Temperature } from '@/lib/units';
import { FREE_AIR_DENSITY, GAS_CONSTANT_AIR, HEAT_CAPACITY_RATIO } from './air';
import { requireNotNegative, requirePositive, requireWithin } from './out-of-range';

/** A sharp-edged hole: 0.65, as handbooks multiply their tables by. A well-rounded entrance has 0.97. */
export const SHARP_EDGED = 0.65;

/**
 * Downstream over upstream pressure at which a flow of gas chokes: (2 / (k + 1))^(k / (k - 1)).
 *
 * @example criticalPressureRatio() // 0.5283 for air
 */
export function criticalPressureRatio(k = HEAT_CAPACITY_RATIO): number {
  requireWithin('k', 'ratio', k, { least: 1.01, most: 1.7 });
  return (2 / (k + 1)) ** (k / (k - 1));
}

/**
 * The constant K of choked flow, m = K A p / sqrt(T): sqrt(k / R) (2 / (k + 1))^((k + 1) / (2 (k - 1))).
 *
 * @returns s sqrt(K) / m: 0.0404 for air. In lb, s, lbf and degrees Rankine it is 0.532, Fliegner's constant
 */
export function criticalFlowConstant(k = HEAT_CAPACITY_RATIO, gasConstant = GAS_CONSTANT_AIR): number {
  requireWithin('k', 'ratio', k, { least: 1.01, most: 1.7 });
  return Math.sqrt(k / gasConstant) * (2 / (k + 1)) ** ((k + 1) / (2 * (k - 1)));
}

/** As a share of the pressure before it: with less across it no opening can be told from its flow. */
const LEAST_DROP = 1e-9;

export interface Opening {
  readonly upstreamPressurePa: AbsolutePressure;
  readonly downstreamPressurePa: AbsolutePressure;
  readonly upstreamTemperatureK: Temperature;
  readonly dischargeCoefficient?: number;
  /** kg/m3: of the air that the flow is counted in. */
  readonly freeAirDensityKgPerM3?: number;
}

/** Mass flow through each square metre of an opening, kg/(s m2), and whether it is choked. */
function fluxThrough({ upstreamPressurePa, downstreamPressurePa, upstreamTemperatureK, dischargeCoefficient = SHARP_EDGED }: Opening) {
  requirePositive('upstreamPressurePa', 'absolutePressure', upstreamPressurePa);
  requireWithin('downstreamPressurePa', 'absolutePressure', downstreamPressurePa, { least: 0, most: upstreamPressurePa });
  requireWithin('upstreamTemperatureK', 'temperature', upstreamTemperatureK, { least: 200, most: 1500 });
  requireWithin('dischargeCoefficient', 'ratio', dischargeCoefficient, { least: 0.01, most: 1 });
  const k = HEAT_CAPACITY_RATIO;
  const ratio = downstreamPressurePa / upstreamPressurePa;
  const choked = ratio <= criticalPressureRatio();
  const perPressure = choked
    ? criticalFlowConstant()
    : Math.sqrt(((2 * k) / ((k - 1) * GAS_CONSTANT_AIR)) * (ratio ** (2 / k) - ratio ** ((k + 1) / k)));
  return { flux: (dischargeCoefficient * perPressure * upstreamPressurePa) / Math.sqrt(upstreamTemperatureK), choked };
}

/**
 * Air through a round hole.
 *
 * m = C A p1 K / sqrt(T1) where the flow chokes (p2 / p1 below 0.528), else
 * m = C A p1 sqrt(2 k / ((k - 1) R T1) (r^(2/k) - r^((k+1)/k))), r = p2 / p1
 *
 * @param diameterM m
 * @returns kg/s; m3/s of free air; whether it chokes
 * @throws OutOfRange
 * @see isentropic flow through a nozzle, any text on gas dynamics; handbook tables of air through an orifice
 * @example
 * // 1/16 in, sharp-edged, 100 psig, 70 °F
 * orificeFlow({ diameterM: 0.0015875, upstreamPressurePa, downstreamPressurePa, upstreamTemperatureK }) // 4.2 cfm, choked
 */
export function orificeFlow({ diameterM, ...opening }: Opening & { readonly diameterM: number }): { massFlowKgPerS: number; freeAirFlowM3PerS: number; choked: boolean } {
  requireNotNegative('diameterM', 'length', diameterM);
  const { flux, choked } = fluxThrough(opening);
  const massFlowKgPerS = flux * (Math.PI / 4) * diameterM ** 2;
  return { massFlowKgPerS, freeAirFlowM3PerS: massFlowKgPerS / (opening.freeAirDensityKgPerM3 ?? FREE_AIR_DENSITY), choked };
}

/**
 * The hole that lets so much air through: the inverse of `orificeFlow`.
 *
 * @param freeAirFlowM3PerS m3/s of free air
 * @returns m, the diameter
 * @throws OutOfRange also where both pressures are the same, so that nothing flows
 * @example
 * // 12 cfm from 80 psig
 * openingForFlow({ freeAirFlowM3PerS: 0.00566, upstreamPressurePa, downstreamPressurePa, upstreamTemperatureK }) // 0.00297 m
 */
export function openingForFlow({ freeAirFlowM3PerS, ...opening }: Opening & { readonly freeAirFlowM3PerS: number }): number {
  requireNotNegative('freeAirFlowM3PerS', 'flow', freeAirFlowM3PerS);
  requireWithin('downstreamPressurePa', 'absolutePressure', opening.downstreamPressurePa, { least: 0, most: opening.upstreamPressurePa * (1 - LEAST_DROP) });
  const { flux } = fluxThrough(opening);
  return Math.sqrt((freeAirFlowM3PerS * (opening.freeAirDensityKgPerM3 ?? FREE_AIR_DENSITY)) / (flux * (Math.PI / 4)));
}
