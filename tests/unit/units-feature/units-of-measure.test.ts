import { describe, expect, test } from 'vitest';
import { MODEL_MEASURES, UNIT_MEASURES } from '@/lib/schemas/measures';
import { fieldText, readMeasure, readMeasures } from '@/lib/services/units-of-measure';
import { METRIC_UNITS, US_UNITS } from '@/lib/units';

const US = { organisation: { country: 'US' }, person: { units: US_UNITS } };
const DE = { organisation: { country: 'DE' }, person: { units: METRIC_UNITS } };

describe('readMeasure', () => {
  test.each([
    [US, '410,000', { quantity: 'distance' }, 410_000 * 1609.344, '410,000 mi'],
    [US, '410.000', { quantity: 'distance' }, 410 * 1609.344, '410.000 mi'],
    [DE, '410,000', { quantity: 'distance' }, 410_000_000, '410,000 km'],
    [DE, '8,3', { quantity: 'length', like: 'in' }, 0.0083, '8,3 mm'],
    [US, '5/8"', { quantity: 'length' }, 0.015875, '5/8"'],
    [US, '1.5:1', { quantity: 'ratio', like: 'one' }, 1.5, '1.5:1'],
    [US, '150 %', { quantity: 'ratio', like: 'one' }, 1.5, '150 %'],
  ] as const)('%#: %s %s', (habits, text, measure, si, asTyped) => {
    const read = readMeasure(habits, text, measure);
    if (!read.ok) throw new Error(read.message);
    expect(read.si).toBeCloseTo(si, 9);
    expect(read.asTyped).toBe(asTyped);
  });

  test('what could be read in two ways is asked back where the country does not settle it', () => {
    expect(readMeasure(DE, '410.000', { quantity: 'distance' })).toMatchObject({ ok: false });
  });
});

describe('fieldText', () => {
  const [displacement, bore] = MODEL_MEASURES;
  const row = { displacementM3: 0.000318, boreM: 0.092, asTyped: { boreM: '3 5/8 in' } };

  test('is what was typed, less the unit that stands beside the field', () => {
    expect(fieldText(US_UNITS, bore, row)).toBe('3 5/8');
    expect(fieldText(METRIC_UNITS, bore, row)).toBe('3 5/8 in');
  });

  test('is the value as it is shown where nothing was typed, and empty where there is none', () => {
    expect(fieldText(METRIC_UNITS, displacement, row)).toBe('318');
    expect(fieldText(US_UNITS, UNIT_MEASURES[0], { reservoirM3: null, asTyped: {} })).toBe('');
  });

  test('unchanged, it keeps the value to the last digit; changed, it is read anew', () => {
    const exact = { reservoirM3: 0.0737418, requiredReservoirM3: null, asTyped: {} };
    const text = fieldText(US_UNITS, UNIT_MEASURES[0], exact);
    expect(readMeasures(US, UNIT_MEASURES, { reservoirs: text }, exact)).toEqual({ columns: { reservoirM3: 0.0737418, requiredReservoirM3: null }, asTyped: {} });
    expect(readMeasures(US, UNIT_MEASURES, { reservoirs: '4000' }, exact).asTyped).toEqual({ reservoirM3: '4000 in³' });
  });
});
