import { expect } from 'vitest';
import { absolutePressure, gaugePressure, temperature, toAbsolute, toSi, type AbsolutePressure } from '@/lib/units';
import { readRows } from '../../support/outside-values';

/** A row of air-and-oil.csv: one expected value, or several that belong together ("4 / 3", "120 to 140"). */
export interface Row {
  readonly id: string;
  readonly topic: string;
  /** Of this row, or of the row before where it says "same". */
  readonly inputs: string;
  readonly expected: readonly number[];
  readonly unit: string;
  readonly tolerance: string;
  readonly source: string;
  readonly confidence: string;
}

/** Works the values of rows of a kind out through the library. */
export interface Prover {
  readonly of: (row: Row) => boolean;
  readonly prove: (row: Row) => number | readonly number[];
}

export function readAirAndOil(file: URL): Row[] {
  let before = '';
  return readRows(file).map((row) => {
    const { id = '', topic = '', inputs = '', expected = '', unit = '', tolerance = '', source = '', confidence = '' } = row;
    // "same" repeats the whole row before; what follows it is said in addition.
    const full = inputs.startsWith('same') ? `${before}${inputs.slice('same'.length).replace(/^,/, ';')}` : inputs;
    before = full;
    const values = expected.split(/ \/ | to /).map(Number);
    if (values.some((value) => !Number.isFinite(value))) throw new Error(`${id}: expected is "${expected}"`);
    return { id, topic, inputs: full, expected: values, unit, tolerance, source, confidence };
  });
}

/** Absolute tolerance of one expected value: "±0.5%" of it, or "±0.1". An exact row allows the last bits of a double. */
export function toleranceOf({ tolerance, id }: Row, expected: number): number {
  const [, size, percent] = /^±([\d.]+)(%?)$/.exec(tolerance) ?? [];
  if (size === undefined) throw new Error(`${id}: tolerance is "${tolerance}"`);
  return Math.max(percent === '%' ? (Number(size) / 100) * Math.abs(expected) : Number(size), 1e-12 * Math.abs(expected));
}

export function holdTo(row: Row, got: readonly number[]): void {
  expect(got).toHaveLength(row.expected.length);
  for (const [i, expected] of row.expected.entries()) {
    const value = got[i] ?? NaN;
    const allowed = toleranceOf(row, expected);
    expect(Math.abs(value - expected), `got ${value}, expected ${expected} within ${allowed} ${row.unit}`).toBeLessThanOrEqual(allowed);
  }
}

/** The number that a row's inputs state in this place. */
export function stated({ id, inputs, topic }: Row, place: RegExp): number {
  const written = (place.exec(inputs) ?? place.exec(topic))?.[1];
  if (written === undefined) throw new Error(`${id} does not state ${place}`);
  const [over = '', under] = written.split('/');
  return under === undefined ? Number(over) : Number(over) / Number(under);
}

/** 14.7 psia, the air around in handbooks of the United States. */
export const PSIA_14_7 = absolutePressure(toSi(14.7, 'pressure', 'psi'));

export const psig = (value: number) => gaugePressure(toSi(value, 'pressure', 'psi'));
export const absoluteOf = (value: number): AbsolutePressure => toAbsolute(psig(value), PSIA_14_7);
export const fahrenheit = (value: number) => temperature(toSi(value, 'temperature', 'degF'));
export const cfm = (value: number) => toSi(value, 'flow', 'cfm');
export const inches = (value: number) => toSi(value, 'length', 'in');
export const feet = (value: number) => toSi(value, 'length', 'ft');
export const cubicFeet = (value: number) => toSi(value, 'volume', 'ft3');
