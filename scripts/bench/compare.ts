/**
 * How fast A is beside B, measured so that a busy machine can't decide it: A and B take turns in one run, and what is
 * judged is the median of the ratios of neighbours, with a bootstrap interval. Times are printed, never asserted.
 */
import { median, quantile } from 'simple-statistics';
import { seededRandom } from '@/tests/support/random';

export interface Ratio {
  median: number;
  /** 95 % bootstrap interval of the median. */
  low: number;
  high: number;
}

export interface Comparison {
  a: { p50: number; p95: number };
  b: { p50: number; p95: number };
  /** a / b, pair by pair. */
  ratio: Ratio;
  /** p95 of a over p95 of b, by resampling pairs. */
  ratioP95: Ratio;
  pairs: number;
}

const RESAMPLES = 2000;
const SEED = 20_261_201;

interface Turns {
  pairs?: number;
  warmUp?: number;
}

/** Takes turns: a then b, b then a, so that neither always comes second. */
export function compare({ a, b }: { a: () => unknown; b: () => unknown }, turns: Turns = {}): Promise<Comparison> {
  return compareMeasured({ a: () => timed(a), b: () => timed(b) }, turns);
}

/** The same where each turn says by itself how long it took, in ms, or how much of something else. */
export async function compareMeasured(
  { a, b }: { a: () => Promise<number>; b: () => Promise<number> },
  { pairs = 40, warmUp = 5 }: Turns = {},
): Promise<Comparison> {
  const times: [number, number][] = [];
  for (let pair = -warmUp; pair < pairs; pair += 1) {
    const [first, second] = pair % 2 === 0 ? [a, b] : [b, a];
    const [one, two] = [await first(), await second()];
    if (pair >= 0) times.push(pair % 2 === 0 ? [one, two] : [two, one]);
  }
  const [as, bs] = [times.map(([time]) => time), times.map(([, time]) => time)];
  return {
    a: { p50: median(as), p95: quantile(as, 0.95) },
    b: { p50: median(bs), p95: quantile(bs, 0.95) },
    ratio: bootstrap(times, (sample) => median(sample.map(([x, y]) => x / y))),
    ratioP95: bootstrap(times, (sample) => quantile(sample.map(([x]) => x), 0.95) / quantile(sample.map(([, y]) => y), 0.95)),
    pairs,
  };
}

async function timed(work: () => unknown): Promise<number> {
  const started = performance.now();
  await work();
  return performance.now() - started;
}

function bootstrap(times: readonly [number, number][], statistic: (sample: readonly [number, number][]) => number): Ratio {
  const random = seededRandom(SEED);
  const draws = Array.from({ length: RESAMPLES }, () => statistic(times.map(() => random.pick(times))));
  return { median: statistic(times), low: quantile(draws, 0.025), high: quantile(draws, 0.975) };
}
