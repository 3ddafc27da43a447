import type { UsedFinding } from '@/lib/diagnose/used-findings';
import type { PreparedCase } from '../back-test/prepare';

/** Answers counted over cases: for one cause and check, cases by answer. */
export interface AnswerCounts {
  /** By index of the answer. An answer that was only thought so counts as its reliability, a split one by its shares. */
  byState: number[];
  /** Cases in which the check was answered, whole. */
  cases: number;
  caseIds: string[];
}

/** What a finding adds to the counts of its check's answers. */
export function countsOf({ check, states, finding }: UsedFinding): number[] {
  const counts = check.stateIds.map(() => 0);
  for (const { index, share } of states) counts[index] = share * finding.reliability;
  return counts;
}

/**
 * Counts the answers of every check, cause by cause.
 *
 * An answer that somebody only thought so says less; the rest of it, 1 - r, is taken to say nothing.
 *
 * @param cases prepared proved cases
 * @returns by "cause index/check id"; see {@link countKey}
 */
export function countAnswers(cases: readonly PreparedCase[]): Map<string, AnswerCounts> {
  const all = new Map<string, AnswerCounts>();
  for (const each of cases) {
    for (const used of each.used) {
      const key = countKey(each.truth, used.check.id);
      let held = all.get(key);
      if (!held) all.set(key, (held = { byState: used.check.stateIds.map(() => 0), cases: 0, caseIds: [] }));
      const { byState } = held;
      countsOf(used).forEach((count, state) => (byState[state] = (byState[state] ?? 0) + count));
      held.cases += 1;
      held.caseIds.push(each.id);
    }
  }
  return all;
}

export const countKey = (cause: number, checkId: string): string => `${cause}/${checkId}`;
