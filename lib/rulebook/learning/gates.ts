import { normalTails } from '@/lib/reliability/special/normal';
import type { PairedDifference } from '../back-test/tally';
import type { LearnedWeight } from './learn-weights';

/** Why a learned weight is not proposed. */
export type HeldBack = 'too-few-cases' | 'may-be-no-change' | 'too-uncertain' | 'too-large-a-step' | 'predicts-no-better';

/** From what on a change is proposed. */
export const GATES = {
  /** Proved cases of the cause in which the check was answered. */
  cases: 5,
  /** A change smaller than this, decibans, is none. */
  change: 1,
  /** Least chance that it is one. */
  chance: 0.9,
  /** Half the width of the 95 % interval, decibans, at most. */
  halfWidth: 3,
  /** The step from the weight as it is, decibans, at most: what is further off wants a person's thought first. */
  step: 6,
} as const;

/** What each gate says to an engineer. */
export const HELD_BACK_WORDS: Readonly<Record<HeldBack, string>> = {
  'too-few-cases': `fewer than ${GATES.cases} proved cases of this cause answered the check`,
  'may-be-no-change': `the chance that the weight is off by more than ${GATES.change} dB is below ${100 * GATES.chance} %`,
  'too-uncertain': `the cases leave the weight open by more than ${GATES.halfWidth} dB either way`,
  'too-large-a-step': `it would move by more than ${GATES.step} dB at once: look at the rule, and at the cases, first`,
  'predicts-no-better': 'cases left out one at a time are not predicted better by a standard error',
};

/**
 * P(|w - w_now| > 1 dB), by the normal approximation of the belief about the weight.
 *
 * @example chanceOfChange({ now: 0, mean: 0, standardDeviation: 0.1 }) // 0
 */
export function chanceOfChange({ now, mean, standardDeviation }: Pick<LearnedWeight, 'now' | 'mean' | 'standardDeviation'>): number {
  const off = mean - now;
  return normalTails((GATES.change - off) / standardDeviation).upper + normalTails((-GATES.change - off) / standardDeviation).lower;
}

/**
 * All gates that a learned weight does not pass.
 *
 * @param weight from `learnWeights`
 * @param logLoss leave-one-out log loss with the learned weight less without it
 * @returns reasons, empty when it may be proposed
 */
export function heldBackBy(weight: LearnedWeight, logLoss: PairedDifference): HeldBack[] {
  const { counts, interval, learned, now } = weight;
  const reasons: [HeldBack, boolean][] = [
    ['too-few-cases', counts.of < GATES.cases],
    ['may-be-no-change', chanceOfChange(weight) < GATES.chance],
    ['too-uncertain', interval.high - interval.low > 2 * GATES.halfWidth],
    ['too-large-a-step', Math.abs(learned - now) > GATES.step],
    ['predicts-no-better', !(logLoss.mean < 0 && -logLoss.mean >= logLoss.standardError)],
  ];
  return reasons.flatMap(([reason, held]) => (held ? [reason] : []));
}
