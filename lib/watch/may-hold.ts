import { dayText } from '@/lib/schemas/day-text';
import { addDays, daysOf } from './days';
import { lastOf, odometerOf, type Read, type Today, type Watched } from './readings';

/** When a watch is over: when the day has come and the distance is driven. */
export interface End {
  on: string;
  /** m on the odometer; null: days alone count. */
  atM: number | null;
}

export const endOf = ({ plan, startedOn, startOdometerM }: Watched): End => ({
  on: addDays(startedOn, daysOf(plan.duration)),
  atM: plan.distance !== undefined && startOdometerM !== null ? startOdometerM + plan.distance : null,
});

interface Words {
  nameOf: (checkId: string) => string;
  /** A distance as the reader has it. @param metres m */
  distanceText: (metres: number) => string;
}

/**
 * Whether a repair was watched long enough to say that it held: its span is over, and everything was read within its interval of
 * the end and was in order when it was read last.
 *
 * @param readings those that stand, oldest first
 * @returns why not, in sentences; none: it may be said
 */
export function whyNotHeld(watched: Watched, readings: readonly Read[], { today, odometerM = null }: Today, { nameOf, distanceText }: Words): string[] {
  const end = endOf(watched);
  const driven = odometerOf(watched, readings, odometerM);
  const early = today < end.on ? [`It is watched until ${dayText(end.on)}.`] : [];
  const short = end.atM !== null && (driven === null || driven < end.atM) ? [`${distanceText(end.atM - (driven ?? watched.startOdometerM ?? 0))} are still to be driven.`] : [];
  const unread = watched.plan.readings.flatMap(({ check, every }) => {
    const last = lastOf(readings, check);
    if (!last) return [`${nameOf(check)} was not read.`];
    if (!last.inOrder) return [`${nameOf(check)} was not in order on ${dayText(last.onDay)}.`];
    return last.onDay < addDays(end.on, -daysOf(every)) ? [`${nameOf(check)} was read last on ${dayText(last.onDay)}, too long before the end.`] : [];
  });
  return [...early, ...short, ...unread];
}
