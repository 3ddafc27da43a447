/**
 * The share that is taken to have failed at the i-th of N failures: (i - 0.3) / (N + 0.4).
 *
 * @param i 1 to n
 * @throws RangeError otherwise
 * @see A. Benard; IEC 61649
 * @example medianRank(1, 5) // 0.1296
 */
export function medianRank(i: number, n: number): number {
  if (!(i >= 1 && i <= n)) throw new RangeError(`There is no failure ${i} of ${n}.`);
  return (i - 0.3) / (n + 0.4);
}
