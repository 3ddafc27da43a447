import { invalid } from '@/lib/errors';

/** Whole days of a calendar, as "YYYY-MM-DD": counted in UTC, where every day has 24 hours. */
const DAY_MS = 86_400_000;

const toMs = (day: string) => Date.parse(`${day}T00:00:00Z`);

/** @example daysBetween('2025-03-01', '2025-03-04') // 3 */
export const daysBetween = (from: string, to: string): number => Math.round((toMs(to) - toMs(from)) / DAY_MS);

/** The same day so many years earlier; 29 February becomes 1 March. */
export function yearsBefore(day: string, years: number): string {
  const [year = 0, month = 1, date = 1] = day.split('-').map(Number);
  return new Date(Date.UTC(year - years, month - 1, date)).toISOString().slice(0, 10);
}

/** The day where it is latest on Earth: nobody is refused a today of his own where no site says which one that is. */
export const latestToday = (now: Date): string => new Date(now.getTime() + 14 * 3_600_000).toISOString().slice(0, 10);

/** @throws AppError "invalid" beside each field whose day is after `today` */
export function refuseFutureDay(days: Record<string, string | null>, today: string): void {
  const late = Object.entries(days).filter(([, day]) => day !== null && day > today);
  if (late.length > 0) throw invalid(Object.fromEntries(late.map(([field]) => [field, 'This day is yet to come.'])));
}
