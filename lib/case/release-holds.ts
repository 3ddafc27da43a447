import type { CompiledCheck, CompiledRulebook } from '@/lib/diagnose/compiled';
import type { Judgement } from '@/lib/limits';
import type { StateShare } from '@/lib/diagnose/types';
import { isNewer, slotOf, type Dated } from './current-findings';
import { shareOf } from './share-of';

interface Answer extends Dated {
  kind: string;
  shares: readonly StateShare[];
  judgement?: Judgement | null;
}

/** A measured value on the edge of a limit counts as over it. */
const HOLDS_FROM = 0.5;

/**
 * Checks whose answer forbids the unit's release, in the order of their ids. A measured value that was judged by a limit
 * of the organisation holds when it is out of it; any other answer holds where the rulebook says so. An answer holds until a later answer of the
 * same check passes, at whatever stage: "can't tell" and a skipped check pass nothing, and an answer that was taken back
 * brings back the one before it.
 *
 * @param rows every finding of the case, in any order
 * @returns ids of checks; empty: nothing known forbids it
 */
export function releaseHolds({ checks }: Pick<CompiledRulebook, 'checks'>, rows: readonly Answer[]): string[] {
  const answers = new Map<string, Answer[]>();
  for (const row of rows) {
    const check = checks.get(row.checkId);
    if (check) answers.set(row.checkId, [...(answers.get(row.checkId) ?? []), row]);
  }
  return [...checks.values()]
    .filter((check) => {
      const last = standing(answers.get(check.id) ?? []).findLast(({ shares }) => shares.length > 0);
      return last !== undefined && holds(check, last);
    })
    .map(({ id }) => id);
}

const holds = (check: CompiledCheck, { judgement, shares }: Answer): boolean =>
  judgement ? judgement.verdict === 'out' : holding(check, shares) >= HOLDS_FROM;

/** The answers in the order they were given, less those that were taken back. */
function standing(rows: readonly Answer[]): Answer[] {
  const kept: Answer[] = [];
  for (const row of [...rows].sort((a, b) => (isNewer(a, b) ? 1 : -1))) {
    const takenBack = row.kind === 'undo' ? kept.findLastIndex((other) => slotOf(other) === slotOf(row)) : -1;
    if (takenBack >= 0) kept.splice(takenBack, 1);
    else kept.push(row);
  }
  return kept;
}

const holding = ({ check }: CompiledCheck, shares: readonly StateShare[]): number =>
  shareOf(shares, check.states.filter(({ holdsRelease }) => holdsRelease).map(({ id }) => id));
