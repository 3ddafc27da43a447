/** Leaky noisy-OR: several causes, each of which may bring about the same sign by itself. */

/**
 * Chance that a cause, though present, doesn't bring about a sign, the leak taken out: q = min(1, (1 - p) / (1 - leak)).
 * A cause with which the sign is rarer than by itself counts as one that does nothing.
 *
 * @param p P(sign | this cause alone), leak included, [0, 1]
 * @param leak P(sign | none of the causes), [0, 1)
 * @returns q in [0, 1]
 * @example inhibition(0.412, 0.02); // 0.6
 */
export function inhibition(p: number, leak: number): number {
  return Math.min(1, (1 - p) / (1 - leak));
}

/**
 * P(sign | all these causes at once) = 1 - (1 - leak) x product of q. The leak is counted once.
 *
 * @param leak P(sign | none of the causes), [0, 1)
 * @param inhibitions q of each cause that is present, from {@link inhibition}
 * @returns probability
 * @see Pearl (1988), section 4.3.2; worked values in Russell and Norvig, Artificial Intelligence, chapter on Bayesian
 * networks (fever of cold, flu and malaria)
 * @example noisyOr(0, [0.6, 0.2]); // 0.88
 */
export function noisyOr(leak: number, inhibitions: readonly number[]): number {
  return 1 - inhibitions.reduce((absent, q) => absent * q, 1 - leak);
}
