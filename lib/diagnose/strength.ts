import { decibansOf } from './decibans';

export type StrengthWord = 'barely' | 'a little' | 'clearly' | 'strongly' | 'almost by itself';

/** Strength words with their lower edges in decibans, edge included. The product uses no others. */
export const STRENGTHS: readonly { from: number; word: StrengthWord }[] = [
  { from: 20, word: 'almost by itself' },
  { from: 10, word: 'strongly' },
  { from: 5, word: 'clearly' },
  { from: 2, word: 'a little' },
  { from: 0, word: 'barely' },
];

export interface Strength {
  direction: 'for' | 'against';
  word: StrengthWord;
}

/** Ten billionths of a deciban: what turning decibans into nats and back can lose. */
const ROUNDING = 1e-9;

/**
 * Puts a counted weight into words.
 *
 * @param countedNats weight after attenuation and beta, nats
 * @returns whether it speaks for or against, and how much; undefined for a weight of zero
 * @example strengthOf(natsOf(-5)) // { direction: 'against', word: 'clearly' }
 */
export function strengthOf(countedNats: number): Strength | undefined {
  if (countedNats === 0) return undefined;
  const size = Math.abs(decibansOf(countedNats)) + ROUNDING;
  const word = STRENGTHS.find(({ from }) => size >= from)?.word ?? 'barely';
  return { direction: countedNats > 0 ? 'for' : 'against', word };
}
