import { OutOfRange, requireNotNegative, requirePositive, requireWithin } from './out-of-range';

/**
 * Oil caught per hour.
 *
 * @param caughtM3 m3 of oil, all readings together
 * @param timeS s that the engine ran meanwhile
 * @returns m3/s
 * @throws OutOfRange
 * @example oilPerTime({ caughtM3: 30e-6, timeS: 20 * 3600 }) // 1.5 mL/h
 */
export function oilPerTime({ caughtM3, timeS }: { caughtM3: number; timeS: number }): number {
  requireNotNegative('caughtM3', 'volume', caughtM3);
  requirePositive('timeS', 'duration', timeS);
  return caughtM3 / timeS;
}

/**
 * Oil caught per hour that the compressor was loaded: oil travels with air.
 *
 * @param shareLoaded ratio, above 0 to 1
 * @returns m3/s
 * @throws OutOfRange
 * @example oilPerLoadedTime({ caughtM3: 30e-6, timeS: 20 * 3600, shareLoaded: 0.25 }) // 6 mL per loaded hour
 */
export function oilPerLoadedTime({ shareLoaded, ...caught }: { caughtM3: number; timeS: number; shareLoaded: number }): number {
  requireWithin('shareLoaded', 'ratio', shareLoaded, { least: Number.MIN_VALUE, most: 1 });
  return oilPerTime(caught) / shareLoaded;
}

/**
 * Oil in each cubic metre of free air that was delivered.
 *
 * @param oilDensityKgPerM3 kg/m3
 * @param deliveryM3PerS m3/s of free air while loaded
 * @returns kg/m3
 * @throws OutOfRange
 * @example
 * // 1 fl oz in 8 h, 0.87 g/mL, 10 cfm for a fifth of the time
 * oilContent({ caughtM3, timeS, shareLoaded: 0.2, oilDensityKgPerM3: 870, deliveryM3PerS }) // 946 mg/m3
 */
export function oilContent({ oilDensityKgPerM3, deliveryM3PerS, ...loaded }: { caughtM3: number; timeS: number; shareLoaded: number; oilDensityKgPerM3: number; deliveryM3PerS: number }): number {
  requirePositive('oilDensityKgPerM3', 'density', oilDensityKgPerM3);
  requirePositive('deliveryM3PerS', 'flow', deliveryM3PerS);
  return (oilPerLoadedTime(loaded) * oilDensityKgPerM3) / deliveryM3PerS;
}

/**
 * The volume of oil that was weighed.
 *
 * @throws OutOfRange
 * @example oilVolume({ massKg: 0.0261, oilDensityKgPerM3: 870 }) // 30e-6: 30 mL
 */
export function oilVolume({ massKg, oilDensityKgPerM3 }: { massKg: number; oilDensityKgPerM3: number }): number {
  requireNotNegative('massKg', 'mass', massKg);
  requirePositive('oilDensityKgPerM3', 'density', oilDensityKgPerM3);
  return massKg / oilDensityKgPerM3;
}

/** Throws unless there is a whole number of readings, one or more. */
export function requireReadings(readings: number): void {
  if (!Number.isInteger(readings) || readings < 1) throw new OutOfRange({ field: 'readings', given: readings, quantity: 'count', least: 1 });
}
