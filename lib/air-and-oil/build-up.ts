import { ATMOSPHERE, type AbsolutePressure, type GaugePressure, type Temperature } from '@/lib/units';
import { requireNotNegative, requirePositive, requireWithin } from './out-of-range';

/** A tank and what happens in it between two pressures. */
export interface PressureRise {
  readonly volumeM3: number;
  readonly fromPressurePa: GaugePressure;
  readonly toPressurePa: GaugePressure;
  /** Of the air around: what "free air" is at. */
  readonly atmospherePa?: AbsolutePressure;
}

/** The free air that the rise takes: V dP / p_atm, m3. */
export function freeAirOfRise({ volumeM3, fromPressurePa, toPressurePa, atmospherePa = ATMOSPHERE }: PressureRise): number {
  requireNotNegative('volumeM3', 'volume', volumeM3);
  requireWithin('toPressurePa', 'pressure', toPressurePa, { least: fromPressurePa });
  requirePositive('atmospherePa', 'absolutePressure', atmospherePa);
  return (volumeM3 * (toPressurePa - fromPressurePa)) / atmospherePa;
}

/** A time, or that the moment never comes. */
export type Arrival = { readonly kind: 'after'; readonly timeS: number } | { readonly kind: 'never' };

/**
 * How long a tank takes to build up.
 *
 * t = V (p2 - p1) / ((Q - leak) p_atm)
 *
 * @param deliveryM3PerS m3/s of free air, the compressor's, constant over the rise
 * @param leakM3PerS m3/s of free air lost or used meanwhile
 * @returns 'never' where as much leaks as is delivered
 * @throws OutOfRange
 * @see ideal gas at one temperature; powermotiontech.com/news/article/21883660
 * @example
 * // 3 ft3 from 85 to 100 psi by 12 cfm, no leak
 * buildUpTime({ volumeM3, fromPressurePa, toPressurePa, deliveryM3PerS, leakM3PerS: 0 }) // { kind: 'after', timeS: 15.3 }
 */
export function buildUpTime({ deliveryM3PerS, leakM3PerS, ...rise }: PressureRise & { deliveryM3PerS: number; leakM3PerS: number }): Arrival {
  requireNotNegative('deliveryM3PerS', 'flow', deliveryM3PerS);
  requireNotNegative('leakM3PerS', 'flow', leakM3PerS);
  const air = freeAirOfRise(rise);
  if (leakM3PerS >= deliveryM3PerS) return { kind: 'never' };
  const timeS = air / (deliveryM3PerS - leakM3PerS);
  return Number.isFinite(timeS) ? { kind: 'after', timeS } : { kind: 'never' };
}

/**
 * How long a tank takes to fall between two pressures while air is used at a steady rate and none is delivered.
 *
 * @returns 'never' where nothing is used
 * @throws OutOfRange
 * @example unloadedTime({ volumeM3, fromPressurePa, toPressurePa, demandM3PerS }) // 3 ft3, 125 to 100 psi, 1 cfm: 306 s
 */
export function unloadedTime({ demandM3PerS, ...rise }: PressureRise & { readonly demandM3PerS: number }): Arrival {
  return buildUpTime({ ...rise, deliveryM3PerS: demandM3PerS, leakM3PerS: 0 });
}

/**
 * Free air delivered, from how fast a tank was pumped up.
 *
 * Q = V (p2 - p1) / (p_atm t) x T_air / T_tank
 *
 * @param tankTemperatureK K, of the air in the tank at the end; hot air fills a tank with less of it
 * @param airTemperatureK K, of the air around
 * @returns m3/s of free air
 * @throws OutOfRange
 * @see Bureau of Energy Efficiency (India), guide book 3, compressed air system (from memory)
 * @example
 * // 3 ft3 from 85 to 100 psi in 20 s, 120 °F in the tank, 70 °F around
 * freeAirDelivery({ volumeM3, fromPressurePa, toPressurePa, timeS: 20, tankTemperatureK, airTemperatureK }) // 8.4 cfm
 */
export function freeAirDelivery({
  timeS,
  tankTemperatureK,
  airTemperatureK,
  ...rise
}: PressureRise & { readonly timeS: number; readonly tankTemperatureK: Temperature; readonly airTemperatureK: Temperature }): number {
  requirePositive('timeS', 'duration', timeS);
  requirePositive('tankTemperatureK', 'temperature', tankTemperatureK);
  requirePositive('airTemperatureK', 'temperature', airTemperatureK);
  return (freeAirOfRise(rise) / timeS) * (airTemperatureK / tankTemperatureK);
}

/**
 * The least delivery that builds up in a given time: V (p2 - p1) / (p_atm t) + leak.
 *
 * @returns m3/s of free air
 * @throws OutOfRange
 * @example leastDelivery({ volumeM3, fromPressurePa, toPressurePa, timeS: 45 }) // 3 ft3, 85 to 100 psi: 4.08 cfm
 */
export function leastDelivery({ timeS, leakM3PerS = 0, ...rise }: PressureRise & { readonly timeS: number; readonly leakM3PerS?: number }): number {
  requirePositive('timeS', 'duration', timeS);
  requireNotNegative('leakM3PerS', 'flow', leakM3PerS);
  return freeAirOfRise(rise) / timeS + leakM3PerS;
}
