import type { Temperature } from '@/lib/units';
import { requireCompression, type Compression } from './discharge-temperature';
import { OutOfRange, requireWithin } from './out-of-range';

/**
 * The index of compression that two measured temperatures amount to: the inverse of `dischargeTemperature`.
 *
 * n = 1 / (1 - ln(T2 / T1) / ln(p2 / p1))
 *
 * @param dischargeTemperatureK K, measured; no colder than the inlet
 * @returns n, 1 or more
 * @throws OutOfRange also where the temperature is so high that no index gives it (T2 / T1 >= p2 / p1)
 * @example
 * polytropicIndex({ inletTemperatureK, inletPressurePa, dischargePressurePa, dischargeTemperatureK: temperature(490.6) }) // 1.3
 */
export function polytropicIndex({ dischargeTemperatureK, ...compression }: Compression & { readonly dischargeTemperatureK: Temperature }): number {
  requireCompression(compression);
  const { inletTemperatureK, inletPressurePa, dischargePressurePa } = compression;
  const pressureRatio = dischargePressurePa / inletPressurePa;
  requireWithin('dischargeTemperatureK', 'temperature', dischargeTemperatureK, { least: inletTemperatureK, most: 1500 });
  const share = Math.log(dischargeTemperatureK / inletTemperatureK) / Math.log(pressureRatio);
  if (!(share < 1)) {
    const bounds = { least: inletTemperatureK, most: inletTemperatureK * pressureRatio };
    throw new OutOfRange({ field: 'dischargeTemperatureK', given: dischargeTemperatureK, quantity: 'temperature', ...bounds });
  }
  return 1 / (1 - share);
}
