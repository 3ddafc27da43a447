import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { QUANTITY_IDS, convert, fromSi, toSi, unitsOf, type Quantity, type UnitId } from '@/lib/units';

/**
 * Printed factors of NIST Special Publication 811 (2008), appendix B.8, to the digits printed there. Read through a
 * transcription of that table (the R package NISTunits); the exact ones are definitions.
 */
const SP_811: readonly [quantity: Quantity, unit: UnitId, printed: number][] = [
  ['pressure', 'psi', 6.894757e3],
  ['pressure', 'bar', 1e5],
  ['pressure', 'mbar', 1e2],
  ['pressure', 'kgf/cm2', 9.80665e4],
  ['pressure', 'inH2O', 2.490889e2],
  ['pressure', 'inHg', 3.386389e3],
  ['vacuum', 'inH2O', 2.490889e2],
  ['vacuum', 'mmH2O', 9.80665],
  ['length', 'in', 2.54e-2],
  ['length', 'ft', 3.048e-1],
  ['area', 'in2', 6.4516e-4],
  ['volume', 'floz', 2.957353e-5],
  ['volume', 'pt', 4.731765e-4],
  ['volume', 'qt', 9.463529e-4],
  ['volume', 'gal', 3.785412e-3],
  ['volume', 'in3', 1.638706e-5],
  ['volume', 'ft3', 2.831685e-2],
  ['displacement', 'in3', 1.638706e-5],
  ['mass', 'oz', 2.834952e-2],
  ['mass', 'lb', 4.535924e-1],
  ['flow', 'cfm', 4.719474e-4],
  ['flow', 'gal/min', 6.30902e-5],
  ['distance', 'mi', 1.609344e3],
  ['duration', 'h', 3.6e3],
  ['duration', 'd', 8.64e4],
  ['temperatureDifference', 'degF', 5.555556e-1],
  ['rotationalSpeed', 'rpm', 1.666667e-2], // SP 811 prints rad/s, 1.047198 E-01; this is that over 2 pi
];

describe('conversion factors', () => {
  it.each(SP_811)('%s in %s agree with NIST SP 811', (quantity, unit, printed) => {
    expect(Math.abs(toSi(1, quantity, unit) / printed - 1)).toBeLessThan(5e-7);
  });

  it.each<[Quantity, UnitId, number]>([
    // Exact by definition: the inch of 1959, the mile of 5280 ft, the gallon of 231 in3.
    ['length', 'in', 0.0254],
    ['distance', 'mi', 1609.344],
    ['volume', 'floz', 29.5735295625e-6],
    ['volume', 'gal', 3.785411784e-3],
    ['vacuum', 'inH2O', 249.08891],
    ['pressure', 'psi', 6894.75729316836],
  ])('%s in %s is exact', (quantity, unit, exact) => {
    expect(toSi(1, quantity, unit)).toBe(exact);
  });
});

describe('known equivalents', () => {
  it.each<[number, UnitId, number, UnitId, Quantity, number]>([
    [1, 'bar', 14.5038, 'psi', 'pressure', 4],
    [120, 'psi', 827.371, 'kPa', 'pressure', 3],
    [25, 'inH2O', 6.22722, 'kPa', 'vacuum', 5],
    [3, 'psi/min', 20.6843, 'kPa/min', 'pressureRate', 4],
    [1, 'gal', 128, 'floz', 'volume', 12],
    [1, 'mi', 1.609344, 'km', 'distance', 12],
    [5280 * 12, 'in', 1609.344, 'm', 'length', 9],
    [1, 'in3', 16.387064, 'cm3', 'displacement', 12],
  ])('%d %s is %d %s', (value, from, expected, to, quantity, digits) => {
    expect(convert(value, quantity, from, to)).toBeCloseTo(expected, digits);
  });

  it.each<[string, number, UnitId, number]>([
    // The fixed points of the scales (NIST SP 811, B.8 and 4.2.1.1).
    ['the scales meet at -40', -40, 'degF', -40],
    ['water freezes', 32, 'degF', 0],
    ['water boils', 212, 'degF', 100],
    ['absolute zero', 0, 'K', -273.15],
    ['absolute zero in Fahrenheit', -459.67, 'degF', -273.15],
  ])('%s', (_, value, unit, celsius) => {
    expect(convert<Quantity>(value, 'temperature', unit, 'degC')).toBeCloseTo(celsius, 10);
  });

  it('keeps a temperature and a difference of temperatures apart', () => {
    expect(convert(18, 'temperatureDifference', 'degF', 'degC')).toBe(10);
    expect(convert(18, 'temperature', 'degF', 'degC')).toBeCloseTo(-7.778, 3);
    expect(toSi(0, 'temperatureDifference', 'degF')).toBe(0);
  });

  it('leaves no binary noise at the edges of bands', () => {
    expect(toSi(57, 'ratio', 'percent')).toBe(0.57);
    expect(toSi(1.1, 'length', 'cm')).toBe(0.011);
    expect(Object.is(toSi(-0, 'pressure', 'psi'), 0)).toBe(true);
  });
});

describe('properties', () => {
  const reading = fc.double({ min: -1e6, max: 1e6, noNaN: true });

  it('fromSi undoes toSi, in every unit', () => {
    for (const quantity of QUANTITY_IDS) {
      for (const unit of unitsOf(quantity)) {
        fc.assert(
          fc.property(reading, (value) => {
            expect(Math.abs(fromSi(toSi(value, quantity, unit), quantity, unit) - value)).toBeLessThanOrEqual(1e-11 * Math.max(1e3, Math.abs(value)));
          }),
          { numRuns: 30 },
        );
      }
    }
  });

  it('keeps the order of values', () => {
    fc.assert(
      fc.property(fc.constantFrom(...QUANTITY_IDS), reading, reading, (quantity, a, b) => {
        for (const unit of unitsOf(quantity)) {
          if (a <= b) expect(toSi(a, quantity, unit)).toBeLessThanOrEqual(toSi(b, quantity, unit));
        }
      }),
    );
  });

  it('refuses a unit of another quantity as a mistake of the program', () => {
    const wrong: UnitId = 'mm';
    expect(() => toSi<Quantity>(1, 'pressure', wrong)).toThrow(RangeError);
    expect(() => toSi<Quantity>(1, 'pressure', 'constructor' as UnitId)).toThrow(RangeError);
  });
});
