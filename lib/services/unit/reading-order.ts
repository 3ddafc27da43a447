/** What is compared of a reading: one instrument's value on a day, and whether the instrument was new on it. */
export interface InstrumentReading {
  readOn: string;
  value: number | null;
  replaced: boolean;
}

/**
 * The reading of the record that a new one contradicts: an earlier one that is higher, or a later one that is lower.
 * An instrument never runs backwards; a replaced one starts anew, so that nothing is compared across its first reading.
 *
 * @param readings of one unit, by date; those of the new one's own day count as earlier
 * @example
 * findContradiction([{ readOn: '2025-03-01', value: 500, replaced: false }], { readOn: '2025-04-01', value: 400, replaced: false })
 * // { readOn: '2025-03-01', value: 500, replaced: false }
 */
export function findContradiction<Reading extends InstrumentReading>(
  readings: readonly Reading[],
  { readOn, value, replaced }: { readOn: string; value: number; replaced: boolean },
): Reading | undefined {
  const known = readings.filter((reading) => reading.value !== null);
  // The neighbours are enough: the readings between two replacements stand in order already.
  const before = known.findLast((reading) => reading.readOn <= readOn);
  if (!replaced && before && (before.value ?? 0) > value) return before;
  const after = known.find((reading) => reading.readOn > readOn);
  if (after && !after.replaced && (after.value ?? 0) < value) return after;
  return undefined;
}
