import type { Transaction } from '@/db/connect';
import { selectBreakInRuns } from '@/db/queries/break-in';
import { selectFittings } from '@/db/queries/fitting';
import { selectRepairs, selectSteps } from '@/db/queries/repair';

/** The last work on a case's vehicle: what was measured before it proves nothing of it. null: none is known. */
export async function lastWorkOn(tx: Transaction, of: { organisationId: string; caseId: string }): Promise<Date | null> {
  const times = [
    ...(await selectSteps(tx, of)).filter(({ mark }) => mark === 'done').map(({ at }) => at),
    ...(await selectRepairs(tx, of)).map(({ endedAt }) => endedAt),
    ...(await selectFittings(tx, of)).map(({ finishedAt, startedAt }) => finishedAt ?? startedAt),
    ...(await selectBreakInRuns(tx, of)).map(({ endedAt, startedAt }) => endedAt ?? startedAt),
  ].flatMap((at) => (at ? [at.getTime()] : []));
  return times.length > 0 ? new Date(Math.max(...times)) : null;
}
