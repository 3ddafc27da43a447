/**
 * Compares two texts by code units, not by anybody's locale: results must come out in the same order, and sums be
 * taken in the same order, on every machine.
 */
export function byCodeUnits(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0;
}

/** A copy of items, sorted by a text of each. */
export function sortedBy<T>(items: readonly T[], key: (item: T) => string): T[] {
  return [...items].sort((a, b) => byCodeUnits(key(a), key(b)));
}
