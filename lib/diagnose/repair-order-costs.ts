/**
 * What repairs cost, brought to the one form that the search knows: an action i costs Co_i whenever it is reached and
 * Cr_i more when it is the one that removes the cause.
 *
 *   ECR = sum_i [ (1 - sum_{j<i} p_j) Co_i + p_i Cr_i ] + what the causes cost that no action removes
 *
 * Where success can't be seen in the bay (oil takes weeks to show), an action that was not the one costs a comeback K:
 *
 *   (1 - sum_{j<=i} p_j) K = (1 - sum_{j<i} p_j) K - p_i K
 *
 * so with Co' = Co + K and Cr' = Cr - K the same form holds, and with it the order by p_i / Co'_i.
 */
import type { Cause, Remedy } from './types';

/** Money that repairs rest on: the rulebook's settings, or the organisation's own. */
export interface RepairMoney {
  labourRatePerHour: number;
  /** C_service, for a cause that nobody in the bay removes. */
  serviceCost: number;
  /** K, for a repair whose success can't be seen in the bay and wasn't the right one. */
  comebackCost: number;
}

export interface RepairAction {
  remedyId: string;
  /** Indices of the causes that it removes. */
  removes: readonly number[];
  /** Co: to look, and to fix where both are one. */
  lookCost: number;
  /** Cr: to fix, once looking has shown that this is it. */
  fixCost: number;
  /** K, or 0 where success is seen in the bay. */
  comebackCost: number;
  /** Co' = Co + K. */
  onReaching: number;
  /** Cr' = Cr - K; may be below 0. */
  onRemoving: number;
}

export interface RepairProblem {
  causeIds: readonly string[];
  actions: readonly RepairAction[];
  /** By cause: what it costs when nothing removes it. */
  left: Float64Array;
}

/** Money for minutes of work. */
export const labourCost = (minutes: number, ratePerHour: number): number => (minutes / 60) * ratePerHour;

/**
 * States the remedies of a rulebook as money. Parts belong to the fix; where a remedy has no fix of its own (looking
 * already does it) they are used up as soon as it is reached. A cause that costs less than a service when it is left
 * (`normal-carryover`: a cartridge or nothing) never meets the service cost.
 *
 * @param remedies actions; causes that `causes` doesn't list are passed over
 * @param causes in the order of the probabilities that will be used
 * @param money rates and costs, one currency, all 0 or more
 * @example repairProblem(rulebook.remedies, rulebook.causes, rulebook.settings).left[0]; // 3000
 */
export function repairProblem(
  remedies: readonly Remedy[],
  causes: readonly Pick<Cause, 'id' | 'costIfLeft'>[],
  money: RepairMoney,
): RepairProblem {
  const index = new Map(causes.map((cause, c) => [cause.id, c]));
  const actions = remedies.map((remedy): RepairAction => {
    const parts = remedy.parts.reduce((sum, part) => sum + part.cost, 0);
    const lookingDoesIt = remedy.fix.minutes === 0;
    const lookCost = labourCost(remedy.look.minutes, money.labourRatePerHour) + (lookingDoesIt ? parts : 0);
    const fixCost = lookingDoesIt ? 0 : labourCost(remedy.fix.minutes, money.labourRatePerHour) + parts;
    const comebackCost = remedy.seenInBay ? 0 : money.comebackCost;
    return {
      remedyId: remedy.id,
      removes: [...new Set(remedy.causes)].flatMap((id) => index.get(id) ?? []),
      lookCost,
      fixCost,
      comebackCost,
      onReaching: lookCost + comebackCost,
      onRemoving: fixCost - comebackCost,
    };
  });
  return {
    causeIds: causes.map(({ id }) => id),
    actions,
    left: Float64Array.from(causes, ({ costIfLeft }) => costIfLeft ?? money.serviceCost),
  };
}

/**
 * Cost of a plan for each truth: what it has spent when cause c turns out to be the one. Its product with p is the
 * plan's expected cost, which makes a plan linear in p and fit for `expectedSaving`.
 *
 * @param order indices of actions, in the order in which they are done
 * @example planCosts(problem, []); // what each cause costs when nothing is done
 */
export function planCosts({ actions, left }: RepairProblem, order: readonly number[]): Float64Array {
  const costs = new Float64Array(left.length).fill(NaN);
  let spent = 0;
  for (const a of order) {
    const action = actions[a]!;
    spent += action.onReaching;
    for (const c of action.removes) if (Number.isNaN(costs[c])) costs[c] = spent + action.onRemoving;
  }
  for (let c = 0; c < costs.length; c += 1) if (Number.isNaN(costs[c])) costs[c] = spent + left[c]!;
  return costs;
}

/**
 * ECR: expected cost of a sequence of actions, summed term by term as it is written above.
 *
 * @param p causes' probabilities, summing to 1
 * @returns money
 * @see Heckerman, Breese and Rommelse (1995), Decision-theoretic troubleshooting
 * @example expectedRepairCost(problem, [0.6, 0.4], [0, 1]);
 */
export function expectedRepairCost(problem: RepairProblem, p: ArrayLike<number>, order: readonly number[]): number {
  const open = new Float64Array(p);
  let reached = 1;
  let cost = 0;
  for (const a of order) {
    const action = problem.actions[a]!;
    let removed = 0;
    for (const c of action.removes) {
      removed += open[c]!;
      open[c] = 0;
    }
    cost += reached * action.onReaching + removed * action.onRemoving;
    reached -= removed;
  }
  for (let c = 0; c < open.length; c += 1) cost += open[c]! * problem.left[c]!;
  return cost;
}
