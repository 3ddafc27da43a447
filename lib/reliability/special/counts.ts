import { requireAmount, requireCount, requirePositive, requireShare } from '../require';
import { incompleteBeta } from './incomplete-beta';
import { incompleteGamma } from './incomplete-gamma';
import { binomialTerm, poissonTerm } from './log-gamma';
import { leastCount } from './root';

/** So much may a sum of probabilities miss a quantile's by rounding alone. */
const ROUNDING = 1 - 64 * Number.EPSILON;

/** P(X = count). @example poissonProbability(0, 2) // exp(-2) */
export function poissonProbability(count: number, mean: number): number {
  requireCount(count);
  requireAmount(mean, 'A mean');
  return poissonTerm(count, mean);
}

/** P(X <= count) of a Poisson distribution. @example poissonAtMost(1, 2) // 3 exp(-2) */
export function poissonAtMost(count: number, mean: number): number {
  requireAmount(mean, 'A mean');
  return count < 0 ? 0 : incompleteGamma(count + 1, mean).upper;
}

/** P(X >= count) of a Poisson distribution. @example poissonAtLeast(1, 2) // 1 - exp(-2) */
export function poissonAtLeast(count: number, mean: number): number {
  requireCount(count);
  requireAmount(mean, 'A mean');
  return count === 0 ? 1 : incompleteGamma(count, mean).lower;
}

/**
 * The least count with at least this probability at or below it.
 *
 * @throws RangeError
 * @example poissonQuantile(0.999, 2.2455) // 8
 */
export function poissonQuantile(below: number, mean: number): number {
  requireShare(below, 'A probability');
  return leastCount((count) => poissonAtMost(count, mean) >= below * ROUNDING);
}

/** A count whose Poisson mean varies as a gamma distribution of this shape. */
export interface NegativeBinomial {
  readonly shape: number;
  readonly mean: number;
}

function share({ shape, mean }: NegativeBinomial): readonly [over: number, rest: number] {
  requirePositive(shape, 'A shape');
  requireAmount(mean, 'A mean');
  return [mean / (shape + mean), shape / (shape + mean)];
}

/** P(X >= count). @example negativeBinomialAtLeast(1, { shape: 1, mean: 1 }) // 0.5 */
export function negativeBinomialAtLeast(count: number, law: NegativeBinomial): number {
  requireCount(count);
  const [over, rest] = share(law);
  return count === 0 ? 1 : incompleteBeta(count, law.shape, over, rest).lower;
}

/** The least count with at least this probability at or below it. */
export function negativeBinomialQuantile(below: number, law: NegativeBinomial): number {
  requireShare(below, 'A probability');
  const [over, rest] = share(law);
  return leastCount((count) => incompleteBeta(count + 1, law.shape, over, rest).upper >= below * ROUNDING);
}

/** How many of `drawn` out of `marked + unmarked` are marked. */
export interface Urn {
  readonly marked: number;
  readonly unmarked: number;
  readonly drawn: number;
}

/**
 * P(X = count) of a hypergeometric distribution, as three binomial terms, which stay exact for large counts.
 *
 * @see C. Loader 2000
 * @example hypergeometricProbability(1, { marked: 1, unmarked: 1, drawn: 1 }) // 0.5
 */
export function hypergeometricProbability(count: number, { marked, unmarked, drawn }: Urn): number {
  const all = marked + unmarked;
  if (count < 0 || count > marked || drawn - count < 0 || drawn - count > unmarked) return 0;
  if (drawn === 0 || drawn === all) return 1;
  const [p, q] = [drawn / all, (all - drawn) / all];
  return (binomialTerm(count, marked, p, q) * binomialTerm(drawn - count, unmarked, p, q)) / binomialTerm(drawn, all, p, q);
}
