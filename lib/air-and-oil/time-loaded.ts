import { OutOfRange, requireNotNegative } from './out-of-range';

/**
 * The share of time that a compressor is loaded.
 *
 * share = loaded / (loaded + unloaded)
 *
 * @param loadedS s, over one cycle or many
 * @param unloadedS s
 * @returns a ratio
 * @throws OutOfRange also where both are zero
 * @see Bureau of Energy Efficiency (India), guide book 3: leakage by load and unload times (from memory)
 * @example timeLoaded({ loadedS: 90, unloadedS: 630 }) // 0.125
 */
export function timeLoaded({ loadedS, unloadedS }: { loadedS: number; unloadedS: number }): number {
  requireNotNegative('loadedS', 'duration', loadedS);
  requireNotNegative('unloadedS', 'duration', unloadedS);
  if (loadedS + unloadedS === 0) throw new OutOfRange({ field: 'loadedS', given: 0, quantity: 'duration', least: Number.MIN_VALUE });
  return loadedS / (loadedS + unloadedS);
}

/**
 * What the vehicle uses and leaks: the share of time loaded times what the compressor delivers while it is.
 *
 * @returns m3/s of free air
 * @throws OutOfRange
 * @example demand({ share: 0.125, deliveryM3PerS: 0.5833 }) // 0.0729: 4.375 of 35 m3/min
 */
export function demand({ share, deliveryM3PerS }: { share: number; deliveryM3PerS: number }): number {
  requireNotNegative('share', 'ratio', share);
  requireNotNegative('deliveryM3PerS', 'flow', deliveryM3PerS);
  return share * deliveryM3PerS;
}
