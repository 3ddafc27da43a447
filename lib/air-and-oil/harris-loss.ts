import { fromSi, toSi, type AbsolutePressure } from '@/lib/units';
import { FOOT, PSI } from '@/lib/units/factors';
import { requireNotNegative, requirePositive } from './out-of-range';

/** The constant of the formula in its own units: feet, cfm of free air, psia and inches. */
const HARRIS = 2390;

/** Loss grows with this power of the bore that is lost. */
export const HARRIS_EXPONENT = 5.31;

export interface StraightLine {
  readonly lengthM: number;
  readonly boreM: number;
}

/** Throws unless there is a bore and no negative length. */
export function requireLine({ lengthM, boreM }: StraightLine): void {
  requireNotNegative('lengthM', 'length', lengthM);
  requirePositive('boreM', 'length', boreM);
}

/**
 * Pressure lost along a line by the formula of Harris, a fit to iron pipe: for comparing lines, not for measuring one.
 *
 * dP = L Q2 / (2390 P d^5.31), with L in ft, Q in cfm of free air, P in psia, d in inches, dP in psi
 *
 * @param freeAirFlowM3PerS m3/s of free air
 * @param linePressurePa Pa, absolute, in the line; the loss must be small beside it
 * @returns Pa
 * @throws OutOfRange
 * @see E. G. Harris, Compressed Air (McGraw-Hill), formula 28; engineersedge.com, Harris formula
 * @example
 * // 10 ft of 3/8 in, 15 cfm at 134.7 psia
 * harrisLoss({ lengthM: 3.048, boreM: 0.009525, freeAirFlowM3PerS: 0.00708, linePressurePa }) // 8807 Pa, 1.28 psi
 */
export function harrisLoss({ lengthM, boreM, freeAirFlowM3PerS, linePressurePa }: StraightLine & { freeAirFlowM3PerS: number; linePressurePa: AbsolutePressure }): number {
  requireLine({ lengthM, boreM });
  requireNotNegative('freeAirFlowM3PerS', 'flow', freeAirFlowM3PerS);
  requirePositive('linePressurePa', 'absolutePressure', linePressurePa);
  const cfm = fromSi(freeAirFlowM3PerS, 'flow', 'cfm');
  const inches = fromSi(boreM, 'length', 'in');
  const lossPsi = ((lengthM / FOOT) * cfm ** 2) / (HARRIS * (linePressurePa / PSI) * inches ** HARRIS_EXPONENT);
  return toSi(lossPsi, 'pressure', 'psi');
}

/**
 * How many times the loss grows when the whole bore shrinks: (d0 / d)^5.31 at the same flow.
 *
 * @example harrisLossRatio({ nominalBoreM: 0.0127, boreM: 0.009525 }) // 4.61: from 1/2 to 3/8 in
 */
export function harrisLossRatio({ nominalBoreM, boreM }: { nominalBoreM: number; boreM: number }): number {
  requirePositive('nominalBoreM', 'length', nominalBoreM);
  requirePositive('boreM', 'length', boreM);
  return (nominalBoreM / boreM) ** HARRIS_EXPONENT;
}
