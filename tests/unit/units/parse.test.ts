import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { QUANTITY_IDS, parseQuantity, unitsOf, type DecimalMark, type Quantity, type UnitId } from '@/lib/units';

function parse(text: string, quantity: Quantity, defaultUnit: UnitId, decimal?: DecimalMark) {
  return parseQuantity(text, { quantity, defaultUnit, decimal });
}

function messageOf(text: string, quantity: Quantity, defaultUnit: UnitId, decimal?: DecimalMark): string {
  const parsed = parse(text, quantity, defaultUnit, decimal);
  return parsed.ok ? `understood as ${parsed.value} ${parsed.unit}` : parsed.message;
}

type Row = [text: string, quantity: Quantity, defaultUnit: UnitId, value: number, unit: UnitId];

describe('what people type', () => {
  it.each<Row>([
    ['120 psi', 'pressure', 'kPa', 120, 'psi'],
    ['120psi', 'pressure', 'kPa', 120, 'psi'],
    ['  120   PSIG ', 'pressure', 'kPa', 120, 'psi'],
    ['120 p.s.i.', 'pressure', 'kPa', 120, 'psi'],
    ['120 lbs./sq. in.', 'pressure', 'kPa', 120, 'psi'],
    ['120 pounds per square inch', 'pressure', 'kPa', 120, 'psi'],
    ['120', 'pressure', 'kPa', 120, 'kPa'],
    ['120. psi', 'pressure', 'kPa', 120, 'psi'],
    ['.5 bar', 'pressure', 'psi', 0.5, 'bar'],
    ['8,3 bar', 'pressure', 'psi', 8.3, 'bar'],
    ['3 psi per minute', 'pressureRate', 'kPa/min', 3, 'psi/min'],
    ['25 in. H₂O', 'vacuum', 'kPa', 25, 'inH2O'],
    ['25" wc', 'vacuum', 'kPa', 25, 'inH2O'],
    ['-20F', 'temperature', 'degC', -20, 'degF'],
    ['−20 °F', 'temperature', 'degC', -20, 'degF'],
    ['- 20 deg f', 'temperature', 'degC', -20, 'degF'],
    ['+20º C', 'temperature', 'degF', 20, 'degC'],
    ['20 ℃', 'temperature', 'degF', 20, 'degC'],
    ['20°', 'temperature', 'degF', 20, 'degF'],
    ['30 cc', 'volume', 'floz', 30, 'mL'],
    ['3 FL. OZ.', 'volume', 'mL', 3, 'floz'],
    ['2 oz', 'volume', 'mL', 2, 'floz'],
    ['2 oz', 'mass', 'g', 2, 'oz'],
    ['4500 cu. in.', 'volume', 'mL', 4500, 'in3'],
    ['19.4 in³', 'displacement', 'cm3', 19.4, 'in3'],
    ['1.5 ml/hr', 'oilRate', 'floz/h', 1.5, 'mL/h'],
    ['6 cycles per hour', 'cycleRate', 'per min', 6, 'per h'],
    ['6/h', 'cycleRate', 'per min', 6, 'per h'],
    ['25 %', 'ratio', 'one', 25, 'percent'],
    ['1.5:1', 'ratio', 'percent', 1.5, 'one'],
    ['1/2', 'ratio', 'percent', 0.5, 'one'],
    ['1/2 %', 'ratio', 'percent', 0.5, 'percent'],
    ['4', 'count', 'one', 4, 'one'],
    ['12,400 hrs', 'engineHours', 'h', 12_400, 'h'],
    ['1,000 RPM', 'rotationalSpeed', 'rpm', 1000, 'rpm'],
  ])('%s as %s', (text, quantity, defaultUnit, value, unit) => {
    expect(parse(text, quantity, defaultUnit)).toMatchObject({ ok: true, value, unit, asTyped: text.trim() });
  });

  it('gives SI beside the value as typed', () => {
    expect(parse(' 120 psi ', 'pressure', 'kPa')).toEqual({ ok: true, si: 827370.875180203, value: 120, unit: 'psi', asTyped: '120 psi' });
    expect(parse('5/8', 'length', 'in')).toEqual({ ok: true, si: 0.015875, value: 0.625, unit: 'in', asTyped: '5/8' });
    expect(parse('-40', 'temperature', 'degF')).toMatchObject({ si: 233.15 });
  });
});

describe('fractions', () => {
  it.each<[string, number]>([
    ['5/8', 0.625],
    ['5 / 8', 0.625],
    ['5⁄8', 0.625],
    ['5/8"', 0.625],
    ['⅝″', 0.625],
    ['5/8-inch', 0.625],
    ['½', 0.5],
    ['1 3/8 in', 1.375],
    ['1-3/8', 1.375],
    ['1½"', 1.5],
    ['1 ½', 1.5],
    ['9/8', 1.125],
  ])('%s is %d in', (text, inches) => {
    expect(parse(text, 'length', 'in')).toMatchObject({ ok: true, value: inches, unit: 'in' });
  });

  it.each(['1/0', '0/0', '1 2/0', '1 9/8', '1//2', '1/2/3', '1 1 1/2', '½½', '/8', '5/'])('%s is refused', (text) => {
    expect(parse(text, 'length', 'in').ok).toBe(false);
  });
});

describe('comma and point', () => {
  it.each<[string, Quantity, UnitId, number]>([
    ['410,000 miles', 'distance', 'mi', 410_000],
    ['410 000', 'distance', 'mi', 410_000],
    ['410\u202f000\u00a0km', 'distance', 'km', 410_000],
    ['1,234,567', 'distance', 'mi', 1_234_567],
    ['1.234.567', 'distance', 'km', 1_234_567],
    ['1.234,5', 'distance', 'km', 1234.5],
    ['1,234.5', 'distance', 'mi', 1234.5],
    ['1,234.567', 'distance', 'mi', 1234.567],
    ['410,5', 'distance', 'km', 410.5],
    ['0,500', 'distance', 'km', 0.5],
    ['1234,567', 'distance', 'km', 1234.567],
    ['1.375', 'length', 'in', 1.375],
    ['0,125', 'length', 'in', 0.125],
    ['12,5', 'length', 'mm', 12.5],
    ['1 200', 'volume', 'mL', 1200],
    ['1,234.5', 'volume', 'mL', 1234.5],
  ])('%s (%s in %s) is %d', (text, quantity, unit, value) => {
    expect(parse(text, quantity, unit)).toMatchObject({ ok: true, value });
  });

  it('asks back when a guess could be wrong by a thousand', () => {
    expect(messageOf('4,500 in3', 'volume', 'mL')).toBe("'4,500' can be read as 4500 or as 4.5. Please write one of those.");
    expect(messageOf('410.000 km', 'distance', 'km')).toBe("'410.000' can be read as 410000 or as 410. Please write one of those.");
  });

  it('proposes only what it would then understand', () => {
    const offered = (text: string, quantity: Quantity, unit: UnitId) => /read as (\S+) or as (\S+)\. /.exec(messageOf(text, quantity, unit))?.slice(1) ?? [];
    for (const text of [...offered('1,375', 'length', 'in'), ...offered('4,500', 'length', 'in')]) expect(parse(text, 'length', 'in').ok).toBe(true);
    for (const text of [...offered('410.125', 'distance', 'km'), ...offered('9.999', 'distance', 'km')]) expect(parse(text, 'distance', 'km').ok).toBe(true);
    expect(offered('410.125', 'distance', 'km')).toHaveLength(2);
  });

  it('asks nothing of a person whose decimal mark is known', () => {
    expect(parse('4,500 in3', 'volume', 'mL', '.')).toMatchObject({ value: 4500 });
    expect(parse('4,500 in3', 'volume', 'mL', ',')).toMatchObject({ value: 4.5 });
    expect(parse('410.000 km', 'distance', 'km', ',')).toMatchObject({ value: 410_000 });
    expect(parse('410.000 km', 'distance', 'km', '.')).toMatchObject({ value: 410 });
  });

  it('still reads what can only be meant one way, whatever the mark', () => {
    expect(parse('8,3 bar', 'pressure', 'psi', '.')).toMatchObject({ value: 8.3 });
    expect(parse('8.3 bar', 'pressure', 'psi', ',')).toMatchObject({ value: 8.3 });
  });

  it.each(['12,34,567', '1,,2', '1.2.3', '1.23.4', '12 34', '1,234,56', ',', '.', '1,2,3.4'])('%s is refused', (text) => {
    expect(parse(text, 'distance', 'mi').ok).toBe(false);
  });
});

describe('times and strung units', () => {
  it.each<[string, number]>([
    ['1:30', 90],
    ['0:47.5', 47.5],
    ['0:47,5', 47.5],
    ['1:02:30', 3750],
    ['1:30 min', 90],
    ['1:30 h', 5400],
    ['1 min 30 s', 90],
    ['1m30s', 90],
    ['1 h 20 min', 4800],
    ['1 h 2 min 3.5 s', 3723.5],
    ['1,5 min', 90],
    ['48', 48],
    ['2 years', 2 * 365.25 * 86_400],
  ])('%s is %d s', (text, seconds) => {
    expect(parse(text, 'duration', 's')).toMatchObject({ ok: true, si: seconds });
  });

  it('asks a person who thinks in hours what the colon means', () => {
    expect(messageOf('1:30', 'duration', 'h')).toContain('1:30 min or 1:30 h');
  });

  it('adds feet and inches', () => {
    expect(parse('5 ft 6 in', 'length', 'mm')).toMatchObject({ value: 66, unit: 'in', si: 1.6764 });
    expect(parse('5\' 6 1/2"', 'length', 'mm')).toMatchObject({ value: 66.5, unit: 'in' });
  });

  it.each(['1:75', '1:2', '1:02:75', '1::30', ':30', '1:30:', '1:30 psi', '1:30 d', '5 ft', '30 s 1 min', '1 min 75 s', '1 min 30', '1 min 1 min'])(
    '%s is no time',
    (text) => {
      expect(parse(text, 'duration', 's').ok).toBe(false);
    },
  );

  it.each(['5 ft 12 in', '5 ft 6', '6 in 5 ft', '5 ft -6 in', '120 psi 3 psi'])('%s is no length', (text) => {
    expect(parse(text, 'length', 'in').ok).toBe(false);
  });

  it('does not string units where nobody does', () => {
    expect(parse('100 psi 5 psi', 'pressure', 'psi').ok).toBe(false);
  });
});

describe('refusals', () => {
  it.each<[string, Quantity, UnitId, string]>([
    ['', 'length', 'mm', 'Type a length, such as 16 mm or 5/8 in.'],
    ['12 furlongs', 'length', 'mm', "'12 furlongs' is not a length that we know. Try 16 mm or 5/8 in."],
    ['12 psi', 'length', 'mm', "'psi' is a unit of pressure. A length can be in mm, cm, m, in or ft."],
    ['12 in3', 'length', 'mm', "'in3' is a unit of volume. A length can be in mm, cm, m, in or ft."],
    ['5 psi', 'ratio', 'percent', "'psi' is a unit of pressure. A share or a ratio can be in %, or a plain number."],
    ['5 psi', 'count', 'one', "'psi' is a unit of pressure. Type a plain number, without a unit."],
    ['-3 mm', 'length', 'mm', 'A length cannot be less than zero.'],
    ['-459.68 F', 'temperature', 'degF', 'Nothing is colder than -459.67 °F (-273.15 °C).'],
    ['-1 K', 'temperature', 'degF', 'Nothing is colder than -459.67 °F (-273.15 °C).'],
    ['-25 inH2O', 'vacuum', 'inH2O', 'Type a vacuum without a minus sign; boost is a pressure.'],
    ['-3', 'pressureRate', 'psi/min', 'Type how large the change is, without a minus sign.'],
    ['1:0', 'ratio', 'one', "'1:0' divides by zero."],
    ['4.5', 'count', 'one', "'4.5' is not a whole number."],
    ['10000000000', 'distance', 'mi', "'10000000000' is too large to be a reading."],
    ['410k', 'distance', 'mi', "'410k' is not clear. Write the thousands out, such as 410,000 mi."],
    ['120 psia', 'pressure', 'psi', "'120 psia' is not clear. Absolute pressure is not taken here. Type what the gauge shows, such as 120 psi."],
  ])('%s as %s', (text, quantity, unit, message) => {
    expect(messageOf(text, quantity, unit)).toBe(message);
  });

  it.each(['NaN', 'Infinity', '-Infinity', '1e5', '0x10', '12²', '100-120 psi', '~120', '<5 psi', '5 ± 1', '--5', '+-5', 'psi', '120 psi or so', '١٢'])(
    '%s is not guessed at',
    (text) => {
      expect(parse(text, 'pressure', 'psi').ok).toBe(false);
    },
  );

  it('takes a gauge pressure below the air around, down to a perfect vacuum', () => {
    expect(parse('-101.325 kPa', 'pressure', 'psi')).toMatchObject({ ok: true, si: -101_325 });
    expect(parse('-20 psi', 'pressure', 'psi').ok).toBe(false);
    expect(parse('30 inHg', 'vacuum', 'inH2O').ok).toBe(false);
  });

  it('takes absolute zero and the sign of a difference', () => {
    expect(parse('-459.67 F', 'temperature', 'degC')).toMatchObject({ ok: true, si: 0 });
    expect(parse('-273.15 C', 'temperature', 'degF')).toMatchObject({ ok: true, si: 0 });
    expect(parse('-18 F', 'temperatureDifference', 'degC')).toMatchObject({ ok: true, si: -10 });
  });

  it('has no minus zero', () => {
    const parsed = parse('-0', 'length', 'mm');
    expect(parsed.ok && Object.is(parsed.value, 0) && Object.is(parsed.si, 0)).toBe(true);
  });

  it('shows only the start of a long text, and refuses it quickly', () => {
    const started = performance.now();
    const message = messageOf('1 '.repeat(200_000), 'length', 'mm');
    expect(performance.now() - started).toBeLessThan(1000);
    expect(message.length).toBeLessThan(120);
  });

  it('throws at a default unit of another quantity: the program is wrong, not the text', () => {
    expect(() => parse('5', 'pressure', 'mm')).toThrow(RangeError);
  });
});

describe('any text at all', () => {
  const alphabet = fc.constantFrom(...'0123456789.,:/ -+−½⅝\'"°%kKpsibarminFChLft²³per\u00a0\u202f∞e');
  const text = fc.oneof(fc.string({ unit: 'binary' }), fc.string({ unit: alphabet, maxLength: 14 }));

  it('is understood as a finite value or refused with a sentence', () => {
    const target = fc.constantFrom(...QUANTITY_IDS).chain((quantity) => fc.record({ quantity: fc.constant(quantity), defaultUnit: fc.constantFrom(...unitsOf(quantity)) }));
    fc.assert(
      fc.property(text, target, fc.constantFrom<DecimalMark | undefined>('.', ',', undefined), (typed, { quantity, defaultUnit }, decimal) => {
        const parsed = parse(typed, quantity, defaultUnit, decimal);
        if (parsed.ok) {
          expect(Number.isFinite(parsed.si) && Number.isFinite(parsed.value)).toBe(true);
          expect(unitsOf(quantity)).toContain(parsed.unit);
          expect(parsed.asTyped).toBe(typed.trim());
        } else {
          expect(parsed.message).toMatch(/^\S.*\.$/su);
        }
      }),
      { numRuns: 3000 },
    );
  });
});
