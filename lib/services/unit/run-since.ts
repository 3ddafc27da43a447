import type { InstrumentReading } from './reading-order';

/**
 * How far an instrument ran from one reading on, over replaced ones: each piece between two readings of one
 * instrument counts, and what ran unread while it was being replaced doesn't.
 *
 * @param start day and value at which to begin
 * @param readings of the unit, by date
 * @param until the last day that counts
 * @returns the sum, and the day of the last reading in it
 * @example
 * const readings = [
 *   { readOn: '2025-02-01', value: 900, replaced: false },
 *   { readOn: '2025-02-01', value: 0, replaced: true },
 *   { readOn: '2025-03-01', value: 150, replaced: false },
 * ];
 * runSince({ readOn: '2025-01-01', value: 500 }, readings, '2025-03-01')
 * // { sum: 550, lastReadOn: '2025-03-01' }
 */
export function runSince(
  start: { readOn: string; value: number },
  readings: readonly InstrumentReading[],
  until: string,
): { sum: number; lastReadOn: string } {
  let sum = 0;
  let last = start.value;
  let lastReadOn = start.readOn;
  for (const { readOn, value, replaced } of readings) {
    if (value === null || readOn < start.readOn || readOn > until) continue;
    // Of the day itself only what stands above the start can be later than it.
    if (readOn === start.readOn && value <= last) continue;
    if (!replaced) sum += value - last;
    last = value;
    lastReadOn = readOn;
  }
  return { sum, lastReadOn };
}
