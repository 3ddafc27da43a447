/** The repair plans over which what an answer saves is reckoned. */
import { costOf, expectedSaving, type PlanCosts } from './evsi';
import type { Forecast } from './information';
import { planCosts, type RepairProblem } from './repair-order-costs';
import { findOrder } from './repair-order-search';

/** At the answers the search tries all sets only up to this many actions: there are hundreds of answers. */
const TRY_ALL_AT_ANSWERS_UP_TO = 6;

/**
 * What questions would save, one at a time: there are hundreds of answers, and for most decisions a few questions are
 * enough to look at. A plan is searched at p once, and after every answer of a question that is priced. The plans
 * compared on both sides are: do nothing, the one found at p, and of those found after the answers the one that is best
 * at p, in case the search at p missed it.
 *
 * @param problem remedies as money
 * @param p causes' probabilities now
 * @returns EVSI of a question asked at that p; money, 0 or more
 * @example pricer(problem, p)(forecast);
 */
export function pricer(problem: RepairProblem, p: ArrayLike<number>): (asked: Forecast) => number {
  const nothing = planCosts(problem, []);
  const here = planCosts(problem, findOrder(problem, p).order);
  return (asked) => {
    const after = asked.posteriors.map((posterior, v): PlanCosts | undefined =>
      asked.chances[v]! > 0 ? planCosts(problem, findOrder(problem, posterior, TRY_ALL_AT_ANSWERS_UP_TO).order) : undefined);
    let best: PlanCosts = here;
    for (const plan of after) if (plan && costOf(plan, p) < costOf(best, p)) best = plan;
    return expectedSaving(p, asked, [nothing, here, best], after);
  };
}
