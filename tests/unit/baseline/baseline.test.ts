import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { baselineFor, usualOf, type Baseline } from '@/lib/baseline/baseline-for';
import { compare } from '@/lib/baseline/compare';
import { FIGURE_IDS, FIGURES, figureOf, isFigureId, type FigureId } from '@/lib/baseline/figures';
import { pool } from '@/lib/baseline/pool';
import type { BaselineSet } from '@/lib/baseline/set';
import { comparisonText, conditionsText, figureText, usualText } from '@/lib/baseline/words';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { CONDITION_MEASURES, recordBaselineInput } from '@/lib/schemas/baseline';
import { differenceOf, formatQuantity, METRIC_UNITS, parseQuantity, toSi, unitFor, US_UNITS, type Quantity } from '@/lib/units';

const NOTHING_SAID = { ambientK: null, engineSpeedPerS: null, loadedS: null };
let made = 0;
const set = (unitId: string, measuredOn: string, values: Partial<Record<FigureId, number>>): BaselineSet => ({
  id: `set-${String((made += 1)).padStart(6, '0')}`,
  unitId,
  measuredOn,
  occasion: 'service',
  conditions: NOTHING_SAID,
  figures: Object.fromEntries(Object.entries(values).map(([figure, si]) => [figure, { si, errorSi: 1 }])),
});
const buildUp = (unitId: string, measuredOn: string, seconds: number) => set(unitId, measuredOn, { 'build-up-time': seconds });
/** Whole spaces for reading. */
const plain = (text: string) => text.replaceAll('\u00a0', ' ');

describe('the figures', () => {
  test('each have steps, a caution and an error that makes sense', () => {
    expect(FIGURES.map(({ id }) => id)).toEqual([...FIGURE_IDS]);
    for (const { steps, caution, usualError, range, quantity, like } of FIGURES) {
      expect(steps.length).toBeGreaterThan(0);
      expect(steps.length).toBeLessThanOrEqual(3);
      expect(caution).toMatch(/\.$/);
      expect(usualError).toBeGreaterThan(0);
      expect(usualError).toBeLessThan(range.max - range.min);
      expect(() => formatQuantity<Quantity>(range.max, { quantity, unit: unitFor<Quantity>(METRIC_UNITS, quantity, like) })).not.toThrow();
    }
  });

  test('have their fields in the input, and their conditions', () => {
    const fields = Object.keys(recordBaselineInput.shape);
    for (const { field, conditions } of FIGURES) expect(fields).toEqual(expect.arrayContaining([field, `${field}Error`, ...conditions]));
    for (const { field } of CONDITION_MEASURES) expect(fields).toContain(field);
  });

  test('are asked back when there is none of that name', () => {
    expect(isFigureId('oil-carried')).toBe(true);
    expect(isFigureId('toString')).toBe(false);
    expect(() => figureOf('colour' as FigureId)).toThrow(RangeError);
  });

  test.each(defaultRulebook.checks.flatMap(({ id, compares, quantity }) => (compares ? [[id, compares, quantity] as const] : [])))('%s compares with a figure of its quantity, or its difference', (_, compares, quantity) => {
    expect(isFigureId(compares)).toBe(true);
    const of = figureOf(compares as FigureId).quantity;
    expect([of, differenceOf(of)]).toContain(quantity);
  });

  test('are each what a check of the default rulebook compares with', () => {
    expect(defaultRulebook.checks.flatMap(({ compares }) => compares ?? []).sort()).toEqual([...FIGURE_IDS].sort());
  });
});

describe('a pool', () => {
  test('has median and quartiles of the units, worked by hand', () => {
    // 20, 22, 24, 26, 28: the quartiles of five are the second and the fourth.
    const sets = [24, 20, 28, 22, 26].map((value, i) => buildUp(`unit ${i}`, `2026-01-0${i + 1}`, value));
    expect(pool(sets)).toEqual({ 'build-up-time': { median: 24, lower: 22, upper: 26, units: 5, sets: 5, firstOn: '2026-01-01', lastOn: '2026-01-05' } });
    // Of four, the median lies halfway between the middle two.
    expect(pool(sets.slice(0, 4))['build-up-time']?.median).toBe(23);
  });

  test('counts a unit once, by its latest set that has the figure', () => {
    const sets = [buildUp('a', '2026-01-01', 10), buildUp('a', '2026-03-01', 30), set('a', '2026-04-01', { 'share-loaded': 0.2 }), buildUp('b', '2026-02-01', 30), buildUp('c', '2026-02-01', 30)];
    expect(pool(sets)['build-up-time']).toMatchObject({ median: 30, lower: 30, upper: 30, units: 3, sets: 4, firstOn: '2026-02-01', lastOn: '2026-03-01' });
    expect(pool(sets)['share-loaded']).toMatchObject({ units: 1, sets: 1 });
  });

  test('of nothing has nothing', () => expect(pool([])).toEqual({}));

  const sets = fc.array(fc.record({ unit: fc.integer({ min: 0, max: 6 }), day: fc.integer({ min: 10, max: 28 }), value: fc.double({ min: 1, max: 100, noNaN: true }) }), { minLength: 1, maxLength: 20 });
  test('orders lower, median and upper, within what was measured, whatever the order of the sets', () => {
    fc.assert(
      fc.property(sets, (drawn) => {
        const all = drawn.map(({ unit, day, value }) => buildUp(`unit ${unit}`, `2026-01-${day}`, value));
        const pooled = pool(all)['build-up-time'];
        if (!pooled) throw new Error('nothing was pooled');
        expect(pool(all.toReversed())['build-up-time']).toEqual(pooled);
        expect(pooled.units).toBe(new Set(drawn.map(({ unit }) => unit)).size);
        expect(pooled.sets).toBe(drawn.length);
        expect(pooled.lower).toBeLessThanOrEqual(pooled.median);
        expect(pooled.median).toBeLessThanOrEqual(pooled.upper);
        const values = drawn.map(({ value }) => value);
        expect(pooled.lower).toBeGreaterThanOrEqual(Math.min(...values));
        expect(pooled.upper).toBeLessThanOrEqual(Math.max(...values));
      }),
    );
  });
});

describe('what counts for a unit', () => {
  const others = (count: number) => pool(Array.from({ length: count }, (_, i) => buildUp(`other ${i}`, '2026-01-01', 20 + i)));

  test('is its own latest set before any pool', () => {
    const own = [buildUp('a', '2026-01-01', 20), buildUp('a', '2026-02-01', 21)];
    expect(baselineFor({ own, since: '2025-06-01', pooled: others(9) })['build-up-time']).toMatchObject({ from: 'own', si: 21, measuredOn: '2026-02-01', setId: own[1]?.id });
  });

  test('is not what was measured on the compressor before, though on the day of the fit it is', () => {
    const own = [buildUp('a', '2026-01-31', 20)];
    expect(baselineFor({ own, since: '2026-02-01', pooled: {} })).toEqual({});
    expect(baselineFor({ own, since: '2026-01-31', pooled: {} })['build-up-time']?.from).toBe('own');
    expect(baselineFor({ own, since: null, pooled: {} })['build-up-time']?.from).toBe('own');
  });

  test('is the pool from three units on, and nothing with fewer', () => {
    expect(baselineFor({ own: [], since: null, pooled: others(2) })).toEqual({});
    expect(baselineFor({ own: [], since: null, pooled: others(3) })['build-up-time']).toMatchObject({ from: 'model', median: 21, units: 3 });
  });

  test('is chosen figure by figure', () => {
    const own = [set('a', '2026-03-01', { 'share-loaded': 0.2 }), buildUp('a', '2026-02-01', 21)];
    const counts = baselineFor({ own, since: null, pooled: others(3) });
    expect(counts['share-loaded']).toMatchObject({ measuredOn: '2026-03-01' });
    expect(counts['build-up-time']).toMatchObject({ from: 'own', measuredOn: '2026-02-01' });
  });
});

describe('comparing', () => {
  const celsius = (value: number) => toSi(value, 'temperature', 'degC');
  const own: Baseline = {
    from: 'own', figure: 'head-temperature', si: celsius(146), errorSi: 5, setId: 'set', measuredOn: '2026-05-12', occasion: 'service',
    conditions: { ambientK: celsius(20), engineSpeedPerS: 1600 / 60, loadedS: 600 },
  };
  const model: Baseline = { from: 'model', figure: 'head-temperature', median: celsius(150), lower: celsius(144), upper: celsius(158), units: 7, sets: 9, firstOn: '2025-01-02', lastOn: '2026-05-12' };

  test('gives difference and side', () => {
    expect(compare(celsius(184), own)).toEqual({ differenceSi: expect.closeTo(38, 9) as number, outside: 'above' });
    expect(compare(celsius(150), own).outside).toBeNull();
    expect(compare(celsius(158), model).outside).toBeNull();
    expect(compare(celsius(143), model)).toMatchObject({ outside: 'below' });
    expect(() => compare(NaN, own)).toThrow(RangeError);
  });

  test('says both, in the units of whoever reads', () => {
    expect(plain(usualText(own, METRIC_UNITS))).toBe('Usual for this unit: 146 °C, own set of 12 May 2026 (20 °C outside, 1,600 rpm, 10 min loaded)');
    expect(plain(usualText(model, METRIC_UNITS))).toBe('Usual for its model: median 150 °C, middle half 144 °C to 158 °C, 7 units');
    expect(plain(comparisonText(celsius(184), own, METRIC_UNITS))).toBe('38 °C above this unit’s own 146 °C of 12 May 2026');
    // 146 °C is 294.8 °F; 38 K are 68.4 °F: a difference has no 32 in it.
    expect(plain(comparisonText(celsius(184), own, US_UNITS))).toBe('68.4 °F above this unit’s own 295 °F of 12 May 2026');
    expect(plain(comparisonText(celsius(160), model, METRIC_UNITS))).toBe('10 °C above its model’s median of 150 °C, above the middle half of 7 units');
    expect(plain(comparisonText(celsius(145), model, METRIC_UNITS))).toBe('5 °C below its model’s median of 150 °C, within the middle half of 7 units');
    expect(plain(comparisonText(celsius(146), own, METRIC_UNITS))).toBe('the same as this unit’s own 146 °C of 12 May 2026');
  });

  test('says the conditions that are known', () => {
    expect(plain(conditionsText({ ...NOTHING_SAID, ambientK: celsius(-5) }, METRIC_UNITS))).toBe('-5 °C outside');
    expect(conditionsText(NOTHING_SAID, METRIC_UNITS)).toBe('');
  });

  test('is the value less the usual one, for every figure', () => {
    fc.assert(
      fc.property(fc.constantFrom(...FIGURES), fc.double({ min: 0, max: 1, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true }), ({ id, range }, a, b) => {
        const at = (share: number) => range.min + share * (range.max - range.min);
        const baseline: Baseline = { ...own, figure: id, si: at(a), errorSi: 0 };
        const { differenceSi, outside } = compare(at(b), baseline);
        expect(usualOf(baseline) + differenceSi).toBeCloseTo(at(b), 6);
        expect(outside).toBe(at(b) > at(a) ? 'above' : at(b) < at(a) ? 'below' : null);
      }),
    );
  });

  test('shows figures that can be typed again', () => {
    for (const { id, quantity, like, range } of FIGURES) {
      const text = figureText(id, range.max, US_UNITS);
      expect(parseQuantity<Quantity>(text, { quantity, defaultUnit: unitFor<Quantity>(US_UNITS, quantity, like) }).ok, text).toBe(true);
    }
  });
});
