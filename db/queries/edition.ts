import { and, desc, eq } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { edition } from '@/db/schema';

export async function selectEdition(db: Executor, { organisationId, editionId }: { organisationId: string; editionId: string }) {
  const [row] = await db
    .select({ id: edition.id, number: edition.number, rulebook: edition.rulebook })
    .from(edition)
    .where(and(eq(edition.organisationId, organisationId), eq(edition.id, editionId)));
  return row;
}

/** The edition that new cases use: the last one published. */
export async function selectPublishedEdition(db: Executor, organisationId: string) {
  const [row] = await db
    .select({ id: edition.id, number: edition.number })
    .from(edition)
    .where(eq(edition.organisationId, organisationId))
    .orderBy(desc(edition.number))
    .limit(1);
  return row;
}
