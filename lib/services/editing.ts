import { isDeepStrictEqual } from 'node:util';
import { AppError } from '@/lib/errors';

/** When a row was last changed: a form carries it along, and a later one at saving means that somebody else saved. */
export const versionOf = ({ updatedAt, createdAt }: { updatedAt: Date | null; createdAt: Date }): string => (updatedAt ?? createdAt).toISOString();

/**
 * Refuses a form that was filled from an older row. Beside each field that differs stands what is stored now, so that
 * nobody's work is overwritten unseen and nothing that was typed is lost. The version "*" is any: a script that says so
 * takes what it overwrites upon itself.
 *
 * @param typed what the form sends, by field
 * @param stored what a form opened now would hold, by field
 * @throws AppError "stale"
 */
export function refuseStale(
  row: { updatedAt: Date | null; createdAt: Date },
  { version, what, typed, stored }: { version: string; what: string; typed: Record<string, unknown>; stored: Record<string, { text: string; shown: string }> },
): void {
  if (version === '*' || versionOf(row) === version) return;
  const differing = Object.entries(stored).filter(([field, { text }]) => field in typed && String(typed[field] ?? '') !== text);
  throw new AppError(
    'stale',
    `Somebody changed this ${what} while you were at it. What you typed is still here; what is stored stands beside it. Save again to put yours in its place.`,
    Object.fromEntries(differing.map(([field, { shown }]) => [field, shown === '' ? 'Stored now: nothing.' : `Stored now: ${shown}`])),
  );
}

/**
 * Refuses what was decided on an older state of something that counts its versions.
 *
 * @throws AppError "stale"
 */
export function refuseOldVersion(version: number, { decidedOn, what }: { decidedOn: string | undefined; what: string }): void {
  if (decidedOn === undefined || decidedOn === '*' || decidedOn === String(version)) return;
  throw new AppError('stale', `Something happened to this ${what} since you read it. Look at it again first.`);
}

/** The fields of `next` that differ from the row: what an audit keeps of a change. */
export function changedFields<Next extends object>(before: object, next: Next): Partial<Next> {
  const old = before as Record<string, unknown>;
  return Object.fromEntries(Object.entries(next).filter(([name, value]) => !isDeepStrictEqual(old[name] ?? null, value ?? null))) as Partial<Next>;
}
