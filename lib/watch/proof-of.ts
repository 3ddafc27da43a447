import { strengthOf } from '@/lib/diagnose/strength';
import type { EvidenceTerm, Finding } from '@/lib/diagnose/types';

export const OUTCOMES = ['held', 'comeback', 'lost'] as const;
export type Outcome = (typeof OUTCOMES)[number];
export const PROOFS = ['none', 'seen', 'isolated', 'held-with-others'] as const;
export type ProofLevel = (typeof PROOFS)[number];

/**
 * How well a call is proved. What was seen stays seen, whatever came later; a repair that held proves its cause when nothing else
 * was changed, and less when several were.
 */
export function proofOf({ seen, outcome, remediesDone }: { seen: boolean; outcome: Outcome; remediesDone: number }): ProofLevel {
  if (seen) return 'seen';
  if (outcome !== 'held' || remediesDone === 0) return 'none';
  return remediesDone === 1 ? 'isolated' : 'held-with-others';
}

/** No answer of the default rulebook weighs more than "strongly": a rulebook that knows its limits seldom does. */
const SEEN_FROM: readonly string[] = ['strongly', 'almost by itself'];

/**
 * Whether a cause was seen: a single answer that somebody is sure of speaks strongly for it, or more.
 *
 * @param terms of the cause, from its ranking
 * @param findings that were ranked
 */
export function isSeen(terms: readonly EvidenceTerm[], findings: readonly Finding[]): boolean {
  const sure = new Set(findings.filter(({ reliability, shares }) => reliability === 1 && shares.length === 1).map(({ id }) => id));
  return terms.some(({ kind, rules, findingIds, countedNats }) => {
    const strength = strengthOf(countedNats);
    return kind === 'table' && rules.length > 0 && findingIds.every((id) => sure.has(id)) && strength?.direction === 'for' && SEEN_FROM.includes(strength.word);
  });
}
