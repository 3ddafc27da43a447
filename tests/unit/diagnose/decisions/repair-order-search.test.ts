import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { expectedRepairCost } from '@/lib/diagnose/repair-order-costs';
import { bestSet } from '@/lib/diagnose/repair-order-set';
import { findOrder } from '@/lib/diagnose/repair-order-search';
import { bruteForce, repairs, type RandomRepair } from './repair-problems';

const found = ({ problem, p }: RandomRepair, tryAllUpTo?: number) => {
  const { order, method } = findOrder(problem, p, tryAllUpTo);
  return { order, method, cost: expectedRepairCost(problem, p, order) };
};

describe('the order of repairs', () => {
  it('is as cheap as the best of all orders of all sets, where every cause has one action', () => {
    fc.assert(fc.property(repairs({ min: 1, max: 6 }, false), (repair) => {
      const { cost, method } = found(repair);
      expect(method).toBe('every-set');
      expect(cost).toBeCloseTo(bruteForce(repair), 8);
    }), { numRuns: 60 });
  });

  it('is as cheap as the best of all orders of all sets, where actions share causes', () => {
    fc.assert(fc.property(repairs({ min: 1, max: 6 }, true), (repair) => {
      const { cost, method } = found(repair);
      expect(method).not.toBe('greedy');
      expect(cost).toBeCloseTo(bruteForce(repair), 8);
    }), { numRuns: 60 });
  });

  it('sorts by p / Co, descending, where every cause has one action', () => {
    fc.assert(fc.property(repairs({ min: 2, max: 14 }, false), (repair) => {
      const ratios = found(repair).order.map((a) => {
        const { removes, onReaching } = repair.problem.actions[a] ?? { removes: [], onReaching: NaN };
        return removes.reduce((sum, c) => sum + (repair.p[c] ?? 0), 0) / onReaching;
      });
      ratios.slice(1).forEach((ratio, i) => expect(ratio).toBeLessThanOrEqual((ratios[i] ?? Infinity) + 1e-12));
    }));
  });

  it('greedy is never dearer than doing nothing, and close to the best', () => {
    let greedy = 0;
    let best = 0;
    fc.assert(fc.property(repairs({ min: 5, max: 6 }, true), (repair) => {
      const quick = found(repair, 0);
      expect(quick.cost).toBeLessThanOrEqual(expectedRepairCost(repair.problem, repair.p, []) + 1e-9);
      greedy += quick.cost;
      best += bruteForce(repair);
    }), { numRuns: 60, seed: 7 });
    expect(greedy / best).toBeLessThan(1.05);
  });

  it('is exact far beyond twelve actions, where each has a cause of its own', () => {
    fc.assert(fc.property(repairs({ min: 13, max: 15 }, false), (repair) => {
      const { cost, method, order } = found(repair);
      expect(method).toBe('every-set');
      // Every set that differs by one action, and a thousand others, cost no less.
      const all = [...repair.problem.actions.keys()];
      const sorted = found({ ...repair, problem: { ...repair.problem, left: repair.problem.left.map(() => 1e9) } }).order;
      const rank = new Map([...sorted, ...all.filter((a) => !sorted.includes(a))].map((a, i) => [a, i]));
      for (let set = 0; set < 1000; set += 1) {
        const members = all.filter((a) => ((set * 7919) >> a) & 1).sort((a, b) => (rank.get(a) ?? 0) - (rank.get(b) ?? 0));
        expect(expectedRepairCost(repair.problem, repair.p, members)).toBeGreaterThanOrEqual(cost - 1e-9);
      }
      for (const a of order) expect(expectedRepairCost(repair.problem, repair.p, order.filter((b) => b !== a))).toBeGreaterThanOrEqual(cost - 1e-9);
    }), { numRuns: 10 });
  });

  it('does nothing where nothing pays', () => {
    const problem = { causeIds: ['a', 'b'], left: Float64Array.of(10, 10), actions: [{ remedyId: 'dear', removes: [0], lookCost: 100, fixCost: 0, comebackCost: 0, onReaching: 100, onRemoving: 0 }] };
    expect(findOrder(problem, [0.9, 0.1])).toEqual({ order: [], method: 'every-set' });
  });
});

describe('the best set of a row', () => {
  it('takes two together where neither pays alone', () => {
    // Each adds 1 alone; done first, the first saves the second's looking in nine cases of ten.
    const row = { chance: Float64Array.of(0.9, 0.1), reaching: Float64Array.of(10, 10), alone: Float64Array.of(1, 1) };
    expect(bestSet(row, 12)).toEqual({ inSet: [true, true], proved: true });
  });

  it('says when it has not proved it', () => {
    const row = { chance: Float64Array.of(0.9, 0.1), reaching: Float64Array.of(10, 10), alone: Float64Array.of(1, 1) };
    expect(bestSet(row, 1)).toEqual({ inSet: [true, true], proved: false });
  });
});
