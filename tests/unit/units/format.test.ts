import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { QUANTITIES, QUANTITY_IDS, formatQuantity, formatValue, parseQuantity, toSi, unitsOf, type DecimalMark, type Quantity, type UnitId } from '@/lib/units';

describe('what is shown', () => {
  it.each<[number, UnitId, Quantity, UnitId, string]>([
    [120, 'psi', 'pressure', 'psi', '120 psi'],
    [120.5, 'psi', 'pressure', 'psi', '120.5 psi'],
    [120, 'psi', 'pressure', 'bar', '8.27 bar'],
    [120, 'psi', 'pressure', 'kPa', '827 kPa'],
    [8.3, 'bar', 'pressure', 'psi', '120.4 psi'],
    [0.0123, 'psi', 'pressure', 'psi', '0.0123 psi'],
    [-5, 'psi', 'pressure', 'psi', '-5 psi'],
    [3, 'psi/min', 'pressureRate', 'kPa/min', '20.7 kPa/min'],
    [25, 'inH2O', 'vacuum', 'kPa', '6.23 kPa'],
    [5 / 8, 'in', 'length', 'in', '0.625 in'],
    [5 / 8, 'in', 'length', 'mm', '15.88 mm'],
    [16, 'mm', 'length', 'mm', '16 mm'],
    [-40, 'degF', 'temperature', 'degC', '-40 °C'],
    [0, 'degF', 'temperature', 'degC', '-17.8 °C'],
    [250, 'degF', 'temperature', 'degF', '250 °F'],
    [18, 'degF', 'temperatureDifference', 'degC', '10 °C'],
    [1, 'floz', 'volume', 'mL', '29.6 mL'],
    [0.015, 'mL/h', 'oilRate', 'mL/h', '0.015 mL/h'],
    [410_000, 'mi', 'distance', 'mi', '410,000 mi'],
    [410_000, 'mi', 'distance', 'km', '659,831 km'],
    [60, 'mi', 'distance', 'mi', '60 mi'],
    [12_345.6, 'h', 'engineHours', 'h', '12,345.6 h'],
    [1000, 'rpm', 'rotationalSpeed', 'rpm', '1,000 rpm'],
    [4500, 'in3', 'volume', 'in3', '4500 in³'],
    [0.25, 'one', 'ratio', 'percent', '25 %'],
    [1.5, 'one', 'ratio', 'one', '1.5'],
    [1200, 'one', 'count', 'one', '1,200'],
    [6, 'per h', 'cycleRate', 'per h', '6 per h'],
  ])('%d %s of %s in %s is %s', (value, from, quantity, unit, shown) => {
    expect(formatQuantity(toSi(value, quantity, from), { quantity, unit })).toBe(shown);
  });

  it('shows the decimals or the figures asked for', () => {
    const si = toSi(120, 'pressure', 'psi');
    expect(formatQuantity(si, { quantity: 'pressure', unit: 'bar', digits: 1 })).toBe('8.3 bar');
    expect(formatQuantity(si, { quantity: 'pressure', unit: 'psi', digits: 2 })).toBe('120.00 psi');
    expect(formatQuantity(si, { quantity: 'pressure', unit: 'kPa', significant: 2 })).toBe('830 kPa');
    expect(formatQuantity(si, { quantity: 'pressure', unit: 'bar', significant: 4 })).toBe('8.274 bar');
    expect(formatQuantity(toSi(9.996, 'length', 'mm'), { quantity: 'length', unit: 'mm', significant: 3 })).toBe('10 mm');
  });

  it('writes a decimal comma, with blanks between thousands', () => {
    expect(formatValue(toSi(8.3, 'pressure', 'bar'), { quantity: 'pressure', unit: 'bar', decimal: ',' })).toBe('8,3');
    expect(formatQuantity(toSi(12_345.6, 'engineHours', 'h'), { quantity: 'engineHours', unit: 'h', decimal: ',' })).toBe('12\u00a0345,6 h');
  });

  it('shows no minus zero', () => {
    expect(formatQuantity(-0.001, { quantity: 'pressure', unit: 'psi', digits: 1 })).toBe('0.0 psi');
    expect(formatQuantity(-1e-30, { quantity: 'pressure', unit: 'psi' })).toBe('0 psi');
  });

  it('refuses what is no reading', () => {
    for (const si of [NaN, Infinity, -Infinity, 1e30]) {
      expect(() => formatQuantity(si, { quantity: 'length', unit: 'mm' })).toThrow(RangeError);
    }
  });
});

describe('what is shown can be typed again', () => {
  const anyReading = fc.constantFrom(...QUANTITY_IDS).chain((quantity) =>
    fc.record({
      quantity: fc.constant<Quantity>(quantity),
      unit: fc.constantFrom<UnitId>(...unitsOf(quantity)),
      value: QUANTITIES[quantity].whole ? fc.integer({ min: 0, max: 1e8 }) : fc.double({ min: 1e-4, max: 1e7, noNaN: true }),
    }),
  );
  /** Values of a vacuum or a pressure past the possible are the only ones that parsing turns away. */
  const possible = ({ quantity, unit, value }: { quantity: Quantity; unit: UnitId; value: number }) => toSi(value, quantity, unit) <= (QUANTITIES[quantity].max?.si ?? Infinity) * 0.99;

  it('and means nearly the same, and is shown the same', () => {
    fc.assert(
      fc.property(anyReading.filter(possible), fc.constantFrom<DecimalMark | undefined>('.', ',', undefined), ({ quantity, unit, value }, decimal) => {
        const si = toSi(value, quantity, unit);
        const shown = formatQuantity(si, { quantity, unit, decimal });
        const parsed = parseQuantity(shown, { quantity, defaultUnit: unit, decimal });
        if (!parsed.ok) throw new Error(parsed.message);
        expect(parsed.unit).toBe(unit);
        expect(Math.abs(parsed.value - value)).toBeLessThanOrEqual(0.0051 * value);
        expect(formatQuantity(parsed.si, { quantity, unit, decimal })).toBe(shown);
      }),
      { numRuns: 3000 },
    );
  });

  it('with any number of decimals, when the mark is known', () => {
    fc.assert(
      fc.property(anyReading.filter(possible), fc.integer({ min: 0, max: 6 }), fc.constantFrom<DecimalMark>('.', ','), ({ quantity, unit, value }, digits, decimal) => {
        const shown = formatQuantity(toSi(value, quantity, unit), { quantity, unit, digits, decimal });
        const parsed = parseQuantity(shown, { quantity, defaultUnit: unit, decimal });
        if (!parsed.ok) throw new Error(parsed.message);
        expect(Math.abs(parsed.value - value)).toBeLessThanOrEqual(0.5000001 * 10 ** -digits + 1e-9 * value);
        expect(formatQuantity(parsed.si, { quantity, unit, digits, decimal })).toBe(shown);
      }),
      { numRuns: 2000 },
    );
  });

  it('below zero too, where there is such a thing', () => {
    fc.assert(
      fc.property(fc.double({ min: -400, max: 0, noNaN: true }), (value) => {
        const options = { quantity: 'temperature', unit: 'degF' } as const;
        const shown = formatQuantity(toSi(value, 'temperature', 'degF'), options);
        const parsed = parseQuantity(shown, { quantity: 'temperature', defaultUnit: 'degC' });
        if (!parsed.ok) throw new Error(parsed.message);
        expect(formatQuantity(parsed.si, options)).toBe(shown);
      }),
    );
  });
});
