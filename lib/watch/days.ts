const DAY_MS = 86_400_000;
const DAY_S = 86_400;

/** A span as whole days of a calendar, at least one. @param seconds s */
export const daysOf = (seconds: number): number => Math.max(1, Math.round(seconds / DAY_S));

/** @example addDays('2026-02-27', 2) // '2026-03-01' */
export const addDays = (day: string, days: number): string => new Date(Date.parse(`${day}T00:00:00Z`) + days * DAY_MS).toISOString().slice(0, 10);
