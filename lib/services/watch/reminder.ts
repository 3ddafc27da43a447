import type { Transaction } from '@/db/connect';
import { lockWatch, selectWatchReadings, updateWatch } from '@/db/queries/watch';
import { siteDay } from '@/lib/case/site-day';
import type { JobQueue } from '@/lib/jobs';
import { addDays, dueReadings } from '@/lib/watch';
import { nextMorning } from '../notice/morning';
import { standingReads, watchedOf } from './standing';

/** Days until somebody is told again of what is still not read. */
const AGAIN_AFTER_DAYS = 3;
const HALF_A_DAY_MS = 12 * 3_600_000;

interface Of {
  organisationId: string;
  watchId: string;
  /** Of the site. */
  timeZone: string;
  /** Whether somebody was told just now of what is due. */
  isTold?: boolean;
}

/**
 * Plans when somebody is told next of what is due: on the morning of the first due day. What is due already is told of on the
 * morning that is planned for it, or on the next. A job of an earlier plan does nothing; one that finds nothing due plans again.
 *
 * @param with the queue and the clock of whoever works
 */
export async function planWatchReminder(tx: Transaction, { jobs, now }: { jobs: JobQueue; now: () => Date }, { organisationId, watchId, timeZone, isTold = false }: Of): Promise<void> {
  const watch = await lockWatch(tx, { organisationId, watchId });
  if (!watch || watch.endedAt) return;
  const today = siteDay(now(), timeZone);
  const reads = standingReads(await selectWatchReadings(tx, { organisationId, watchId }), timeZone);
  const dues = dueReadings(watchedOf(watch, timeZone), reads, { today });
  const isDue = dues.some(({ state }) => state !== 'waits');
  if (isDue && !isTold && watch.remindAt && watch.remindAt > now()) return;
  const first = dues.map(({ dueOn }) => dueOn).sort()[0] ?? today;
  const remindAt = morningOf(isDue ? addDays(today, isTold ? AGAIN_AFTER_DAYS : 1) : first, timeZone);
  if (remindAt.getTime() === watch.remindAt?.getTime()) return;
  await updateWatch(tx, { organisationId, watchId }, { remindAt });
  await jobs.send(tx, 'remind-watch', { organisationId, watchId, due: remindAt.toISOString() }, { startAfter: remindAt });
}

/** Six o'clock on a day of the site. */
function morningOf(day: string, timeZone: string): Date {
  let at = nextMorning(new Date(Date.parse(`${day}T00:00:00Z`) - HALF_A_DAY_MS), timeZone);
  while (siteDay(at, timeZone) < day) at = nextMorning(at, timeZone);
  return at;
}
