import { sumOf } from './sum';

/**
 * The weight of evidence of one finding for one cause, when the finding is not one sure state: it is split over the
 * bands of a measured value, or only thought so, or both.
 *
 *     W = ln( r * sum_v s_v e^{w_v} + 1 - r )
 *
 * Everything is scaled by the largest exponent first, so that weights of thousands of nats neither overflow nor
 * vanish. One state at reliability 1 gives its weight exactly, bit for bit.
 *
 * Source: virtual evidence, Pearl, Probabilistic Reasoning in Intelligent Systems (1988), section 2.2.2.
 *
 * @param nats w_v of each state that has a share, nats
 * @param shares s_v of the same states, (0, 1], summing to 1
 * @param reliability r: 1 for sure, (0, 1] for "think so"
 * @returns W in nats
 * @example evidenceNats([Math.LN2], [1], 0.8) // ln(0.8 * 2 + 0.2) = 0.587786...
 */
export function evidenceNats(nats: readonly number[], shares: readonly number[], reliability: number): number {
  const [first = 0] = nats;
  if (reliability === 1 && nats.length === 1) return first;
  if (nats.every((weight) => weight === 0)) return 0;
  const top = Math.max(...nats, reliability < 1 ? 0 : -Infinity);
  const parts = nats.map((weight, state) => reliability * (shares[state] ?? 0) * Math.exp(weight - top));
  if (reliability < 1) parts.push((1 - reliability) * Math.exp(-top));
  return top + Math.log(sumOf(parts));
}
