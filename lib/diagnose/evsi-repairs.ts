/** The repair plans over which what an answer saves is reckoned. */
import { costOf, expectedSaving, type PlanCosts } from './evsi';
import type { Forecast } from './information';
import { planCosts, type RepairProblem } from './repair-order-costs';
import { findOrder } from './repair-order-search';

/** At the answers the search tries all sets only up to this many actions: there are hundreds of answers. */
const TRY_ALL_AT_ANSWERS_UP_TO = 6;

/**
 * What each of many questions would save. A plan is searched at p, and after every answer. The plans compared everywhere
 * are: do nothing, the one found at p, and of all that were found after answers the one that is best at p, in case the
 * search at p missed it.
 *
 * @param problem remedies as money
 * @param p causes' probabilities now
 * @param asked what could be asked, all with the same p
 * @returns EVSI of each, in the order given; money, 0 or more
 * @example expectedSavings(problem, p, [asked])[0];
 */
export function expectedSavings(problem: RepairProblem, p: ArrayLike<number>, asked: readonly Forecast[]): number[] {
  const after = asked.map(({ chances, posteriors }) => posteriors.map((posterior, v): PlanCosts | undefined =>
    chances[v]! > 0
      ? planCosts(problem, findOrder(problem, posterior, TRY_ALL_AT_ANSWERS_UP_TO).order)
      : undefined));
  const here = planCosts(problem, findOrder(problem, p).order);
  let best: PlanCosts = here;
  for (const plan of after.flat()) if (plan && costOf(plan, p) < costOf(best, p)) best = plan;
  const everywhere = [planCosts(problem, []), here, best];
  return asked.map((forecast, i) => expectedSaving(p, forecast, everywhere, after[i]));
}
