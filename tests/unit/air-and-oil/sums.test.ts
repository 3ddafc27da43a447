import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluate } from '@/lib/air-and-oil/formula/evaluate';
import { symbolsIn } from '@/lib/air-and-oil/formula/expression';
import { OutOfRange } from '@/lib/air-and-oil/out-of-range';
import { SUMS, bandOf, completeInputs, formulaMathml, formulaSpeech, plotPoints, quantitiesOf, runSum, sumOf, type Sum } from '@/lib/air-and-oil/sums';
import { isQuantity, isUnitOf } from '@/lib/units';
import { defaultsOf } from './draws';

/** Anything that a person may type into the fields of a sum. */
const inputsOf = (sum: Sum) =>
  fc.record(
    Object.fromEntries(
      sum.inputs.map(({ id, quantity, least, most, byDefault }) => [
        id,
        quantity === 'count'
          ? fc.integer({ min: least, max: Math.min(most, 20) })
          : fc.oneof({ weight: 3, arbitrary: fc.double({ min: Math.max(least, byDefault / 2), max: Math.max(byDefault, Math.min(most, byDefault * 1.5)), noNaN: true }) }, fc.double({ min: least, max: most, noNaN: true })),
      ]),
    ),
  );

describe.each(SUMS)('the sum $id', (sum) => {
  it('is described so that a page can drive it', () => {
    const all = quantitiesOf(sum);
    expect(sum.id).toMatch(/^[a-z]+(-[a-z]+)*$/);
    expect(new Set(all.map(({ id }) => id)).size).toBe(all.length);
    expect(sum.outputs.map(({ id }) => id)).toContain(sum.main);
    for (const { quantity, like, label } of all) {
      expect(isQuantity(quantity) && isUnitOf(quantity, like), `${label} in ${like}`).toBe(true);
      expect(label).toMatch(/^[A-Z]/);
    }
    for (const { byDefault, least, most, halfWidth } of sum.inputs) {
      expect(byDefault).toBeGreaterThanOrEqual(least);
      expect(byDefault).toBeLessThanOrEqual(most);
      expect(halfWidth(byDefault)).toBeGreaterThanOrEqual(0);
      expect(halfWidth(-byDefault)).toBe(halfWidth(byDefault));
    }
    for (const sentence of [sum.purpose, ...sum.cautions, ...sum.assumptions, ...sum.cannotTell, sum.source]) expect(sentence).toMatch(/^[A-Z0-9].*\.$/s);
    expect(sum.assumptions.length).toBeGreaterThan(0);
    expect(sum.cannotTell.length).toBeGreaterThan(0);
  });

  it('comes to something by its defaults alone', () => {
    expect(runSum(sum, defaultsOf(sum)).kind).toBe('values');
    expect(bandOf(sum, defaultsOf(sum))).toBeDefined();
  });

  it('shows the formula that it works by', () => {
    const ids = quantitiesOf(sum).map(({ id }) => id);
    for (const id of symbolsIn(sum.formula.expression)) expect(ids).toContain(id);
    fc.assert(
      fc.property(inputsOf(sum), (inputs) => {
        let outcome;
        try {
          outcome = runSum(sum, inputs);
        } catch {
          return;
        }
        if (outcome.kind === 'never') return;
        const main = outcome.values[sum.main];
        if (main === undefined) return;
        const byFormula = evaluate(sum.formula.expression, { ...inputs, ...outcome.values });
        expect(Math.abs(byFormula - main)).toBeLessThanOrEqual(1e-8 * Math.max(Math.abs(main), 1e-12) + tinyOf(sum));
      }),
      { numRuns: 60 },
    );
  });

  it('comes to finite numbers, to nothing with its reason, or says which input does not fit', () => {
    fc.assert(
      fc.property(inputsOf(sum), (inputs) => {
        try {
          const outcome = runSum(sum, inputs);
          if (outcome.kind === 'never') expect(outcome.because).toMatch(/^[A-Z].*\.$/s);
          else for (const [id, value] of Object.entries(outcome.values)) expect(value === undefined || Number.isFinite(value), `${id} is ${value}`).toBe(true);
        } catch (error) {
          if (!(error instanceof OutOfRange)) throw error;
          expect(sum.inputs.map(({ id }) => id)).toContain(error.field);
        }
      }),
      { numRuns: 120 },
    );
  });

  it('refuses each input past its bounds and each that is missing, by its id', () => {
    for (const { id, least, most, optional } of sum.inputs) {
      for (const wrong of [least - 1, most + 1, NaN, Infinity]) {
        const refused = () => runSum(sum, { ...defaultsOf(sum), [id]: wrong });
        expect(refused).toThrow(OutOfRange);
        expect(refused).toThrow(expect.objectContaining({ field: id }));
      }
      const { [id]: _, ...rest } = defaultsOf(sum);
      if (optional) expect(runSum(sum, rest)).toEqual(runSum(sum, defaultsOf(sum)));
      else expect(() => runSum(sum, rest)).toThrow(expect.objectContaining({ field: id }));
    }
  });

  it('takes a value that its conversion pushed past a bound by a last bit', () => {
    for (const { id, most } of sum.inputs) expect(completeInputs(sum, { ...defaultsOf(sum), [id]: most * (1 + 1e-15) })[id]).toBe(most);
  });

  it('draws its formula and says it', () => {
    const drawn = formulaMathml(sum);
    expect(drawn).toMatch(/^<math display="block" alttext="[^"<]+">.*<mo>=<\/mo>.*<\/math>$/s);
    expect(drawn.match(/<\w+/g)?.length).toBe(drawn.match(/<\/\w+/g)?.length);
    expect(formulaSpeech(sum)).not.toMatch(/undefined|NaN|[<>]/);
    const values = Object.fromEntries(quantitiesOf(sum).map(({ id }) => [id, `value of ${id}`]));
    for (const id of symbolsIn(sum.formula.expression)) expect(formulaMathml(sum, values)).toContain(`value of ${id}`);
    expect(formulaMathml(sum, values)).toContain(`<mo>=</mo><mtext>value of ${sum.main}</mtext></math>`);
  });

  it('draws its plot without gaps around its defaults, where it has one', () => {
    const points = plotPoints(sum, defaultsOf(sum), 20);
    expect(points).toHaveLength(sum.plot === undefined ? 0 : 21);
    for (const { x, y } of points) expect([x, ...Object.values(y)].filter((value) => value !== undefined).every(Number.isFinite)).toBe(true);
    for (const { label, at } of sum.plot?.marks ?? []) expect(Number.isFinite(at(completeInputs(sum, defaultsOf(sum)))), label).toBe(true);
  });
});

/** Where a difference cancels, no more digits than those of its parts can agree. */
function tinyOf({ id }: Sum): number {
  return id === 'leak-down' || id === 'head-pressure' ? 1e-6 : 0;
}

describe('the words of the sums', () => {
  const texts = SUMS.flatMap((sum) => [sum.name, sum.purpose, sum.source, ...sum.cautions, ...sum.assumptions, ...sum.cannotTell, ...sum.inputs.map(({ note = '' }) => note)]);

  it('claim no discharge-temperature limit, and no 45 s or psi per minute of the federal regulation', () => {
    for (const text of texts) {
      expect(text).not.toMatch(/45 s|psi per minute|psi\/min|1910\.169/);
      if (/temperature/i.test(text)) expect(text).not.toMatch(/must not exceed|maximum allowed|legal/i);
    }
  });

  it('warn first wherever an engine runs, a line is hot or a tank holds pressure', () => {
    for (const id of ['build-up', 'leak-down', 'time-loaded', 'discharge-temperature', 'line-loss', 'head-pressure', 'orifice-flow', 'leak-size', 'break-in-bleed', 'drain-capacity', 'carry-over', 'carry-over-by-weight']) {
      expect(sumOf(id)?.cautions.length, id).toBeGreaterThan(0);
    }
  });

  it('know no inherited names', () => {
    expect(sumOf('toString')).toBeUndefined();
  });
});
