import { notEstimable, twoSided, type NotEstimable, type TwoSided } from '../result';
import { requireShare } from '../require';
import { chiSquaredQuantile } from '../special/gamma-quantile';
import { requireHistories } from './history';
import { mtbfLimits } from './mtbf-limits';
import type { Ending } from './trend';

/** M(t) = lambda t^beta of one unit. */
export interface CrowAmsaa {
  readonly kind: 'estimated';
  readonly failures: number;
  /** beta: above 1 failures come faster and faster. */
  readonly shape: number;
  readonly unbiasedShape: number;
  readonly shapeLimits: TwoSided;
  /** lambda. */
  readonly rate: number;
  /** lambda^(-1 / beta): the age of the first failure to be expected. */
  readonly scale: number;
  /** At the end. */
  readonly intensity: number;
  /** 1 / intensity: mean time between failures at the end. */
  readonly mtbf: number;
  readonly mtbfLimits: TwoSided;
  readonly fit: { readonly statistic: number; readonly of: number; readonly rejectedAt5Percent: boolean };
}

/** Three failures are the least that say anything of a shape and how far it can be off. */
const LEAST_EVENTS = 3;
/** Cramér and von Mises's statistic is above it once in 20 when the law holds, whatever the count (from memory). */
const CRITICAL_5_PERCENT = 0.22;

export type CrowWhy = 'no-failures' | 'too-few-failures' | 'failure-at-age-zero' | 'failures-at-the-end';

interface Watched {
  readonly until: number;
  readonly events: readonly number[];
  /** `failure`: watching ended with the last event, and `until` is its age. */
  readonly ending?: Ending;
  readonly confidence?: number;
}

/**
 * The power-law process of one repaired unit that was watched from new.
 *
 * Ended by time: beta = N / sum ln(T / t). Ended by failure: the sum is over all but the last, and T is its age.
 *
 * @param confidence of the limits, two-sided
 * @returns not estimable below three failures; without any, `poissonRate` gives what may still be said
 * @throws RangeError for illegal data
 * @see L. H. Crow 1974; MIL-HDBK-189 (1981) appendix C; IEC 61164, IEC 61710
 * @example crowAmsaa({ until: 300, events }) // shape 0.716, mtbf 15.5
 */
export function crowAmsaa({ until: end, events, ending = 'time', confidence = 0.95 }: Watched): CrowAmsaa | NotEstimable<CrowWhy> {
  requireHistories([{ until: end, events }]);
  requireShare(confidence, 'A confidence');
  const ages = events.toSorted((a, b) => a - b);
  const n = ages.length;
  if (n === 0) return notEstimable('no-failures');
  if (n < LEAST_EVENTS) return notEstimable('too-few-failures');
  if (ages[0] === 0) return notEstimable('failure-at-age-zero');
  const until = ending === 'failure' ? (ages.at(-1) ?? end) : end;
  const telling = ending === 'failure' ? ages.slice(0, -1) : ages;
  const logs = telling.reduce((sum, age) => sum + Math.log(until) - Math.log(age), 0);
  if (logs === 0) return notEstimable('failures-at-the-end');

  const shape = n / logs;
  const unbiasedShape = ((telling.length - 1) / n) * shape;
  const tail = (1 - confidence) / 2;
  const degrees = 2 * telling.length;
  const rate = n / until ** shape;
  const mtbf = until / (n * shape);
  if (!(rate > 0 && rate < Infinity)) return notEstimable('failures-at-the-end');
  return {
    kind: 'estimated',
    failures: n,
    shape,
    unbiasedShape,
    shapeLimits: twoSided(
      (shape * chiSquaredQuantile(degrees, { below: tail })) / (2 * n),
      (shape * chiSquaredQuantile(degrees, { above: tail })) / (2 * n),
    ),
    rate,
    scale: until / n ** (1 / shape),
    intensity: 1 / mtbf,
    mtbf,
    mtbfLimits: mtbfLimits({ mtbf, failures: n, ending, confidence }),
    fit: fitOf(telling, until, unbiasedShape),
  };
}

/** How far the failures lie from where a power law would have them. */
function fitOf(ages: readonly number[], until: number, unbiasedShape: number): CrowAmsaa['fit'] {
  const m = ages.length;
  const statistic = ages.reduce((sum, age, i) => sum + ((age / until) ** unbiasedShape - (2 * i + 1) / (2 * m)) ** 2, 1 / (12 * m));
  return { statistic, of: m, rejectedAt5Percent: statistic > CRITICAL_5_PERCENT };
}
