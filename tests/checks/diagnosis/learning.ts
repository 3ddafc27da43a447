import { believed, meanShares, weightBelief } from '@/lib/rulebook/learning/dirichlet';
import { likelihoodRatio, shareInterval, unseenShare } from '@/lib/rulebook/learning/small-laws';
import type { Proofs } from '../../support/outside-values';

/** Half a case for each answer: m is half the number of answers, shared evenly. */
const halfEach = (counts: number[], answer: number): number =>
  meanShares(believed(counts, counts.map(() => 1 / counts.length), counts.length / 2))[answer] ?? NaN;

/** Serum ferritin: with the disease 731 positive and 78 negative, without it 270 and 1500. */
const ferritin = likelihoodRatio({ with: { given: 731, not: 78 }, without: { given: 270, not: 1500 } });

/** Ten cases, seven of them yes, after a flat belief worth two. */
const flat = believed([7, 3], [0.5, 0.5], 2);
const yes = { alpha: flat.alphas[0] ?? NaN, total: flat.total };

/** Forty cases of which three causes were seen once: 37 of one cause and one each of three. */
const forty = [...Array<string>(37).fill('common'), 'rare-1', 'rare-2', 'rare-3'];

const weight = weightBelief({ alpha: 8, total: 12 }, { alpha: 3, total: 22 });

export const learning: Proofs = {
  // Play-tennis: 9 yes, 5 no; outlook with yes 2 sunny, 4 overcast, 3 rainy; with no 3, 0, 2.
  T11: () => halfEach([9, 5], 0),
  T12: () => halfEach([2, 4, 3], 0),
  T13: () => halfEach([3, 0, 2], 1),
  C01: () => meanShares(flat)[0] ?? NaN,
  C03: () => shareInterval(yes).high,
  C04: () => ferritin?.standardErrorNats ?? NaN,
  C05: () => ferritin?.interval.low ?? NaN,
  C07: () => unseenShare(forty) ?? NaN,
  C08: () => weight.mean,
  C09: () => weight.standardDeviation,
};
