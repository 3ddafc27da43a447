/**
 * The probability of a cause once a sign was seen, by Bayes' rule for one cause against all others.
 *
 * @throws RangeError when one is no probability, or the sign could not be seen at all
 * @example bayesUpdate({ prior: 0.2, ifSo: 0.8, ifNot: 0.1 }) // 0.667
 */
export function bayesUpdate({ prior, ifSo, ifNot }: { prior: number; ifSo: number; ifNot: number }): number {
  if (![prior, ifSo, ifNot].every((p) => p >= 0 && p <= 1)) throw new RangeError('A probability is from 0 to 1.');
  const seen = prior * ifSo + (1 - prior) * ifNot;
  if (seen === 0) throw new RangeError('A sign that cannot be seen tells nothing.');
  return (prior * ifSo) / seen;
}
