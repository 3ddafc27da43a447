/**
 * Turns scores in nats into probabilities, exp(S - m - ln sum exp(S - m)) with m the largest, so that scores of
 * thousands of nats do not overflow.
 *
 * @param scores S_c, nats; at least one of them finite
 * @returns p_c in the same order; they sum to 1
 * @example posteriorOf(Float64Array.of(0, Math.log(3))) // [0.25, 0.75]
 */
export function posteriorOf(scores: Float64Array): Float64Array {
  const top = scores.reduce((a, b) => Math.max(a, b), -Infinity);
  const logSum = Math.log(scores.reduce((sum, score) => sum + Math.exp(score - top), 0));
  return scores.map((score) => Math.exp(score - top - logSum));
}
