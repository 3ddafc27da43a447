import { describe, expect, it } from 'vitest';
import { ABOVE_ZERO, OutOfRange, outOfRangeSentence, requireNotNegative, requirePositive, requireWithin } from '@/lib/air-and-oil/out-of-range';
import { sumOf, runSum } from '@/lib/air-and-oil/sums';
import { METRIC_UNITS, US_UNITS, toSi } from '@/lib/units';
import { defaultsOf } from './draws';

const psi = (value: number) => toSi(value, 'pressure', 'psi');
const error = (given: number, least?: number, most?: number) => new OutOfRange({ field: 'p', given, quantity: 'pressure', least, most });

describe('an input out of range', () => {
  it('is told in the person’s units', () => {
    const past = error(psi(500), psi(0), psi(300));
    expect(outOfRangeSentence(past, { label: 'Discharge pressure', units: US_UNITS })).toBe('Discharge pressure must be from 0 psi to 300 psi.');
    expect(outOfRangeSentence(past, { label: 'Discharge pressure', units: METRIC_UNITS })).toBe('Discharge pressure must be from 0 kPa to 2068 kPa.');
  });

  it.each<[OutOfRange, string]>([
    [error(NaN, 0), 'P must be a number.'],
    [error(-1, 0), 'P cannot be less than zero.'],
    [error(-1, psi(5)), 'P must be at least 5 psi.'],
    [error(psi(9), undefined, psi(5)), 'P must be at most 5 psi.'],
    [error(0, ABOVE_ZERO), 'P must be more than zero.'],
    [error(0, ABOVE_ZERO, psi(5)), 'P must be more than zero and at most 5 psi.'],
    [error(0), 'P is not a value that this sum can use.'],
  ])('%s is told', (refused, sentence) => {
    expect(outOfRangeSentence(refused, { label: 'P', units: US_UNITS })).toBe(sentence);
  });

  it('is shown in a unit of the size of its field', () => {
    const refused = new OutOfRange({ field: 'length', given: 100, quantity: 'length', least: 0.3048, most: 18.288 });
    expect(outOfRangeSentence(refused, { label: 'Length', units: METRIC_UNITS, like: 'ft' })).toBe('Length must be from 0.305 m to 18.288 m.');
  });

  it('carries its field, what was given and what is allowed', () => {
    const leak = sumOf('leak-down');
    if (!leak) throw new Error('no leak-down');
    expect(() => runSum(leak, { ...defaultsOf(leak), time: -5 })).toThrow(expect.objectContaining({ field: 'time', given: -5, least: 6, most: 86_400, quantity: 'duration' }));
  });

  it('is never let through as NaN or infinity', () => {
    for (const given of [NaN, Infinity, -Infinity]) {
      expect(() => requireWithin('p', 'pressure', given, {})).toThrow(OutOfRange);
      expect(() => requirePositive('p', 'pressure', given)).toThrow(OutOfRange);
      expect(() => requireNotNegative('p', 'pressure', given)).toThrow(OutOfRange);
    }
    expect(() => requirePositive('p', 'pressure', 0)).toThrow(OutOfRange);
    expect(() => requireNotNegative('p', 'pressure', 0)).not.toThrow();
  });
});
