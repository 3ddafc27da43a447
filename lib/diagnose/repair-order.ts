/** The order of repairs, with its reasons in numbers. */
import { expectedRepairCost, planCosts, type RepairProblem } from './repair-order-costs';
import { findOrder, type SearchMethod } from './repair-order-search';

export interface RepairStep {
  remedyId: string;
  /** Causes that it removes and that no earlier step has removed. */
  causeIds: string[];
  /** Chance of getting as far as this step: (0, 1]. */
  reached: number;
  /** Chance that this step removes the cause. */
  p: number;
  /** Chance of getting this far and further: that it wasn't this one either. */
  wrong: number;
  /** Money: spent on reaching it, spent more when it is the one, and the comeback when it wasn't (0: seen in the bay). */
  lookCost: number;
  fixCost: number;
  comebackCost: number;
  /** What it adds to the expected cost, before what it saves later. */
  expectedCost: number;
  /** p for each unit of money spent on reaching it (comeback included): what puts it at this place. */
  chancePerMoney: number;
}

export interface RepairOrder {
  /** Empty where leaving everything as it is costs least. */
  steps: RepairStep[];
  /** Causes that no step removes, with what each adds to the expected cost. Dearest first. */
  left: { causeId: string; p: number; expectedCost: number }[];
  /** ECR: expected cost of the sequence with what is left; money. */
  expectedCost: number;
  /** Expected cost of doing nothing; money. */
  costOfLeaving: number;
  /** Best of all sets, best of all sets in all orders, or greedy. */
  method: SearchMethod;
  /** Cost of the plan for each cause, in the order of the problem's causes: the plan as a linear function of p. */
  plan: Float64Array;
}

/**
 * Which remedies to do, and in which order, so that the expected cost is least.
 *
 * @param problem remedies as money, from `repairProblem`
 * @param p causes' probabilities in the problem's order, summing to 1
 * @returns steps, what stays, cost, and how the order was found
 * @see Heckerman, Breese and Rommelse (1995), Decision-theoretic troubleshooting
 * @example
 * const problem = repairProblem(rulebook.remedies, rulebook.causes, rulebook.settings);
 * repairOrder(problem, posterior).steps[0]?.remedyId;
 */
export function repairOrder(problem: RepairProblem, p: ArrayLike<number>): RepairOrder {
  const { order, method } = findOrder(problem, p);
  const open = new Float64Array(p);
  let reached = 1;
  const steps = order.map((a): RepairStep => {
    const { remedyId, removes, lookCost, fixCost, comebackCost, onReaching } = problem.actions[a]!;
    const news = removes.filter((c) => open[c]! > 0);
    const chance = news.reduce((sum, c) => sum + open[c]!, 0);
    for (const c of news) open[c] = 0;
    const step: RepairStep = {
      remedyId,
      causeIds: news.map((c) => problem.causeIds[c]!),
      reached,
      p: chance,
      wrong: Math.max(0, reached - chance),
      lookCost,
      fixCost,
      comebackCost,
      expectedCost: reached * lookCost + chance * fixCost + Math.max(0, reached - chance) * comebackCost,
      chancePerMoney: chance / onReaching,
    };
    reached = step.wrong;
    return step;
  });
  const left = problem.causeIds.flatMap((causeId, c) =>
    open[c]! > 0 ? [{ causeId, p: open[c]!, expectedCost: open[c]! * problem.left[c]! }] : []);
  return {
    steps,
    left: left.sort((a, b) => b.expectedCost - a.expectedCost || (a.causeId < b.causeId ? -1 : 1)),
    expectedCost: expectedRepairCost(problem, p, order),
    costOfLeaving: expectedRepairCost(problem, p, []),
    method,
    plan: planCosts(problem, order),
  };
}
