import { findRoot } from '@/lib/air-and-oil/solve/find-root';

/**
 * The root of a function between two ends at which it has different signs.
 *
 * @returns undefined when the ends have the same sign
 * @example rootBetween((x) => x * x - 2, 0, 2) // 1.41421356…
 */
export function rootBetween(f: (x: number) => number, low: number, high: number): number | undefined {
  const found = findRoot(f, { from: low, to: high });
  return found.converged ? found.root : undefined;
}

/**
 * The root on one side of a start: the step away from it doubles until the sign changes.
 *
 * @param step signed: which way, and how far at first
 * @param most steps that are tried
 * @returns undefined when the sign never changes, or the function stops being a number
 * @example rootBeyond((x) => x - 10, 0, 1) // 10
 */
export function rootBeyond(f: (x: number) => number, start: number, step: number, most = 60): number | undefined {
  const sign = Math.sign(f(start));
  if (sign === 0) return start;
  let [near, far, by] = [start, start + step, step];
  for (let tries = 0; tries < most; tries += 1) {
    const value = f(far);
    if (Number.isNaN(value)) return undefined;
    if (Math.sign(value) !== sign) return rootBetween(f, near, far);
    by *= 2;
    [near, far] = [far, far + by];
  }
  return undefined;
}

/**
 * The least whole number from 0 on for which something that never stops holding holds.
 *
 * @example leastCount((n) => n * n >= 50) // 8
 */
export function leastCount(holds: (count: number) => boolean): number {
  if (holds(0)) return 0;
  let high = 1;
  while (!holds(high)) {
    high *= 2;
    if (high > Number.MAX_SAFE_INTEGER) throw new RangeError('No count is enough.');
  }
  let low = Math.floor(high / 2);
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (holds(middle)) high = middle;
    else low = middle;
  }
  return high;
}
