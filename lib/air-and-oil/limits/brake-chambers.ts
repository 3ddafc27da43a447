import { toSi } from '@/lib/units';

const in3 = (value: number) => toSi(value, 'volume', 'in3');

/**
 * Rated volume of a service brake chamber at full stroke by its type (the nominal area in square inches), m3.
 *
 * @see 49 CFR 571.121, table V (from memory)
 */
export const CHAMBER_VOLUMES = {
  9: in3(25),
  12: in3(30),
  14: in3(40),
  16: in3(46),
  18: in3(50),
  20: in3(54),
  24: in3(67),
  30: in3(89),
  36: in3(135),
} as const;

/** The type number of a brake chamber. */
export type ChamberType = keyof typeof CHAMBER_VOLUMES;

/**
 * The volume of all service chambers of a vehicle.
 *
 * @param chambers how many of each type
 * @returns m3
 * @example chamberVolume({ 20: 2, 30: 4 }) // 464 in3
 */
export function chamberVolume(chambers: Partial<Record<ChamberType, number>>): number {
  return Object.entries(CHAMBER_VOLUMES).reduce((sum, [type, volume]) => sum + volume * (chambers[Number(type) as ChamberType] ?? 0), 0);
}
