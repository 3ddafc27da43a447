import { and, asc, eq } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { person, release } from '@/db/schema';

/** The releases of a case, the first first. */
export const selectReleases = (db: Executor, { organisationId, caseId }: { organisationId: string; caseId: string }) =>
  db
    .select({ id: release.id, releasedAt: release.releasedAt, releasedBy: person.name, basis: release.basis, on: release.on, note: release.note })
    .from(release)
    .innerJoin(person, eq(person.id, release.releasedBy))
    .where(and(eq(release.organisationId, organisationId), eq(release.caseId, caseId)))
    .orderBy(asc(release.releasedAt), asc(release.id));

/** @returns false when one with this id is there already */
export async function insertRelease(db: Executor, row: typeof release.$inferInsert): Promise<boolean> {
  return (await db.insert(release).values(row).onConflictDoNothing().returning({ id: release.id })).length > 0;
}
