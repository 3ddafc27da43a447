/**
 * Finds which actions are worth doing, and in which order.
 *
 * *No cause has two actions.* The order is by p_i / Co_i and the best set is found as in `repair-order-set.ts`.
 *
 * *Some cause has two actions.* What an action removes then depends on what came before, but only on which actions,
 * not on their order. So the best order is found over sets of actions already done (Held and Karp), 2^n steps
 * instead of n!: exact up to twelve actions. Actions that provably can't pay are left out first.
 *
 * Beyond twelve, greedy: actions are taken by chance per money, each counting only causes that no earlier one has
 * removed; so divided, the best set is exact; what it leaves out is taken away, and the causes are divided anew.
 */
import type { RepairProblem } from './repair-order-costs';
import { bestSet, type Row } from './repair-order-set';

/** How an order was found: the best of all sets, the best of all sets in all orders, or a good one. */
export type SearchMethod = 'every-set' | 'every-order' | 'greedy';

export interface FoundOrder {
  /** Indices of actions. */
  order: number[];
  method: SearchMethod;
}

/** Actions up to which every set is tried. */
export const TRY_ALL_UP_TO = 12;

/**
 * The order of repairs of least expected cost.
 *
 * @param problem actions and costs, from `repairProblem`
 * @param p causes' probabilities, summing to 1
 * @param tryAllUpTo actions up to which every set is tried, at most 20; fewer is quicker, and greedy sooner
 * @returns indices of actions (empty: nothing is worth doing) and how they were found
 * @see Kadane and Simon (1977), Optimal strategies for a class of constrained sequential problems; Held and Karp (1962)
 * @example findOrder(problem, posterior).order;
 */
export function findOrder(problem: RepairProblem, p: ArrayLike<number>, tryAllUpTo = TRY_ALL_UP_TO): FoundOrder {
  const all = [...problem.actions.keys()];
  const promising = overlaps(problem, all) ? withoutHopeless(problem, p, all) : all;
  if (!overlaps(problem, promising)) {
    const { order, proved } = bestAsDivided(problem, p, promising, tryAllUpTo);
    return { order, method: proved ? 'every-set' : 'greedy' };
  }
  return promising.length <= tryAllUpTo
    ? { order: bestOverSets(problem, p, promising), method: 'every-order' }
    : { order: greedy(problem, p, promising, tryAllUpTo), method: 'greedy' };
}

/** True where some cause is removed by two of these actions. */
function overlaps(problem: RepairProblem, actions: readonly number[]): boolean {
  const removed = new Uint8Array(problem.left.length);
  for (const a of actions) {
    for (const c of problem.actions[a]!.removes) {
      if (removed[c] === 1) return true;
      removed[c] = 1;
    }
  }
  return false;
}

/** Sorts actions by p / Co, each with the causes that none before it removes, and keeps the best set of them. */
function bestAsDivided(problem: RepairProblem, p: ArrayLike<number>, candidates: readonly number[], tryAllUpTo: number) {
  const open = new Float64Array(p);
  const waiting = [...candidates];
  const sorted: number[] = [];
  const row: Row = {
    chance: new Float64Array(candidates.length),
    reaching: new Float64Array(candidates.length),
    alone: new Float64Array(candidates.length),
  };
  while (waiting.length > 0) {
    const { at, mass } = mostChancePerMoney(problem, open, waiting);
    const a = waiting[at]!;
    const { removes, onReaching, onRemoving } = problem.actions[a]!;
    let saved = 0;
    for (const c of removes) {
      saved += open[c]! * problem.left[c]!;
      open[c] = 0;
    }
    row.chance[sorted.length] = mass;
    row.reaching[sorted.length] = onReaching;
    row.alone[sorted.length] = onReaching + mass * onRemoving - saved;
    sorted.push(a);
    waiting.splice(at, 1);
  }
  const { inSet, proved } = bestSet(row, tryAllUpTo);
  return { order: sorted.filter((_, i) => inSet[i]), proved };
}

/** Compares p_a / Co_a without dividing: a Co of 0 comes first. Equal ones stay in the order given. */
function mostChancePerMoney(problem: RepairProblem, open: Float64Array, waiting: readonly number[]) {
  let at = 0;
  let mass = -1;
  let money = 0;
  for (let i = 0; i < waiting.length; i += 1) {
    const { removes, onReaching } = problem.actions[waiting[i]!]!;
    let own = 0;
    for (let k = 0; k < removes.length; k += 1) own += open[removes[k]!]!;
    if (mass < 0 || own * money > mass * onReaching) [at, mass, money] = [i, own, onReaching];
  }
  return { at, mass };
}

function greedy(problem: RepairProblem, p: ArrayLike<number>, candidates: readonly number[], tryAllUpTo: number): number[] {
  let kept = candidates;
  for (;;) {
    const { order } = bestAsDivided(problem, p, kept, tryAllUpTo);
    if (order.length === kept.length) return order;
    kept = order;
  }
}

/**
 * Leaves out actions that can't lower the cost wherever they stand. Dropping action a from a sequence saves its Co for
 * all mass that no action removes, and for the mass that a itself would have removed. It costs, for each cause of
 * that mass, at most every other action's Co and the dearer of being left and being removed by another, less Cr_a.
 * Where the saving is at least that, some best plan does without a; then the others are judged without it.
 */
function withoutHopeless(problem: RepairProblem, p: ArrayLike<number>, candidates: readonly number[]): number[] {
  const removers = new Int32Array(p.length);
  let allLooks = 0;
  let dearestFix = 0;
  for (const a of candidates) {
    const { removes, onReaching, onRemoving } = problem.actions[a]!;
    for (const c of removes) removers[c]! += 1;
    allLooks += onReaching;
    dearestFix = Math.max(dearestFix, onRemoving);
  }
  let stays = 0;
  for (let c = 0; c < p.length; c += 1) if (removers[c] === 0) stays += p[c]!;

  const hopeless = (a: number): boolean => {
    const { removes, onReaching, onRemoving } = problem.actions[a]!;
    let loss = 0;
    for (const c of removes) {
      const without = allLooks - onReaching + Math.max(problem.left[c]!, dearestFix);
      loss += p[c]! * Math.max(0, without - onReaching - onRemoving);
    }
    return stays * onReaching >= loss;
  };
  let kept = [...candidates];
  for (let before = Infinity; kept.length < before; ) {
    before = kept.length;
    kept = kept.filter((a) => {
      if (!hopeless(a)) return true;
      const { removes, onReaching } = problem.actions[a]!;
      allLooks -= onReaching;
      for (const c of removes) {
        removers[c]! -= 1;
        if (removers[c] === 0) stays += p[c]!;
      }
      return false;
    });
  }
  return kept;
}

/** Held and Karp over sets of done actions: least cost to go = stop here, or do the best next one. */
function bestOverSets(problem: RepairProblem, p: ArrayLike<number>, candidates: readonly number[]): number[] {
  const size = 1 << candidates.length;
  const removers = new Int32Array(p.length);
  candidates.forEach((a, bit) => {
    for (const c of problem.actions[a]!.removes) removers[c]! |= 1 << bit;
  });
  const remaining = new Float64Array(size);
  const toGo = new Float64Array(size);
  const next = new Int8Array(size).fill(-1);
  for (let done = size - 1; done >= 0; done -= 1) {
    for (let c = 0; c < p.length; c += 1) {
      if ((removers[c]! & done) !== 0) continue;
      remaining[done]! += p[c]!;
      toGo[done]! += p[c]! * problem.left[c]!;
    }
    for (let bit = 0; bit < candidates.length; bit += 1) {
      const then = done | (1 << bit);
      if (then === done) continue;
      const { onReaching, onRemoving } = problem.actions[candidates[bit]!]!;
      const cost = remaining[done]! * onReaching + (remaining[done]! - remaining[then]!) * onRemoving + toGo[then]!;
      if (cost < toGo[done]!) {
        toGo[done] = cost;
        next[done] = bit;
      }
    }
  }
  const order: number[] = [];
  for (let done = 0; next[done]! >= 0; done |= 1 << next[done]!) order.push(candidates[next[done]!]!);
  return order;
}
