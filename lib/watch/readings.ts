import type { WatchPlan } from '@/lib/diagnose/types';
import { addDays, daysOf } from './days';

/** What is watched, and since when. Days are those of the site, as people there see them. */
export interface Watched {
  plan: Pick<WatchPlan, 'readings' | 'duration' | 'distance'>;
  startedOn: string;
  /** m; null: nobody read it, so that days alone count. */
  startOdometerM: number | null;
}

/** A reading that stands. */
export interface Read {
  checkId: string;
  onDay: string;
  inOrder: boolean;
  odometerM: number | null;
}

export interface Today {
  today: string;
  /** m, as far as it is known; left out: the highest of the readings. */
  odometerM?: number | null;
}

export interface ReadingDue {
  checkId: string;
  /** The last that was read; null: none. */
  last: Read | null;
  dueOn: string;
  /** m; null: by days alone. */
  dueAtM: number | null;
  state: 'waits' | 'due' | 'overdue';
}

/** The highest odometer that anybody read; null: none. */
export function odometerOf({ startOdometerM }: Watched, readings: readonly Read[], now: number | null = null): number | null {
  const known = [startOdometerM, now, ...readings.map(({ odometerM }) => odometerM)].filter((value) => value !== null);
  return known.length > 0 ? Math.max(...known) : null;
}

/** The last reading of a check; of two on one day the later in the list. @param readings oldest first */
export const lastOf = (readings: readonly Read[], checkId: string): Read | null => readings.filter((one) => one.checkId === checkId).at(-1) ?? null;

/**
 * What of a plan was read, and what is due: on the day on which its days, or with the metre at which its distance, have gone by
 * since it was read last, or since the watch began.
 *
 * @param readings those that stand, oldest first
 */
export function dueReadings(watched: Watched, readings: readonly Read[], { today, odometerM = null }: Today): ReadingDue[] {
  const driven = odometerOf(watched, readings, odometerM);
  return watched.plan.readings.map(({ check, every, everyDistance }) => {
    const last = lastOf(readings, check);
    const dueOn = addDays(last?.onDay ?? watched.startedOn, daysOf(every));
    const from = last ? last.odometerM : watched.startOdometerM;
    const dueAtM = everyDistance !== undefined && from !== null ? from + everyDistance : null;
    const isFar = dueAtM !== null && driven !== null && driven >= dueAtM;
    return { checkId: check, last, dueOn, dueAtM, state: today > dueOn ? 'overdue' : today === dueOn || isFar ? 'due' : 'waits' };
  });
}
