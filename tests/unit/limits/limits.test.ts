import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { CHECKS_WITH_FIGURES, judge, judgementText, limitsFor, limitText, publishedFor, type AdoptedLimit } from '@/lib/limits';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';

const any: AdoptedLimit = {
  id: 'any', checkId: 'c', least: null, most: 10, below: false, source: 's', modelId: null, country: null, vehicleKind: null, builtFrom: null, builtBefore: null, adoptedAt: new Date('2026-01-01'),
};
const unit = { modelId: 'm', country: 'US', vehicleKind: 'truck', builtOn: '2010-05-05' };
const held = (...limits: Partial<AdoptedLimit>[]) => limitsFor(limits.map((limit) => ({ ...any, ...limit })), unit).get('c')?.id;

describe('the limit that holds', () => {
  test('names most of the unit, whatever the order', () => {
    const limits = [{ id: 'built', builtFrom: '2010-05-05' }, { id: 'kind', vehicleKind: 'truck' }, { id: 'country', country: 'US' }, { id: 'model', modelId: 'm' }];
    for (let n = 1; n <= limits.length; n += 1) expect(held(...limits.slice(0, n), any)).toBe(limits[n - 1]?.id);
    expect(held(any, ...limits.toReversed())).toBe('model');
  });

  test('is the newest of the same width', () => expect(held({ id: 'old' }, { id: 'new', adoptedAt: new Date('2026-02-01') })).toBe('new'));

  test.each([
    ['another model', { modelId: 'x' }],
    ['another country', { country: 'PT' }],
    ['a bus', { vehicleKind: 'bus' }],
    ['built from the next day', { builtFrom: '2010-05-06' }],
    ['built before the day', { builtBefore: '2010-05-05' }],
  ])('is none that is for %s', (_, limit) => expect(held({ id: 'x', ...limit })).toBeUndefined());

  test('for a range of build dates is none for a unit whose date nobody knows', () =>
    expect(limitsFor([{ ...any, builtFrom: '1900-01-01' }], { ...unit, builtOn: null }).size).toBe(0));
});

describe('a judgement', () => {
  const value = fc.double({ min: -1e6, max: 1e6, noNaN: true });
  test('is out past either end, and doubtful exactly when the error reaches over an end', () => {
    fc.assert(
      fc.property(value, value, value, fc.double({ min: 0, max: 1e6, noNaN: true }), (x, a, b, error) => {
        const [least, most] = [Math.min(a, b), Math.max(a, b)];
        const { verdict, doubtful } = judge({ ...any, least, most }, x, error);
        const within = (y: number) => y >= least && y <= most;
        expect(verdict).toBe(within(x) ? 'within' : 'out');
        expect(doubtful).toBe(within(x - error) !== within(x) || within(x + error) !== within(x));
      }),
    );
  });

  test('of “less than” is out at the value itself', () => {
    expect(judge({ ...any, below: true }, 10).verdict).toBe('out');
    expect(judge(any, 10).verdict).toBe('within');
  });

  test('names its limit and the source', () => {
    const shown = { quantity: 'duration', unit: 's' } as const;
    expect(judgementText(judge(any, 12), shown)).toBe('Out of the limit your organisation adopted, at most 10 s (s)');
    expect(limitText({ least: 2, most: null, below: false }, shown)).toBe('at least 2 s');
    expect(limitText({ least: 2, most: 5, below: true }, shown)).toBe('2 s to less than 5 s');
  });
});

describe('published figures of a check', () => {
  test.each(CHECKS_WITH_FIGURES)('%s: the check is measured in their quantity', (checkId) => {
    const check = defaultRulebook.checks.find(({ id }) => id === checkId);
    const figures = publishedFor(checkId);
    expect(figures.length).toBeGreaterThan(0);
    for (const { quantity } of figures) expect(quantity).toBe(check?.quantity);
  });
});
