import { dayText } from '@/lib/schemas/day-text';

/** How long a unit stands, in words: "since today", "1 day", "12 days". */
export function standsText(days: number): string {
  if (days <= 0) return 'since today';
  return days === 1 ? '1 day' : `${days.toLocaleString('en-GB')} days`;
}

/** How long a unit stood that stands no more. */
export const stoodText = (days: number): string => (days <= 0 ? 'less than a day' : standsText(days));

/** When something last happened, where the site is: the time alone today, the day otherwise. */
export function activityText(iso: string, timeZone: string, now: Date): string {
  const at = new Date(iso);
  const day = (date: Date) => new Intl.DateTimeFormat('en-CA', { timeZone, dateStyle: 'short' }).format(date);
  if (day(at) !== day(now)) return dayText(day(at));
  return `today, ${new Intl.DateTimeFormat('en-GB', { timeZone, timeStyle: 'short' }).format(at)}`;
}
