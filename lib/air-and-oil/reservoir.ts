import { requireNotNegative, requirePositive } from './out-of-range';

/** Reservoirs hold so many times what the service chambers do. */
const CHAMBERS_FULL = 12;

/** Seconds allowed from 85 to 100 psi where the reservoirs are just as large as required. */
const BUILD_UP_ALLOWED = 25;

/**
 * The reservoir volume that a truck or bus must have: 12 times the volume of its service chambers at full stroke.
 *
 * @param chamberVolumeM3 m3, of all service brake chambers together, by their rated volumes
 * @returns m3
 * @throws OutOfRange
 * @see 49 CFR 571.121 S5.1.2.1
 * @example requiredReservoirVolume(0.0076036) // 0.0912 m3: two of 54 in3 and four of 89 in3 need 5568 in3
 */
export function requiredReservoirVolume(chamberVolumeM3: number): number {
  requireNotNegative('chamberVolumeM3', 'volume', chamberVolumeM3);
  return CHAMBERS_FULL * chamberVolumeM3;
}

/**
 * The time allowed for building up from 85 to 100 psi at the engine's maximum recommended speed: it grows with the tanks.
 *
 * t = 25 s x actual / required volume
 *
 * @returns s. It binds new vehicles; in service it is a reference
 * @throws OutOfRange
 * @see 49 CFR 571.121 S5.1.1
 * @example buildUpLimit({ actualVolumeM3: 0.0737, requiredVolumeM3: 0.0492 }) // 37.5: 4500 in3 where 3000 are required
 */
export function buildUpLimit({ actualVolumeM3, requiredVolumeM3 }: { actualVolumeM3: number; requiredVolumeM3: number }): number {
  requireNotNegative('actualVolumeM3', 'volume', actualVolumeM3);
  requirePositive('requiredVolumeM3', 'volume', requiredVolumeM3);
  return BUILD_UP_ALLOWED * (actualVolumeM3 / requiredVolumeM3);
}
