import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { costOf } from '@/lib/diagnose/evsi';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { repairOrder } from '@/lib/diagnose/repair-order';
import { expectedRepairCost, planCosts, repairProblem } from '@/lib/diagnose/repair-order-costs';
import type { Remedy } from '@/lib/diagnose';
import { repairs } from './repair-problems';

const money = { labourRatePerHour: 120, serviceCost: 3000, comebackCost: 900 };
const remedy = (id: string, causes: string[], more: Partial<Remedy> = {}): Remedy => ({
  id, station: null, name: id, causes, look: { minutes: 30 }, fix: { minutes: 60 }, parts: [{ name: 'part', cost: 40 }],
  seenInBay: true, steps: [], cautions: [], basis: 'judgement', ...more,
});
const causes = [{ id: 'leak' }, { id: 'worn' }, { id: 'normal-carryover', costIfLeft: 80 }, { id: 'something-else' }];

describe('repairs as money', () => {
  it('prices minutes at the labour rate, parts with the fix', () => {
    const [action] = repairProblem([remedy('cure', ['leak'])], causes, money).actions;
    expect(action).toMatchObject({ lookCost: 60, fixCost: 160, comebackCost: 0, onReaching: 60, onRemoving: 160 });
  });

  it('uses up the parts on reaching it where looking already does it', () => {
    const [action] = repairProblem([remedy('swap', ['leak'], { fix: { minutes: 0 } })], causes, money).actions;
    expect(action).toMatchObject({ lookCost: 100, fixCost: 0 });
  });

  it('puts a comeback on what is not seen in the bay', () => {
    const [action] = repairProblem([remedy('swap', ['leak'], { seenInBay: false })], causes, money).actions;
    expect(action).toMatchObject({ comebackCost: 900, onReaching: 960, onRemoving: -740 });
  });

  it('leaves normal carryover at its own cost, never the service', () => {
    expect([...repairProblem([], causes, money).left]).toEqual([3000, 3000, 80, 3000]);
  });

  it('counts the comeback of every action that was not the one', () => {
    const problem = repairProblem([remedy('swap', ['leak'], { seenInBay: false }), remedy('cure', ['worn'])], causes, money);
    const p = [0.5, 0.3, 0.1, 0.1];
    const byHand = 60 + 0.5 * 160 + 0.5 * 900 + 0.5 * 60 + 0.3 * 160 + 0.1 * 80 + 0.1 * 3000;
    expect(expectedRepairCost(problem, p, [0, 1])).toBeCloseTo(byHand, 9);
  });

  it('as a plan is linear in p: its costs by cause times p are the expected cost', () => {
    fc.assert(fc.property(repairs({ min: 1, max: 8 }, true), fc.nat(), ({ problem, p }, salt) => {
      const order = [...problem.actions.keys()].filter((a) => (salt >> a) % 2 === 0).reverse();
      expect(costOf(planCosts(problem, order), p)).toBeCloseTo(expectedRepairCost(problem, p, order), 8);
    }));
  });
});

describe('the steps of a repair order', () => {
  const problem = repairProblem(
    [remedy('cure', ['leak']), remedy('swap', ['leak', 'worn'], { look: { minutes: 60 }, seenInBay: false })],
    causes,
    money,
  );
  const order = repairOrder(problem, [0.6, 0.25, 0.1, 0.05]);

  it('name what each removes that none before it did, with its numbers', () => {
    expect(order.method).toBe('every-order');
    expect(order.steps.map(({ remedyId, causeIds, reached, p }) => ({ remedyId, causeIds, reached, p }))).toEqual([
      { remedyId: 'cure', causeIds: ['leak'], reached: 1, p: 0.6 },
      { remedyId: 'swap', causeIds: ['worn'], reached: 0.4, p: 0.25 },
    ]);
    expect(order.steps[1]).toMatchObject({ lookCost: 120, fixCost: 160, comebackCost: 900 });
    expect(order.steps[1]?.wrong).toBeCloseTo(0.15, 12);
    expect(order.steps[0]?.chancePerMoney).toBeCloseTo(0.6 / 60, 12);
  });

  it('add up, with what is left, to the expected cost', () => {
    const parts = [...order.steps, ...order.left].reduce((sum, { expectedCost }) => sum + expectedCost, 0);
    expect(parts).toBeCloseTo(order.expectedCost, 9);
    expect(order.left.map(({ causeId }) => causeId)).toEqual(['something-else', 'normal-carryover']);
  });

  it('cost no more than doing nothing', () => {
    expect(order.expectedCost).toBeLessThan(order.costOfLeaving);
    expect(order.costOfLeaving).toBeCloseTo(0.6 * 3000 + 0.25 * 3000 + 0.1 * 80 + 0.05 * 3000, 9);
  });

  it('of the default rulebook: what a cause as good as proved asks for comes first', () => {
    const all = repairProblem(defaultRulebook.remedies, defaultRulebook.causes, defaultRulebook.settings);
    const near = (id: string) => defaultRulebook.causes.map((cause) => (cause.id === id ? 0.95 : 0.05 / (defaultRulebook.causes.length - 1)));
    expect(repairOrder(all, near('discharge-line-carboned')).steps[0]?.remedyId).toBe('replace-discharge-line');
    expect(repairOrder(all, near('governor-faulty')).steps[0]?.remedyId).toBe('replace-governor');
    // Nothing is wrong with the compressor, so it stays where it is.
    expect(repairOrder(all, near('normal-carryover')).steps.map(({ remedyId }) => remedyId)).not.toContain('replace-compressor');
  });
});
