import { parse } from 'csv-parse/sync';
import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';

/** A value that somebody else has published or computed, to hold our own against. */
export interface OutsideValue {
  id: string;
  topic: string;
  inputs: string;
  expected: number;
  unit: string;
  /** Absolute. */
  tolerance: number;
  source: string;
  /** How it is known: seen in print, computed, or remembered. */
  confidence: string;
}

/** Rows of a CSV file with a header, each by its column's name. */
export function readRows(file: URL): Record<string, string>[] {
  return parse(readFileSync(file), { columns: true, skip_empty_lines: true });
}

/** The outside values of a file under `tests/checks/data`. */
export function readOutsideValues(file: URL): OutsideValue[] {
  return readRows(file).map((row) => {
    const text = (column: string): string => {
      const value = row[column];
      if (value === undefined || value === '') throw new Error(`${file.pathname}: row ${row.id} has no ${column}`);
      return value;
    };
    const number = (column: string): number => {
      const value = Number(text(column));
      if (!Number.isFinite(value)) throw new Error(`${file.pathname}: ${column} of row ${row.id} is "${row[column]}"`);
      return value;
    };
    return {
      id: text('id'),
      topic: text('topic'),
      inputs: text('inputs'),
      expected: number('expected'),
      unit: text('unit'),
      tolerance: number('tolerance'),
      source: text('source'),
      confidence: text('confidence'),
    };
  });
}

/** Computes a row's value through production code. */
export type Proofs = Readonly<Record<string, () => number | Promise<number>>>;

/**
 * One test for each row, named by id, topic and source; and one that fails when a row is neither proved nor named,
 * with its reason, among those whose subject isn't here yet.
 */
export function proveOutsideValues(values: readonly OutsideValue[], proofs: Proofs, notHereYet: Readonly<Record<string, string>>): void {
  for (const value of values) {
    const prove = proofs[value.id];
    if (!prove) continue;
    const memory = /from memory/.test(`${value.confidence} ${value.source}`) ? ', from memory' : '';
    it(`${value.id} ${value.topic}: ${value.inputs} = ${value.expected} ${value.unit} (${value.source}${memory})`, async () => {
      const got = await prove();
      const off = Math.abs(got - value.expected);
      expect(off, `got ${got}, expected ${value.expected} within ${value.tolerance}`).toBeLessThanOrEqual(value.tolerance);
    });
  }
  it('covers every row, or says why not', () => {
    const ids = values.map(({ id }) => id);
    const both = [...Object.keys(proofs), ...Object.keys(notHereYet)];
    expect([...both].sort()).toEqual([...ids].sort());
  });
}
