/** When a compressor was on a unit; null: it still is. */
export interface Span {
  installedOn: string;
  removedOn: string | null;
}

/**
 * Whether two compressors would have been on one unit at once. One that comes out on the day on which the next goes
 * on makes room for it.
 *
 * @example
 * overlaps({ installedOn: '2024-01-01', removedOn: '2025-03-01' }, { installedOn: '2025-03-01', removedOn: null }) // false
 */
export const overlaps = (a: Span, b: Span): boolean =>
  (b.removedOn === null || a.installedOn < b.removedOn) && (a.removedOn === null || b.installedOn < a.removedOn);
