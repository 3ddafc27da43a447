import fc from 'fast-check';
import { expectedRepairCost, type RepairProblem } from '@/lib/diagnose/repair-order-costs';

export interface RandomRepair {
  problem: RepairProblem;
  p: number[];
}

export const action = (removes: number[], lookCost: number, fixCost: number, comebackCost = 0) => ({
  remedyId: `remedy-${removes.join('-')}-${lookCost}`,
  removes, lookCost, fixCost, comebackCost,
  onReaching: lookCost + comebackCost,
  onRemoving: fixCost - comebackCost,
});

/** Random repairs: `overlap` false gives every action a cause of its own. */
export const repairs = (actions: { min: number; max: number }, overlap: boolean): fc.Arbitrary<RandomRepair> =>
  fc.integer(actions).chain((count) => {
    const causes = count + 2;
    const money = (max: number) => fc.integer({ min: 0, max });
    const removes = (a: number): fc.Arbitrary<number[]> => (overlap ? fc.uniqueArray(fc.integer({ min: 0, max: causes - 1 }), { minLength: 1, maxLength: 3 }) : fc.constant<number[]>([a]));
    return fc.record({
      p: fc.array(fc.integer({ min: 0, max: 40 }), { minLength: causes, maxLength: causes })
        .filter((parts) => parts.some((part) => part > 0))
        .map((parts) => parts.map((part) => part / parts.reduce((a, b) => a + b, 0))),
      actions: fc.tuple(...Array.from({ length: count }, (_, a) =>
        fc.tuple(removes(a), money(300), money(400), fc.constantFrom(0, 0, 200)).map(([which, look, fix, comeback]) => action(which, look, fix, comeback)))),
      left: fc.array(money(2000), { minLength: causes, maxLength: causes }),
    }).map(({ p, actions: list, left }) => ({
      p, problem: { causeIds: p.map((_, c) => `cause-${c}`), actions: list, left: Float64Array.from(left) },
    }));
  });

/** Every order of every set of actions. */
export function* everyOrder(actions: readonly number[]): Generator<number[]> {
  yield [];
  for (const first of actions) for (const rest of everyOrder(actions.filter((a) => a !== first))) yield [first, ...rest];
}

export function bruteForce({ problem, p }: RandomRepair): number {
  let least = Infinity;
  for (const order of everyOrder([...problem.actions.keys()])) least = Math.min(least, expectedRepairCost(problem, p, order));
  return least;
}
