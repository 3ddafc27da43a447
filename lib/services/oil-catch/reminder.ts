import type { Transaction } from '@/db/connect';
import { updateCatch } from '@/db/queries/oil-catch';
import type { JobQueue } from '@/lib/jobs';

const A_DAY_MS = 86_400_000;

interface Of {
  organisationId: string;
  catchId: string;
}

/** When the next mail is due, counted from the last time that somebody looked; null: nobody wants one. */
export const remindAfter = (from: Date, everyDays: number | null): Date | null => (everyDays === null ? null : new Date(from.getTime() + everyDays * A_DAY_MS));

/** Queues the mail of that time. A job of an earlier plan finds another time in the catch and does nothing. */
export async function queueReminder(tx: Transaction, jobs: JobQueue, { organisationId, catchId, due }: Of & { due: Date | null }): Promise<void> {
  if (due) await jobs.send(tx, 'remind-weighing', { organisationId, catchId, due: due.toISOString() }, { startAfter: due });
}

/** Puts the next mail off until the plan's days have gone by again. */
export async function planReminder(tx: Transaction, jobs: JobQueue, { from, everyDays, ...of }: Of & { from: Date; everyDays: number | null }): Promise<void> {
  const due = remindAfter(from, everyDays);
  await updateCatch(tx, of, { remindEveryDays: everyDays, remindAt: due });
  await queueReminder(tx, jobs, { ...of, due });
}
