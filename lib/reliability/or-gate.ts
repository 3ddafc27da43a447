/**
 * The probability that at least one of several independent things happens: 1 - product of (1 - p).
 *
 * @throws RangeError when one is no probability
 * @see IEC 61025, fault tree analysis
 * @example orGate([0.1, 0.2]) // 0.28
 */
export function orGate(probabilities: readonly number[]): number {
  if (!probabilities.every((p) => p >= 0 && p <= 1)) throw new RangeError('A probability is from 0 to 1.');
  return 1 - probabilities.reduce((none, p) => none * (1 - p), 1);
}
