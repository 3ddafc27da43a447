import { requireProbability } from '../require';

/**
 * Benjamini and Hochberg's adjusted p-values: q(k) = min over j >= k of p(j) m / j. Rejecting those up to 0.05 leaves, on
 * average, at most one false in twenty.
 *
 * @returns one for each, in the order given
 * @throws RangeError when one is no probability
 * @see Y. Benjamini and Y. Hochberg, J. R. Statist. Soc. B 57, 1995
 * @example falseDiscoveryRates([0.01, 0.04]) // [0.02, 0.04]
 */
export function falseDiscoveryRates(ps: readonly number[]): number[] {
  ps.forEach(requireProbability);
  const order = ps.map((p, i) => ({ p, i })).sort((a, b) => b.p - a.p);
  const adjusted = new Array<number>(ps.length).fill(1);
  let least = 1;
  for (const [place, { p, i }] of order.entries()) {
    least = Math.min(least, (p * ps.length) / (ps.length - place));
    adjusted[i] = least;
  }
  return adjusted;
}
