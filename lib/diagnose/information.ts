/**
 * How much an answer would tell. Everything is in bits and rests on likelihoods L[v][c] = P(answer v | cause c) that
 * sum to 1 over v for every cause: that is what keeps the forecast coherent (sum_v P_v p^(v) = p).
 */

/** What asking one check (or two at once) would bring, before anybody has answered. */
export interface Forecast {
  /** P_v, chance of each answer; sums to 1. */
  chances: Float64Array;
  /** p^(v), the causes' probabilities after each answer; each sums to 1. */
  posteriors: Float64Array[];
  /** Expected information, bits: never negative, never above the entropy of p. */
  bits: number;
}

const logSumExp = (values: ArrayLike<number>): number => {
  let max = -Infinity;
  for (let i = 0; i < values.length; i += 1) max = Math.max(max, values[i]!);
  if (max === -Infinity) return -Infinity;
  let sum = 0;
  for (let i = 0; i < values.length; i += 1) sum += Math.exp(values[i]! - max);
  return max + Math.log(sum);
};

/**
 * Entropy: how many bits are missing to certainty.
 *
 * @param p probabilities that sum to 1; zeros add nothing
 * @returns bits, in [0, log2(p.length)]
 * @see Shannon (1948); worked values in Cover and Thomas, Elements of Information Theory, chapter 2
 * @example entropyBits([0.5, 0.25, 0.125, 0.125]); // 1.75
 */
export function entropyBits(p: ArrayLike<number>): number {
  let bits = 0;
  for (let c = 0; c < p.length; c += 1) if (p[c]! > 0) bits -= p[c]! * Math.log2(p[c]!);
  return Math.max(0, bits);
}

/**
 * Relative entropy D(p || q): how many bits p is away from q.
 *
 * @param p probabilities that sum to 1
 * @param q probabilities that sum to 1, of the same length
 * @returns bits, 0 or more; Infinity where q rules out what p allows
 * @see Kullback and Leibler (1951)
 * @example divergenceBits([0.5, 0.5], [0.75, 0.25]); // 0.2075
 */
export function divergenceBits(p: ArrayLike<number>, q: ArrayLike<number>): number {
  let bits = 0;
  for (let c = 0; c < p.length; c += 1) if (p[c]! > 0) bits += p[c]! * Math.log2(p[c]! / q[c]!);
  return Math.max(0, bits);
}

/**
 * Likelihoods from background rates and score changes: L_cv = b_v e^{W_cv} / sum_u b_u e^{W_cu}. Dividing by the sum
 * matters: attenuation inside an evidence group takes b e^W off 1, and a forecast must count every answer once.
 *
 * @param background b_v by answer, each above 0, summing to 1
 * @param logWeights W by answer, then by cause, nats; +-2000 does not overflow
 * @returns L by answer, then by cause
 * @example likelihoods([0.2, 0.8], [Float64Array.of(Math.log(4)), Float64Array.of(Math.log(0.25))]); // [[0.8], [0.2]]
 */
export function likelihoods(background: readonly number[], logWeights: readonly ArrayLike<number>[]): Float64Array[] {
  const causes = logWeights[0]?.length ?? 0;
  const table = background.map(() => new Float64Array(causes));
  const logBackground = background.map(Math.log);
  const column = new Float64Array(background.length);
  for (let c = 0; c < causes; c += 1) {
    for (let v = 0; v < column.length; v += 1) column[v] = logBackground[v]! + logWeights[v]![c]!;
    const total = logSumExp(column);
    for (let v = 0; v < column.length; v += 1) table[v]![c] = Math.exp(column[v]! - total);
  }
  return table;
}

/**
 * What asking would bring: P_v = sum_c p_c L_cv, p^(v)_c = p_c L_cv / P_v and I = sum_v P_v D(p^(v) || p), which is
 * sum_c p_c sum_v L_cv log2(L_cv / P_v).
 *
 * @param p causes' probabilities now, summing to 1
 * @param table L by answer, then by cause, from {@link likelihoods}
 * @returns chances, posteriors and bits; an answer of chance 0 leaves p as it is
 * @see Lindley (1956), On a measure of the information provided by an experiment
 * @example forecast([0.5, 0.5], [[1, 0], [0, 1]]).bits; // 1
 */
export function forecast(p: ArrayLike<number>, table: readonly ArrayLike<number>[]): Forecast {
  const chances = new Float64Array(table.length);
  let bits = 0;
  const posteriors = table.map((row, v) => {
    const posterior = new Float64Array(p.length);
    let chance = 0;
    for (let c = 0; c < posterior.length; c += 1) chance += posterior[c] = p[c]! * row[c]!;
    chances[v] = chance;
    if (chance === 0) return new Float64Array(p);
    for (let c = 0; c < posterior.length; c += 1) posterior[c]! /= chance;
    bits += chance * divergenceBits(posterior, p);
    return posterior;
  });
  return { chances, posteriors, bits };
}

/** How much a check settles, in the words that stand beside its minutes. */
export type Settles = 'settles most' | 'settles some' | 'settles little';

/** Shares of what is left to know at which the word changes; and the bits under which nothing much is left. */
export const SETTLES_MOST = 0.5;
export const SETTLES_SOME = 0.05;
export const NOTHING_MUCH_LEFT_BITS = 0.5;

/**
 * The word for an expected gain, measured against what is left to know: 0.5 bit settles little of a case that is wide
 * open at 4.5 bits and most of one that stands between two causes. Half or more of what is left is "most", a twentieth
 * or more is "some". What is left counts as half a bit at least, so that a case as good as settled (one cause at
 * 0.9) doesn't call its last crumbs "most". The thresholds are judgement.
 *
 * @param bits expected information of the check
 * @param entropyLeft entropy of the causes now, bits
 * @example settles(0.6, 1); // 'settles most'
 */
export function settles(bits: number, entropyLeft: number): Settles {
  const share = bits / Math.max(entropyLeft, NOTHING_MUCH_LEFT_BITS);
  if (share >= SETTLES_MOST) return 'settles most';
  return share >= SETTLES_SOME ? 'settles some' : 'settles little';
}
