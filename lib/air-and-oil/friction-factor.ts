import { requireNotNegative, requirePositive } from './out-of-range';

/** Height of the unevenness of a drawn tube, m: as smooth as a wall comes. */
export const DRAWN_TUBE_ROUGHNESS = 1.5e-6;

/**
 * Darcy's friction factor of a round pipe, laminar, turbulent and between, by the formula of Churchill.
 *
 * f = 8 ((8 / Re)^12 + (A + B)^-1.5)^(1/12)
 * A = (2.457 ln(1 / ((7 / Re)^0.9 + 0.27 e / d)))^16, B = (37 530 / Re)^16
 *
 * @param reynolds greater than zero
 * @param relativeRoughness e / d, 0 for a perfectly smooth wall
 * @returns Darcy's factor (four times Fanning's): 64 / Re in laminar flow
 * @throws OutOfRange
 * @see S. W. Churchill, Chemical Engineering 84 (24), 1977, pp. 91-92
 * @example frictionFactor({ reynolds: 42_134, relativeRoughness: 0.000118 }) // 0.0222
 */
export function frictionFactor({ reynolds, relativeRoughness = 0 }: { reynolds: number; relativeRoughness?: number }): number {
  requirePositive('reynolds', 'count', reynolds);
  requireNotNegative('relativeRoughness', 'ratio', relativeRoughness);
  const a = (2.457 * Math.log(1 / ((7 / reynolds) ** 0.9 + 0.27 * relativeRoughness))) ** 16;
  const b = (37_530 / reynolds) ** 16;
  return 8 * ((8 / reynolds) ** 12 + (a + b) ** -1.5) ** (1 / 12);
}

/**
 * Reynolds' number of a mass flow in a round pipe: 4 m / (pi d mu).
 *
 * @param massFlowKgPerS kg/s
 * @param viscosityPaS Pa s, dynamic
 * @example reynolds({ massFlowKgPerS: 0.0085, boreM: 0.0127, viscosityPaS: 2.03e-5 }) // 41 979
 */
export function reynolds({ massFlowKgPerS, boreM, viscosityPaS }: { massFlowKgPerS: number; boreM: number; viscosityPaS: number }): number {
  return (4 * massFlowKgPerS) / (Math.PI * boreM * viscosityPaS);
}
