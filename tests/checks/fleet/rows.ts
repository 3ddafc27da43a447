import { expect } from 'vitest';
import { readRows } from '../../support/outside-values';

/** A row of check-values.csv: numbers, or words where nothing may be stated, parted by semicolons. */
export interface FleetRow {
  readonly id: string;
  readonly topic: string;
  readonly inputs: string;
  readonly expected: readonly string[];
  readonly unit: string;
  readonly tolerance: string;
  readonly source: string;
  readonly confidence: string;
}

export type Got = readonly (number | string | undefined)[];
/** Works a row's values out through the library, in the order in which the row gives them. */
export type FleetProofs = Readonly<Record<string, () => Got>>;

const file = (name: string) => new URL(`../data/fleet/${name}`, import.meta.url);

export function readFleetRows(): FleetRow[] {
  return readRows(file('check-values.csv')).map(({ id = '', topic = '', inputs = '', expected = '', unit = '', tolerance = '', source = '', confidence = '' }) => ({
    id, topic, inputs, expected: expected.split(/;\s*/), unit, tolerance, source, confidence,
  }));
}

/** A data set, every value a number or a word. */
export function dataSet(name: string): { readonly number: (column: string) => number; readonly text: (column: string) => string }[] {
  return readRows(file(name)).map((row) => {
    const text = (column: string) => row[column] ?? '';
    return { text, number: (column) => Number(text(column)) };
  });
}

/** "1e-9 rel", "1e-6 abs", or "exact", which allows the last bits of a double. */
function allowed({ id, tolerance }: FleetRow, expected: number): number {
  if (tolerance === 'exact') return 1e-12 * Math.abs(expected);
  const [, size, kind] = /^([\de.+-]+) (rel|abs)$/.exec(tolerance) ?? [];
  if (size === undefined) throw new Error(`${id}: tolerance is "${tolerance}"`);
  return Number(size) * (kind === 'rel' ? Math.abs(expected) : 1);
}

export function holdTo(row: FleetRow, got: Got): void {
  expect(got).toHaveLength(row.expected.length);
  for (const [i, expected] of row.expected.entries()) {
    const value = got[i];
    const number = expected === '' ? NaN : Number(expected);
    if (Number.isNaN(number)) {
      expect(value, row.id).toBe(expected);
    } else {
      const off = typeof value === 'number' ? Math.abs(value - number) : NaN;
      expect(off, `got ${value}, expected ${expected} within ${row.tolerance}`).toBeLessThanOrEqual(allowed(row, number));
    }
  }
}

/** What a result that says that it is none has no number for. */
export const estimated = <R extends { readonly kind: string }>(result: R): Extract<R, { readonly kind: 'estimated' }> => {
  if (result.kind !== 'estimated') throw new Error(`not estimated: ${JSON.stringify(result)}`);
  return result as Extract<R, { readonly kind: 'estimated' }>;
};

/** Lower and upper; NA for a side that has none. */
export function ends(limits: { readonly kind: string; readonly lower?: number; readonly upper?: number }): [number | string, number | string] {
  return [limits.lower ?? 'NA', limits.upper ?? 'NA'];
}
