import { notEstimable, twoSided, type Limits, type NotEstimable } from '../result';
import { requireCount, requireShare } from '../require';
import { hypergeometricProbability } from '../special/counts';
import { rootBetween } from '../special/root';

/** Two by two: rows are groups, columns whether it happened. */
export type TwoByTwo = readonly [readonly [number, number], readonly [number, number]];

export interface Fisher {
  readonly kind: 'estimated';
  readonly twoSidedP: number;
  /** Of so few or fewer in the first cell, and so many or more. */
  readonly lessP: number;
  readonly greaterP: number;
  /** ad / bc; undefined when that has no end. */
  readonly sampleOddsRatio: number | undefined;
  /** Likeliest given the margins; undefined when it has no end. */
  readonly oddsRatio: number | undefined;
  readonly limits: Limits<never>;
}

const AS_LIKELY = 1 + 1e-7;
/** On the logarithm of an odds ratio: beyond it nothing is met in practice. */
const FAR = 60;

/**
 * Fisher's exact test, and the odds ratio given the margins with its exact limits.
 *
 * @returns not estimable when a row or column is empty: the margins then leave one table alone
 * @throws RangeError for what is no count
 * @see R. A. Fisher, Statistical Methods for Research Workers
 * @example fisher([[2, 15], [10, 3]]).twoSidedP // 0.000537
 */
export function fisher([[a, b], [c, d]]: TwoByTwo, { confidence = 0.95 } = {}): Fisher | NotEstimable<'empty-margin'> {
  for (const count of [a, b, c, d]) requireCount(count);
  requireShare(confidence, 'A confidence');
  const [marked, unmarked, drawn] = [a + b, c + d, a + c];
  if (marked === 0 || unmarked === 0 || drawn === 0 || b + d === 0) return notEstimable('empty-margin');
  const [least, most] = [Math.max(0, drawn - unmarked), Math.min(marked, drawn)];
  const support = Array.from({ length: most - least + 1 }, (_, i) => least + i);
  const logs = support.map((k) => Math.log(hypergeometricProbability(k, { marked, unmarked, drawn })));

  /** Sums over the tables with these margins, each weighted by odds^k. */
  const over = (logOdds: number, of: (k: number) => number) => {
    const weights = logs.map((log, i) => log + logOdds * (support[i] ?? 0));
    const top = weights.reduce((highest, weight) => Math.max(highest, weight), -Infinity);
    let [sum, all] = [0, 0];
    for (const [i, k] of support.entries()) {
      const weight = Math.exp((weights[i] ?? -Infinity) - top);
      all += weight;
      sum += weight * of(k);
    }
    return sum / all;
  };
  const atMost = (logOdds: number) => over(logOdds, (k) => (k <= a ? 1 : 0));
  const atLeast = (logOdds: number) => over(logOdds, (k) => (k >= a ? 1 : 0));
  const seen = (logs[a - least] ?? 0) + Math.log(AS_LIKELY);
  const tail = (1 - confidence) / 2;
  const root = (f: (logOdds: number) => number) => {
    const logOdds = rootBetween(f, -FAR, FAR);
    return logOdds === undefined ? undefined : Math.exp(logOdds);
  };
  const lower = a === least ? 0 : root((odds) => atLeast(odds) - tail);
  const upper = a === most ? undefined : root((odds) => atMost(odds) - tail);
  return {
    kind: 'estimated',
    twoSidedP: Math.min(1, over(0, (k) => ((logs[k - least] ?? 0) <= seen ? 1 : 0))),
    lessP: atMost(0),
    greaterP: atLeast(0),
    sampleOddsRatio: b * c === 0 ? undefined : (a * d) / (b * c),
    oddsRatio: a === least ? 0 : a === most ? undefined : root((odds) => over(odds, (k) => k) - a),
    limits: upper === undefined ? { kind: 'at-least', lower: lower ?? 0 } : twoSided(lower ?? 0, upper),
  };
}
