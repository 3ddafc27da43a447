/**
 * Which of a row of actions are worth doing, when every cause is removed by one of them at most.
 *
 * In any set the order by p_i / Co_i, descending, is best (Kadane and Simon 1977), which leaves the set S:
 *
 *   f(S) = const + sum_{i in S} a_i - sum_{i in S} Co_i sum_{j in S, before i} p_j,   a_i = Co_i + p_i Cr_i - p_i left_i
 *
 * The pair terms are all negative: f is submodular, so an action pays the more, the more others are done. One that
 * doesn't pay even beside all that may still be done is in no best set; one that pays beside only those that are
 * surely done is in every best set. Repeating both settles nearly all of them, exactly and in no time; the few
 * that stay open are tried in every combination.
 */

/** Actions in the order in which they would be done, side by side. */
export interface Row {
  /** p_i. */
  chance: Float64Array;
  /** Co_i. */
  reaching: Float64Array;
  /** a_i: what the action adds to the cost when it is the only one. */
  alone: Float64Array;
}

const OPEN = 0;
const IN = 1;
const OUT = 2;

/**
 * The best set.
 *
 * @param row actions sorted by chance / reaching, descending
 * @param tryAllUpTo how many open actions are tried in every combination; above it the better of all and none of them
 * @returns which actions are in the set, and whether it is proved best
 */
export function bestSet(row: Row, tryAllUpTo: number): { inSet: boolean[]; proved: boolean } {
  const verdict = settleByMargins(row);
  const open: number[] = [];
  verdict.forEach((v, i) => v === OPEN && open.push(i));
  const setWith = (chosen: (bit: number) => boolean): boolean[] => {
    const inSet = Array.from(verdict, (v) => v === IN);
    open.forEach((i, bit) => (inSet[i] = chosen(bit)));
    return inSet;
  };
  const proved = open.length <= tryAllUpTo;
  let best = setWith(() => false);
  if (open.length === 0) return { inSet: best, proved };
  let least = addedCost(row, best);
  const compare = (set: boolean[]): void => {
    const cost = addedCost(row, set);
    if (cost < least) [best, least] = [set, cost];
  };
  if (!proved) compare(setWith(() => true));
  else for (let bits = 1; bits < 2 ** open.length; bits += 1) compare(setWith((bit) => ((bits >> bit) & 1) === 1));
  return { inSet: best, proved };
}

/** Sweeps until nothing changes: out what doesn't pay beside all that may be done, in what pays beside the surely done. */
function settleByMargins({ chance, reaching, alone }: Row): Uint8Array {
  const verdict = new Uint8Array(chance.length);
  for (let changed = true; changed; ) {
    changed = false;
    let laterMaybe = 0;
    let laterSure = 0;
    for (let i = 0; i < verdict.length; i += 1) {
      if (verdict[i] !== OUT) laterMaybe += reaching[i]!;
      if (verdict[i] === IN) laterSure += reaching[i]!;
    }
    let earlierMaybe = 0;
    let earlierSure = 0;
    for (let i = 0; i < verdict.length; i += 1) {
      if (verdict[i] !== OUT) laterMaybe -= reaching[i]!;
      if (verdict[i] === IN) laterSure -= reaching[i]!;
      if (verdict[i] === OPEN) {
        if (alone[i]! - reaching[i]! * earlierMaybe - chance[i]! * laterMaybe >= 0) verdict[i] = OUT;
        else if (alone[i]! - reaching[i]! * earlierSure - chance[i]! * laterSure < 0) verdict[i] = IN;
        if (verdict[i] !== OPEN) changed = true;
      }
      if (verdict[i] !== OUT) earlierMaybe += chance[i]!;
      if (verdict[i] === IN) earlierSure += chance[i]!;
    }
  }
  return verdict;
}

/** f(S) less its constant. */
function addedCost({ chance, reaching, alone }: Row, inSet: readonly boolean[]): number {
  let cost = 0;
  let earlier = 0;
  inSet.forEach((is, i) => {
    if (!is) return;
    cost += alone[i]! - reaching[i]! * earlier;
    earlier += chance[i]!;
  });
  return cost;
}
