/**
 * What an answer is worth in money before it is known. A plan (a sequence of repairs, drilling a well, buying a car)
 * has one cost for each truth, so its expected cost is linear in p, and the least over a set of plans, V(p), is
 * concave: EVSI = V(p) - sum_v P_v V(p^(v)) can't be negative, since p = sum_v P_v p^(v) (Jensen's inequality).
 *
 * Finding the very best plan at every p^(v) is dear, and a greedy search may miss it, which would break that. So no
 * search is trusted alone: V(p) is the least over a set of plans, and every V(p^(v)) is the least over *the same set*
 * and at most one plan more, found for that answer. A plan more can only lower V(p^(v)); so EVSI is 0 or more however
 * poor the search. A plan that was missed at an answer makes it too small, never negative.
 */
import type { Forecast } from './information';

/** Expected cost of one plan for each truth; money, a gain being a negative cost. */
export type PlanCosts = ArrayLike<number>;

/**
 * Expected cost of a plan: sum_c p_c x its cost when c is the truth.
 *
 * @example costOf([20, 100], [0.7, 0.3]); // 44
 */
export function costOf(plan: PlanCosts, p: ArrayLike<number>): number {
  let cost = 0;
  for (let c = 0; c < p.length; c += 1) cost += p[c]! * plan[c]!;
  return cost;
}

/**
 * V(p): expected cost of the best of some plans.
 *
 * @param p probabilities of the truths, summing to 1
 * @param plans at least one plan, each with one cost for each truth
 * @returns least expected cost, money
 * @throws RangeError when there is no plan
 * @example leastCost([0.7, 0.3], [[0, 100], [20, 20]]); // 20
 */
export function leastCost(p: ArrayLike<number>, plans: readonly PlanCosts[]): number {
  if (plans.length === 0) throw new RangeError('leastCost expects at least one plan, got none');
  let least = Infinity;
  for (const plan of plans) least = Math.min(least, costOf(plan, p));
  return least;
}

/**
 * Expected value of sample information: how much the answer lowers the expected cost of what is done next.
 *
 * @param p probabilities of the truths, summing to 1
 * @param asked what asking would bring, from `forecast` with the same p
 * @param plans the set over which every V is taken
 * @param planAfter by answer: one plan more for it, where one was found
 * @returns money, 0 or more (a rounding residue below 0 is cut off)
 * @see Raiffa and Schlaifer (1961), Applied Statistical Decision Theory
 * @example expectedSaving([0.5, 0.5], forecast([0.5, 0.5], [[1, 0], [0, 1]]), [[0, 10], [10, 0]]); // 5
 */
export function expectedSaving(
  p: ArrayLike<number>,
  asked: Forecast,
  plans: readonly PlanCosts[],
  planAfter: readonly (PlanCosts | undefined)[] = [],
): number {
  let after = 0;
  asked.posteriors.forEach((posterior, v) => {
    const chance = asked.chances[v]!;
    if (chance === 0) return;
    const found = planAfter[v];
    const least = leastCost(posterior, plans);
    after += chance * (found ? Math.min(least, costOf(found, posterior)) : least);
  });
  return Math.max(0, leastCost(p, plans) - after);
}
