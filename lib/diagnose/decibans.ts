/** Nats in a deciban: ln(10) / 10. */
export const NATS_PER_DECIBAN = Math.LN10 / 10;

/**
 * Turns a weight of evidence from decibans into nats.
 *
 * Source: I. J. Good, Probability and the Weighing of Evidence (1950): a deciban is 10 log10 of a ratio.
 *
 * @param decibans 10 log10 of a likelihood ratio
 * @returns the natural logarithm of the same ratio
 * @example natsOf(10) // 2.302585..., a ratio of ten
 */
export function natsOf(decibans: number): number {
  return decibans * NATS_PER_DECIBAN;
}

/**
 * Turns a weight of evidence from nats into decibans.
 *
 * @param nats natural logarithm of a likelihood ratio
 * @returns 10 log10 of the same ratio
 * @example decibansOf(1) // 4.342945...
 */
export function decibansOf(nats: number): number {
  return nats / NATS_PER_DECIBAN;
}
