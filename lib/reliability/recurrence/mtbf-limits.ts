import { twoSided, type TwoSided } from '../result';
import { incompleteGamma } from '../special/incomplete-gamma';
import { poissonTerm } from '../special/log-gamma';
import { rootBeyond } from '../special/root';
import type { Ending } from './trend';

interface Estimated {
  /** T / (N beta). */
  readonly mtbf: number;
  /** N, 3 or more. */
  readonly failures: number;
  readonly ending: Ending;
  /** Two-sided. */
  readonly confidence: number;
}

/**
 * Exact limits of the mean time between failures at the end of watching.
 *
 * @see L. H. Crow 1982; MIL-HDBK-189 (1981), tables of appendix C
 * @example mtbfLimits({ mtbf: 1, failures: 27, ending: 'time', confidence: 0.9 }) // 0.636 to 1.682
 */
export function mtbfLimits({ mtbf, failures: n, ending, confidence }: Estimated): TwoSided {
  const tail = (1 - confidence) / 2;
  if (ending === 'failure') return twoSided(mtbf / productQuantile(n, 1 - tail), mtbf / productQuantile(n, tail));
  return twoSided((mtbf * n * n) / whereAtMost(n, tail), (mtbf * n * n) / whereAtLeast(n, tail));
}

const logOf = (root: number | undefined, of: number) => Math.exp(root ?? Math.log(of));
const whereAtLeast = (n: number, tail: number) => logOf(rootBeyond((u) => Math.log(tails(n, Math.exp(u)).atLeast / tail), 2 * Math.log(n), -0.5), n * n);
const whereAtMost = (n: number, tail: number) => logOf(rootBeyond((u) => Math.log(tails(n, Math.exp(u)).atMost / tail), 2 * Math.log(n), 0.5), n * n);

/**
 * P(N >= n) and P(N <= n) where P(N = k) goes with w^k / (k! (k - 1)!), k = 1, 2, …: how many failures there are, given how
 * they lie. Summed away from the likeliest, so that no term is above 1.
 */
function tails(n: number, w: number): { atLeast: number; atMost: number } {
  const mode = Math.max(1, Math.floor(Math.sqrt(w)));
  let [atLeast, atMost, all] = [0, 0, 0];
  const add = (k: number, term: number) => {
    all += term;
    if (k >= n) atLeast += term;
    if (k <= n) atMost += term;
  };
  let term = 1;
  for (let k = mode; term > 1e-20 || k <= n; k += 1) {
    add(k, term);
    term *= w / (k * (k + 1));
  }
  term = 1;
  for (let k = mode; k > 1 && (term > 1e-20 || k >= n); k -= 1) {
    term *= (k * (k - 1)) / w;
    add(k - 1, term);
  }
  return { atLeast: atLeast / all, atMost: atMost / all };
}

/** Quantile of X Y / N^2, where X and Y are gamma of shapes N - 1 and N: a product of two chi-squared over 4 N^2. */
function productQuantile(n: number, below: number): number {
  // The logarithm of X has a density that falls away so fast that equal steps sum it to the last digit.
  const deviation = 1 / Math.sqrt(n - 1);
  const step = deviation / 16;
  const nodes: { at: number; weight: number }[] = [];
  for (let u = Math.log(n - 1) - 26 * deviation; u < Math.log(n - 1) + 12 * deviation; u += step) {
    const x = Math.exp(u);
    // The density of ln X at u: x^(n - 1) e^-x / G(n - 1).
    nodes.push({ at: x, weight: poissonTerm(n - 1, x) * (n - 1) * step });
  }
  const aim = (u: number) => {
    const w = Math.exp(u) * n * n;
    return nodes.reduce((sum, { at, weight }) => (weight > 1e-18 ? sum + weight * incompleteGamma(n, w / at).lower : sum), 0) - below;
  };
  return Math.exp(rootBeyond(aim, 0, aim(0) < 0 ? 0.2 : -0.2) ?? 0);
}
