/**
 * Sums numbers, smallest first: the same numbers give the same sum, to the last bit, in whatever order they come.
 *
 * @param values finite numbers; not changed
 * @returns their sum; 0 for none
 * @example sumOf([0.3, 0.1, 0.2]) === sumOf([0.1, 0.2, 0.3]) // true
 */
export function sumOf(values: readonly number[]): number {
  return [...values].sort((a, b) => a - b).reduce((sum, value) => sum + value, 0);
}
