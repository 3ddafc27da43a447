import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { expectedSaving, leastCost } from '@/lib/diagnose/evsi';
import { forecast } from '@/lib/diagnose/information';

const shares = (count: number) =>
  fc.array(fc.double({ min: 0.001, max: 1, noNaN: true }), { minLength: count, maxLength: count }).map((parts) => {
    const sum = parts.reduce((a, b) => a + b, 0);
    return parts.map((part) => part / sum);
  });
const costs = (count: number) => fc.array(fc.double({ min: -1000, max: 1000, noNaN: true }), { minLength: count, maxLength: count });

const decision = fc.record({ causes: fc.integer({ min: 1, max: 5 }), states: fc.integer({ min: 1, max: 4 }) }).chain(({ causes, states }) =>
  fc.record({
    p: shares(causes),
    columns: fc.array(shares(states), { minLength: causes, maxLength: causes }),
    plans: fc.array(costs(causes), { minLength: 1, maxLength: 6 }),
    after: fc.array(fc.option(costs(causes), { nil: undefined }), { minLength: states, maxLength: states }),
  }),
);
const tableOf = (columns: number[][]) => (columns[0] ?? []).map((_, v) => columns.map((column) => column[v] ?? 0));

describe('expected saving', () => {
  it('is never negative, whatever plan is found after an answer', () => {
    fc.assert(fc.property(decision, ({ p, columns, plans, after }) => {
      const asked = forecast(p, tableOf(columns));
      const withNone = expectedSaving(p, asked, plans);
      const withSome = expectedSaving(p, asked, plans, after);
      expect(withNone).toBeGreaterThanOrEqual(0);
      expect(withSome).toBeGreaterThanOrEqual(withNone - 1e-9);
    }));
  });

  it('would be negative if only the plans of a poor search after the answer counted', () => {
    const asked = forecast([0.5, 0.5], [[1, 0], [0, 1]]);
    const poor = [[100, 100], [100, 100]];
    expect(leastCost([0.5, 0.5], [[10, 10]]) - 100).toBeLessThan(0);
    expect(expectedSaving([0.5, 0.5], asked, [[10, 10]], poor)).toBe(0);
  });

  it('is never more than what knowing the truth would save', () => {
    fc.assert(fc.property(decision, ({ p, columns, plans }) => {
      const truth = forecast(p, p.map((_, v) => p.map((__, c) => (c === v ? 1 : 0))));
      expect(expectedSaving(p, forecast(p, tableOf(columns)), plans)).toBeLessThanOrEqual(expectedSaving(p, truth, plans) + 1e-9);
    }));
  });

  it('needs a plan', () => {
    expect(() => leastCost([1], [])).toThrow(RangeError);
  });
});
