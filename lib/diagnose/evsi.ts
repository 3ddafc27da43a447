/**
 * What an answer is worth in money before it is known. A plan (a sequence of repairs, drilling a well, buying a car)
 * has one cost for each truth, so its expected cost is linear in p, and V(p) = min over plans is concave.
 *
 * Finding the very best plan at every p^(v) is dear, and a greedy search may miss it. So no search is trusted alone:
 * all plans found anywhere go into one pool and every V is the least over that same pool. V over a fixed pool is
 * concave whatever the pool, and p = sum_v P_v p^(v), so by Jensen's inequality
 * EVSI = V(p) - sum_v P_v V(p^(v)) can't be negative. A plan missing from the pool makes it too small, if V(p) is
 * exact, never negative.
 */
import type { Forecast } from './information';

/** Expected cost of one plan for each truth; money, a gain being a negative cost. */
export type PlanCosts = ArrayLike<number>;

/**
 * V(p): cost of the best plan in the pool.
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
  for (const plan of plans) {
    let cost = 0;
    for (let c = 0; c < p.length; c += 1) cost += p[c]! * plan[c]!;
    if (cost < least) least = cost;
  }
  return least;
}

/**
 * Expected value of sample information: how much the answer lowers the expected cost of what is done next.
 *
 * @param p probabilities of the truths, summing to 1
 * @param asked what asking would bring, from `forecast` with the same p
 * @param plans the pool: the same for every V
 * @returns money, 0 or more (a rounding residue below 0 is cut off)
 * @see Raiffa and Schlaifer (1961), Applied Statistical Decision Theory
 * @example expectedSaving([0.5, 0.5], forecast([0.5, 0.5], [[1, 0], [0, 1]]), [[0, 10], [10, 0]]); // 5
 */
export function expectedSaving(p: ArrayLike<number>, asked: Forecast, plans: readonly PlanCosts[]): number {
  let after = 0;
  asked.posteriors.forEach((posterior, v) => {
    const chance = asked.chances[v]!;
    if (chance > 0) after += chance * leastCost(posterior, plans);
  });
  return Math.max(0, leastCost(p, plans) - after);
}
