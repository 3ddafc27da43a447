/**
 * Finds which actions are worth doing, and in which order. Two cases:
 *
 * *No cause has two actions.* In any set the order by p_i / Co_i, descending, is best (Kadane and Simon 1977), which
 * leaves the set. With that order the cost of a set is
 *     f(S) = const + sum_{i in S} a_i - sum_{i in S} Co_i sum_{j in S, before i} p_j,   a_i = Co_i + p_i Cr_i - p_i left_i,
 * whose pair terms are all negative: f is submodular, an action pays the more the more others are done. So one that
 * doesn't pay even beside all that may still be done is in no best set, and one that pays beside only those that are
 * surely done is in every best set. Repeating both settles almost every action, exactly; what is left is tried in
 * full up to twelve actions.
 *
 * *Some cause has two actions.* What an action removes then depends on what came before, but only on which actions,
 * not on their order. So the best order is found over sets of actions already done (Held and Karp), 2^n steps
 * instead of n!: exact up to twelve actions. Actions that provably can't pay are left out first.
 *
 * Beyond twelve, greedy: by chance per money, then dropping from the back whatever costs more than it saves.
 */
import { expectedRepairCost, type RepairProblem } from './repair-order-costs';

/** How an order was found: the best of all sets, the best of all sets in all orders, or a good one. */
export type SearchMethod = 'every-set' | 'every-order' | 'greedy';

export interface FoundOrder {
  /** Indices of actions. */
  order: number[];
  method: SearchMethod;
}

/** Actions up to which every set is tried. */
export const TRY_ALL_UP_TO = 12;

const massOf = (problem: RepairProblem, p: ArrayLike<number>, action: number): number =>
  problem.actions[action]!.removes.reduce((mass, c) => mass + p[c]!, 0);

/** True where no cause is removed by two of these actions. */
function disjoint(problem: RepairProblem, actions: readonly number[]): boolean {
  const seen = new Set<number>();
  return actions.every((a) => problem.actions[a]!.removes.every((c) => !seen.has(c) && seen.add(c)));
}

/**
 * The order of repairs of least expected cost.
 *
 * @param problem actions and costs, from `repairProblem`
 * @param p causes' probabilities, summing to 1
 * @param tryAllUpTo actions up to which every set is tried; fewer is quicker, and greedy sooner
 * @returns indices of actions (empty: nothing is worth doing) and how they were found
 * @see Kadane and Simon (1977), Optimal strategies for a class of constrained sequential problems; Held and Karp (1962)
 * @example findOrder(problem, posterior).order;
 */
export function findOrder(problem: RepairProblem, p: ArrayLike<number>, tryAllUpTo = TRY_ALL_UP_TO): FoundOrder {
  const all = problem.actions.map((_, a) => a);
  if (disjoint(problem, all)) return bestSet(problem, p, all, tryAllUpTo);
  const promising = withoutHopeless(problem, p, all);
  if (disjoint(problem, promising)) return bestSet(problem, p, promising, tryAllUpTo);
  return promising.length <= tryAllUpTo
    ? { order: bestOverSets(problem, p, promising), method: 'every-order' }
    : { order: greedy(problem, p, promising), method: 'greedy' };
}

/** p_a / Co_a descending, without dividing by a Co of 0. */
function byChancePerMoney(problem: RepairProblem, mass: ReadonlyMap<number, number>) {
  return (a: number, b: number): number => {
    const ahead = mass.get(b)! * problem.actions[a]!.onReaching - mass.get(a)! * problem.actions[b]!.onReaching;
    return ahead || a - b;
  };
}

function bestSet(problem: RepairProblem, p: ArrayLike<number>, candidates: readonly number[], tryAllUpTo: number): FoundOrder {
  const mass = new Map(candidates.map((a) => [a, massOf(problem, p, a)]));
  const sorted = [...candidates].sort(byChancePerMoney(problem, mass));
  const chance = sorted.map((a) => mass.get(a)!);
  const reaching = sorted.map((a) => problem.actions[a]!.onReaching);
  const alone = sorted.map((a, i) => {
    const { removes, onRemoving } = problem.actions[a]!;
    return reaching[i]! + chance[i]! * onRemoving - removes.reduce((sum, c) => sum + p[c]! * problem.left[c]!, 0);
  });
  /** What adding sorted action i changes, beside the others that `beside` names. */
  const change = (i: number, beside: (k: number) => boolean): number => {
    let before = 0;
    let after = 0;
    for (let k = 0; k < sorted.length; k += 1) {
      if (k === i || !beside(k)) continue;
      if (k < i) before += chance[k]!;
      else after += reaching[k]!;
    }
    return alone[i]! - reaching[i]! * before - chance[i]! * after;
  };

  const verdict: ('in' | 'out' | 'open')[] = sorted.map(() => 'open');
  for (let settled = false; !settled; ) {
    settled = true;
    for (let i = 0; i < sorted.length; i += 1) {
      if (verdict[i] !== 'open') continue;
      if (change(i, (k) => verdict[k] !== 'out') >= 0) verdict[i] = 'out';
      else if (change(i, (k) => verdict[k] === 'in') < 0) verdict[i] = 'in';
      if (verdict[i] !== 'open') settled = false;
    }
  }

  const open = sorted.flatMap((_, i) => (verdict[i] === 'open' ? [i] : []));
  const orderWith = (chosen: (i: number) => boolean): number[] =>
    sorted.filter((_, i) => verdict[i] === 'in' || (verdict[i] === 'open' && chosen(i)));
  if (open.length > tryAllUpTo) return { order: dropFromTheBack(problem, p, orderWith(() => true)), method: 'greedy' };
  const place = new Map(open.map((i, bit) => [i, bit]));
  let best = orderWith(() => false);
  let least = expectedRepairCost(problem, p, best);
  for (let set = 1; set < 1 << open.length; set += 1) {
    const order = orderWith((i) => ((set >> place.get(i)!) & 1) === 1);
    const cost = expectedRepairCost(problem, p, order);
    if (cost < least) [best, least] = [order, cost];
  }
  return { order: best, method: 'every-set' };
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

function greedy(problem: RepairProblem, p: ArrayLike<number>, candidates: readonly number[]): number[] {
  const open = new Float64Array(p);
  const waiting = new Set(candidates);
  const order: number[] = [];
  while (waiting.size > 0) {
    const mass = new Map([...waiting].map((a) => [a, massOf(problem, open, a)]));
    const better = byChancePerMoney(problem, mass);
    const best = [...waiting].reduce((a, b) => (better(a, b) <= 0 ? a : b));
    waiting.delete(best);
    if (mass.get(best) === 0) continue;
    order.push(best);
    for (const c of problem.actions[best]!.removes) open[c] = 0;
  }
  return dropFromTheBack(problem, p, order);
}

/** Drops, the least promising first, what costs more than it saves, until nothing more does. */
function dropFromTheBack(problem: RepairProblem, p: ArrayLike<number>, order: readonly number[]): number[] {
  let best = [...order];
  let least = expectedRepairCost(problem, p, best);
  for (let dropped = true; dropped; ) {
    dropped = false;
    for (let i = best.length - 1; i >= 0; i -= 1) {
      const without = best.filter((_, k) => k !== i);
      const cost = expectedRepairCost(problem, p, without);
      if (cost <= least) {
        [best, least, dropped] = [without, cost, true];
      }
    }
  }
  return best;
}
