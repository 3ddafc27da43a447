/** The pool of repair plans over which every V of one case is taken. */
import type { Forecast } from './information';
import { planCosts, type RepairProblem } from './repair-order-costs';
import { findOrder } from './repair-order-search';

/** Total variation of p under which an answer is taken not to change the plan. */
const HARDLY_MOVES = 0.05;
/** At the answers the search tries all sets only up to this many actions: there are hundreds of answers. */
const TRY_ALL_AT_ANSWERS_UP_TO = 6;

function moved(p: ArrayLike<number>, posterior: ArrayLike<number>): number {
  let distance = 0;
  for (let c = 0; c < p.length; c += 1) distance += Math.abs(p[c]! - posterior[c]!);
  return distance / 2;
}

/**
 * Plans worth comparing: nothing at all, the best at p, and what the search finds after every answer that moves p by
 * 0.05 or more (total variation). Equal plans are kept once. Whatever is missing makes `expectedSaving` smaller,
 * never negative.
 *
 * @param problem remedies as money
 * @param p causes' probabilities now
 * @param forecasts what could be asked, all with the same p
 * @returns cost of each plan by cause
 * @example expectedSaving(p, asked, repairPlans(problem, p, [asked]));
 */
export function repairPlans(problem: RepairProblem, p: ArrayLike<number>, forecasts: readonly Forecast[]): Float64Array[] {
  const orders = new Map<string, readonly number[]>();
  const keep = (order: readonly number[]): void => void orders.set(order.join(), order);
  keep([]);
  keep(findOrder(problem, p).order);
  for (const { chances, posteriors } of forecasts) {
    posteriors.forEach((posterior, v) => {
      if (chances[v]! > 0 && moved(p, posterior) >= HARDLY_MOVES) {
        keep(findOrder(problem, posterior, TRY_ALL_AT_ANSWERS_UP_TO).order);
      }
    });
  }
  return [...orders.values()].map((order) => planCosts(problem, order));
}
