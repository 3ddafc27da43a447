import type { Transaction } from '@/db/connect';
import { lockWatch, updateWatch } from '@/db/queries/watch';
import { siteDay } from '@/lib/case/site-day';
import type { JobQueue } from '@/lib/jobs';
import { addDays } from '@/lib/watch';
import { nextMorning } from '../notice/morning';
import { dueOfWatch } from './standing';

/** Days until somebody is told again of what is still not read. */
const AGAIN_AFTER_DAYS = 3;
const A_QUARTER_MS = 15 * 60_000;
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
 * Plans when somebody is told next: on the morning of the day on which something comes due, or, of what is due already, some days
 * after it was told, and the next morning when it wasn't. A job of an earlier plan does nothing; one that finds nothing due plans
 * again.
 *
 * @param with the queue and the clock of whoever works
 */
export async function planWatchReminder(tx: Transaction, { jobs, now }: { jobs: JobQueue; now: () => Date }, { organisationId, watchId, timeZone, isTold = false }: Of): Promise<void> {
  const watch = await lockWatch(tx, { organisationId, watchId });
  if (!watch || watch.endedAt) return;
  const at = now();
  const today = siteDay(at, timeZone);
  const dues = await dueOfWatch(tx, watch, { timeZone, today });
  const comingDue = dues.filter(({ state }) => state === 'waits').map(({ dueOn }) => reminderOn(dueOn, timeZone));
  const again = dues.length > comingDue.length ? [againAt()] : [];
  const remindAt = earliest([...comingDue, ...again]);
  if (!remindAt || remindAt.getTime() === watch.remindAt?.getTime()) return;
  await updateWatch(tx, { organisationId, watchId }, { remindAt });
  await jobs.send(tx, 'remind-watch', { organisationId, watchId, due: remindAt.toISOString() }, { startAfter: remindAt });

  /** Of what is due already. A plan that is further off was made when nothing was: a reading was taken back since. */
  function againAt(): Date {
    const afterSome = reminderOn(addDays(today, AGAIN_AFTER_DAYS), timeZone);
    if (isTold) return afterSome;
    const planned = watch?.remindAt;
    return planned && planned > at && planned <= afterSome ? planned : reminderOn(addDays(today, 1), timeZone);
  }
}

const earliest = (times: readonly Date[]): Date | undefined => [...times].sort((a, b) => a.getTime() - b.getTime())[0];

/** A quarter of an hour before six on a day of the site, when the mails of a day's notices go out: so it is in that day's. */
export function reminderOn(day: string, timeZone: string): Date {
  let at = nextMorning(new Date(Date.parse(`${day}T00:00:00Z`) - HALF_A_DAY_MS), timeZone);
  while (siteDay(at, timeZone) < day) at = nextMorning(at, timeZone);
  return new Date(at.getTime() - A_QUARTER_MS);
}
