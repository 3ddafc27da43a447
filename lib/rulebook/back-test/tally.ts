/** What proper scores add up from, case by case, so that a few cases can be taken out and put back. */

/** What one case adds. */
export interface CaseScore {
  /** -ln p of the proved cause, nats. */
  logLoss: number;
  /** sum_c (p_c - [c is the truth])^2. */
  brier: number;
  /** How many causes stand above the proved one. */
  ahead: number;
  /** Index of the leading cause. */
  leader: number;
}

/** Means over cases; undefined in all of them would be no cases, which `scoresOf` says by returning undefined. */
export interface Scores {
  cases: number;
  /** Nats. */
  logLoss: number;
  /** Over all causes, [0, 2]. */
  brier: number;
  /** Share of cases whose proved cause led, and was among the first three. */
  top1: number;
  top3: number;
}

/** A difference between two rulebooks over the same cases, new less old, with what chance would do to it. */
export interface PairedDifference {
  mean: number;
  /** Standard error of the mean; 0 with fewer than two cases. */
  standardError: number;
}

/** Scores of one ranked case. */
export function caseScore(scores: ArrayLike<number>, posterior: ArrayLike<number>, truth: number): CaseScore {
  let leader = 0;
  let ahead = 0;
  let squares = 0;
  const own = scores[truth] ?? -Infinity;
  for (let c = 0; c < scores.length; c += 1) {
    const score = scores[c] ?? -Infinity;
    const p = posterior[c] ?? 0;
    if (score > (scores[leader] ?? -Infinity)) leader = c;
    if (score > own || (score === own && c < truth)) ahead += 1;
    squares += (p - (c === truth ? 1 : 0)) ** 2;
  }
  return { logLoss: -Math.log(posterior[truth] ?? 0), brier: squares, ahead, leader };
}

/** Sums that scores are means of. */
export class Tally {
  cases = 0;
  private logLoss = 0;
  private brier = 0;
  private top1 = 0;
  private top3 = 0;

  /** @param times 1 to add a case, -1 to take it out */
  add({ logLoss, brier, ahead }: Pick<CaseScore, 'logLoss' | 'brier' | 'ahead'>, times: 1 | -1 = 1): void {
    this.cases += times;
    this.logLoss += times * logLoss;
    this.brier += times * brier;
    if (ahead < 1) this.top1 += times;
    if (ahead < 3) this.top3 += times;
  }

  copy(): Tally {
    return Object.assign(new Tally(), this);
  }

  /** @returns undefined without cases */
  scores(): Scores | undefined {
    const { cases } = this;
    if (cases === 0) return undefined;
    return { cases, logLoss: this.logLoss / cases, brier: this.brier / cases, top1: this.top1 / cases, top3: this.top3 / cases };
  }
}

/**
 * Mean and standard error of paired differences.
 *
 * @param sum,squares of the differences
 * @param count how many pairs, those without a difference too
 * @example pairedDifference(2, 2, 4) // mean 0.5, standard error 0.289
 */
export function pairedDifference(sum: number, squares: number, count: number): PairedDifference {
  if (count === 0) return { mean: 0, standardError: 0 };
  const mean = sum / count;
  const variance = count < 2 ? 0 : Math.max(0, squares - count * mean * mean) / (count - 1);
  return { mean, standardError: Math.sqrt(variance / count) };
}
