import { ATMOSPHERE, absolutePressure, toAbsolute, toGauge, type AbsolutePressure, type GaugePressure, type Temperature } from '@/lib/units';
import { requireNotNegative, requirePositive, requireWithin } from './out-of-range';

/**
 * What a sealed tank would show at the temperature at which the test began: the end pressure without what cooling took.
 *
 * p = p_end T_start / T_end, absolute
 *
 * @returns Pa, absolute
 * @throws OutOfRange
 * @see UFC 4-390-01, pressure test of a chamber
 * @example
 * // 118 psig at the end; 120 °F at the start, 100 °F at the end
 * correctedEndPressure({ endPressurePa, startTemperatureK, endTemperatureK }) // 122.7 psig, absolute
 */
export function correctedEndPressure({ endPressurePa, startTemperatureK, endTemperatureK }: { endPressurePa: AbsolutePressure; startTemperatureK: Temperature; endTemperatureK: Temperature }): AbsolutePressure {
  requirePositive('endPressurePa', 'absolutePressure', endPressurePa);
  requirePositive('startTemperatureK', 'temperature', startTemperatureK);
  requirePositive('endTemperatureK', 'temperature', endTemperatureK);
  return absolutePressure((endPressurePa * startTemperatureK) / endTemperatureK);
}

/**
 * How far the pressure of a sealed tank falls by cooling alone: more than the leak limits, so settle first or correct.
 *
 * @returns Pa, absolute, that is left
 * @throws OutOfRange
 * @example pressureAfterCooling({ startPressurePa, startTemperatureK, endTemperatureK }) // 120 psig from 120 to 100 °F: 115.4 psig
 */
export function pressureAfterCooling({ startPressurePa, startTemperatureK, endTemperatureK }: { startPressurePa: AbsolutePressure; startTemperatureK: Temperature; endTemperatureK: Temperature }): AbsolutePressure {
  return correctedEndPressure({ endPressurePa: startPressurePa, startTemperatureK: endTemperatureK, endTemperatureK: startTemperatureK });
}

/**
 * How much more a leak loses at the pressure where a test began than on average over it. A leak that chokes loses in
 * proportion to the absolute pressure, so that the pressure falls as e^(-t/tau):
 *
 * factor = p1 ln(p1 / p2) / (p1 - p2), absolute
 *
 * From 120 to 118 psig it is 1.0075: the handbooks' 1.25 is for a pressure that halves, and wrong on a short test.
 *
 * @returns a ratio, 1 where the pressures are alike
 * @throws OutOfRange
 * @example fallingPressureFactor({ startPressurePa, endPressurePa }) // 1.0075
 */
export function fallingPressureFactor({ startPressurePa, endPressurePa }: { startPressurePa: AbsolutePressure; endPressurePa: AbsolutePressure }): number {
  requirePositive('startPressurePa', 'absolutePressure', startPressurePa);
  requirePositive('endPressurePa', 'absolutePressure', endPressurePa);
  const drop = (startPressurePa - endPressurePa) / startPressurePa;
  // -ln(1 - x) / x, whose limit at 0 is 1; log1p keeps the digits that subtracting would lose.
  return drop === 0 ? 1 : -Math.log1p(-drop) / drop;
}

export interface LeakDown {
  readonly volumeM3: number;
  readonly startPressurePa: GaugePressure;
  readonly endPressurePa: GaugePressure;
  readonly timeS: number;
  readonly startTemperatureK: Temperature;
  readonly endTemperatureK: Temperature;
  readonly atmospherePa?: AbsolutePressure;
}

/**
 * Free air lost by a leak, from how far the pressure fell.
 *
 * mean leak = V (p1 - p2') / (t p_atm), p2' the end pressure at the temperature of the start
 *
 * A negative leak says that the pressure rose once corrected: by the errors of reading, or because air came in.
 *
 * @returns m3/s of free air, as a mean over the test and at the pressure of its start; the fall without cooling, Pa/s
 * @throws OutOfRange
 * @see ideal gas; powermotiontech.com/news/article/21883660
 * @example
 * // 3 ft3, 3 psi in a minute, no change of temperature
 * leakDown({ volumeM3, startPressurePa, endPressurePa, timeS: 60, startTemperatureK, endTemperatureK }).meanLeakM3PerS // 0.61 cfm
 */
export function leakDown(test: LeakDown): { meanLeakM3PerS: number; leakAtStartM3PerS: number; fallPaPerS: number; correctedEndPressurePa: GaugePressure } {
  const { volumeM3, timeS, atmospherePa = ATMOSPHERE } = test;
  requireNotNegative('volumeM3', 'volume', volumeM3);
  requirePositive('timeS', 'duration', timeS);
  requirePositive('atmospherePa', 'absolutePressure', atmospherePa);
  const startPressurePa = toAbsolute(test.startPressurePa, atmospherePa);
  const endPressurePa = correctedEndPressure({ ...test, endPressurePa: toAbsolute(test.endPressurePa, atmospherePa) });
  const fallPaPerS = (startPressurePa - endPressurePa) / timeS;
  const meanLeakM3PerS = (volumeM3 * fallPaPerS) / atmospherePa;
  return {
    meanLeakM3PerS,
    leakAtStartM3PerS: meanLeakM3PerS * fallingPressureFactor({ startPressurePa, endPressurePa }),
    fallPaPerS,
    correctedEndPressurePa: toGauge(endPressurePa, atmospherePa),
  };
}

/** The gauge may fall to so much of its start, or the rule below is not meant. */
const HALVED = { least: 0.4, most: 0.6 };

/**
 * The leak of a plant's air system by the rule for a pressure that halves: V (p1 - p2) / (t p_atm) x 1.25. Refused for
 * the short test of a vehicle, where its 1.25 would be wrong.
 *
 * @param endPressurePa Pa, gauge: 40 to 60 % of the start
 * @returns m3/s of free air
 * @throws OutOfRange
 * @see US Department of Energy, Improving Compressed Air System Performance: a sourcebook (from memory)
 * @example halvingLeak({ volumeM3, startPressurePa, endPressurePa, timeS: 300 }) // 10 ft3, 100 to 50 psig: 8.5 cfm
 */
export function halvingLeak({ volumeM3, startPressurePa, endPressurePa, timeS, atmospherePa = ATMOSPHERE }: Omit<LeakDown, 'startTemperatureK' | 'endTemperatureK'>): number {
  requireNotNegative('volumeM3', 'volume', volumeM3);
  requirePositive('timeS', 'duration', timeS);
  requirePositive('startPressurePa', 'pressure', startPressurePa);
  requireWithin('endPressurePa', 'pressure', endPressurePa, { least: HALVED.least * startPressurePa, most: HALVED.most * startPressurePa });
  return ((volumeM3 * (startPressurePa - endPressurePa)) / (timeS * atmospherePa)) * 1.25;
}

/**
 * How fast a leak lets the pressure of a tank fall: leak p_atm / V.
 *
 * @returns Pa/s
 * @throws OutOfRange
 * @example fallOfLeak({ leakM3PerS: 0.000472, volumeM3: 0.085 }) // 563 Pa/s: 1 cfm from 3 ft3 is 4.9 psi/min
 */
export function fallOfLeak({ leakM3PerS, volumeM3, atmospherePa = ATMOSPHERE }: { leakM3PerS: number; volumeM3: number; atmospherePa?: AbsolutePressure }): number {
  requireNotNegative('leakM3PerS', 'flow', leakM3PerS);
  requirePositive('volumeM3', 'volume', volumeM3);
  return (leakM3PerS * atmospherePa) / volumeM3;
}

/**
 * The share of time that a leak alone keeps the compressor loaded: leak / delivery.
 *
 * @returns a ratio, or 'never unloads' where as much leaks as is delivered
 * @throws OutOfRange
 * @example dutyOfLeak({ leakM3PerS: 0.000472, deliveryM3PerS: 0.00566 }) // { kind: 'share', share: 0.083 }
 */
export function dutyOfLeak({ leakM3PerS, deliveryM3PerS }: { leakM3PerS: number; deliveryM3PerS: number }): { readonly kind: 'share'; readonly share: number } | { readonly kind: 'never unloads' } {
  requireNotNegative('leakM3PerS', 'flow', leakM3PerS);
  requireNotNegative('deliveryM3PerS', 'flow', deliveryM3PerS);
  return leakM3PerS >= deliveryM3PerS ? { kind: 'never unloads' } : { kind: 'share', share: leakM3PerS / deliveryM3PerS };
}
