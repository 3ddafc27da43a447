/** What the gate says of a unit: fit another compressor, or not yet, and because of what. */
import { strengthOf, type StrengthWord } from '@/lib/diagnose/strength';
import type { RankedCause, Remedy } from '@/lib/diagnose/types';

/** From this share on the compressor itself is likelier than all else together. */
export const FIT_FROM = 0.5;
/** With one other cause as likely as this, a new compressor may well go the way of the old one. Judgement. */
export const OTHER_FROM = 0.25;
/** Less likely causes are no reason to name. Judgement. */
export const NAMED_FROM = 0.1;
/** More than these nobody reads at a counter. */
const MOST_REASONS = 3;

/** An answer of the passage that speaks for a cause. */
export interface Because {
  checkId: string;
  word: StrengthWord;
}

export interface GateReason {
  causeId: string;
  /** Posterior probability. */
  p: number;
  /** Whether another compressor removes it. */
  isOfTheCompressor: boolean;
  /** Strongest first; empty: it stands there for what was known before. */
  because: Because[];
}

export interface GateVerdict {
  verdict: 'fit' | 'not-yet';
  /** Share of the causes that another compressor removes. */
  ofTheCompressor: number;
  /** Those that the verdict rests on, likeliest first; may be none: nothing stands out. */
  reasons: GateReason[];
}

/**
 * The causes that another compressor removes, by the remedies of the rulebook that fit one.
 *
 * @example causesOfTheCompressor(rulebook).has('rings-worn') // true
 */
export const causesOfTheCompressor = ({ remedies }: { remedies: readonly Pick<Remedy, 'causes' | 'fitsCompressor'>[] }): ReadonlySet<string> =>
  new Set(remedies.filter(({ fitsCompressor }) => fitsCompressor).flatMap(({ causes }) => causes));

/**
 * "Fit" when what another compressor removes is at least as likely as all else together, and no single cause outside it has
 * a quarter; "not yet" otherwise. The verdict is advice: nothing is forbidden by it.
 *
 * @param causes ranked, with the answers of the passage
 * @param ofTheCompressor from {@link causesOfTheCompressor}
 * @param answered finding ids of the passage's own answers: no other is given as a reason
 * @example verdictOf(ranking.causes, causesOfTheCompressor(rulebook), new Set()).verdict // 'not-yet'
 */
export function verdictOf(causes: readonly RankedCause[], ofTheCompressor: ReadonlySet<string>, answered: ReadonlySet<string>): GateVerdict {
  const share = causes.reduce((sum, { causeId, p }) => (ofTheCompressor.has(causeId) ? sum + p : sum), 0);
  const others = causes.filter(({ causeId }) => !ofTheCompressor.has(causeId));
  const verdict = share >= FIT_FROM && !others.some(({ p }) => p >= OTHER_FROM) ? 'fit' : 'not-yet';
  const reasons = causes
    .filter(({ causeId, p }) => p >= NAMED_FROM && ofTheCompressor.has(causeId) === (verdict === 'fit'))
    .slice(0, MOST_REASONS)
    .map((cause) => ({ causeId: cause.causeId, p: cause.p, isOfTheCompressor: ofTheCompressor.has(cause.causeId), because: becauseOf(cause, answered) }));
  return { verdict, ofTheCompressor: share, reasons };
}

/** What the passage's answers add for a cause. A rule of several findings counts when all of them were answered in it. */
function becauseOf({ terms }: RankedCause, answered: ReadonlySet<string>): Because[] {
  return terms
    .filter(({ countedNats, findingIds }) => countedNats > 0 && findingIds.every((id) => answered.has(id)))
    .sort((a, b) => b.countedNats - a.countedNats)
    .flatMap(({ checkIds, countedNats }) => {
      const word = strengthOf(countedNats)?.word;
      return word ? checkIds.map((checkId) => ({ checkId, word })) : [];
    })
    .filter(({ checkId }, i, all) => all.findIndex((other) => other.checkId === checkId) === i);
}
