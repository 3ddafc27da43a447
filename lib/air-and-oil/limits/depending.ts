import { toSi, gaugePressure, type GaugePressure } from '@/lib/units';
import { requireNotNegative } from '../out-of-range';

const psi = (value: number): GaugePressure => gaugePressure(toSi(value, 'pressure', 'psi'));

/**
 * The pressure that a reservoir must stand for ten minutes: five times the compressor's cut-out, at least 500 psi.
 *
 * @param cutOutPressurePa Pa, gauge
 * @returns Pa, gauge
 * @throws OutOfRange
 * @see 49 CFR 571.121 S5.1.2.2 (the ten minutes from memory)
 * @example reservoirTestPressure(psi(120)) // 600 psi
 */
export function reservoirTestPressure(cutOutPressurePa: GaugePressure): GaugePressure {
  requireNotNegative('cutOutPressurePa', 'pressure', cutOutPressurePa);
  return gaugePressure(Math.max(5 * cutOutPressurePa, psi(500)));
}

/**
 * Where the low-air warning of a vehicle from before FMVSS 121 comes on: 55 psi or half the cut-out, whichever is less.
 *
 * @see 49 CFR 393.51(c) (from memory)
 * @example earlyVehicleWarning(psi(100)) // 50 psi
 */
export function earlyVehicleWarning(cutOutPressurePa: GaugePressure): GaugePressure {
  requireNotNegative('cutOutPressurePa', 'pressure', cutOutPressurePa);
  return gaugePressure(Math.min(psi(55), cutOutPressurePa / 2));
}

/**
 * The highest pressure that a receiver's relief valve may let build: 110 % of the maximum allowable working pressure.
 * For stationary receivers, not for a vehicle's tanks.
 *
 * @see 29 CFR 1917.155(b)(1); 30 CFR 57.13011
 * @example reliefAccumulation(psi(150)) // 165 psi
 */
export function reliefAccumulation(workingPressurePa: GaugePressure): GaugePressure {
  requireNotNegative('workingPressurePa', 'pressure', workingPressurePa);
  return gaugePressure(1.1 * workingPressurePa);
}

/**
 * What must be reached within five minutes from empty in Western Australia: 80 % of the governor's cut-out.
 *
 * @see Road Traffic (Vehicles) Regulations 2014 (WA), r 334(1)(a)
 * @example westernAustraliaBuildUp(psi(125)) // 100 psi
 */
export function westernAustraliaBuildUp(cutOutPressurePa: GaugePressure): GaugePressure {
  requireNotNegative('cutOutPressurePa', 'pressure', cutOutPressurePa);
  return gaugePressure(0.8 * cutOutPressurePa);
}
