import { and, desc, eq, inArray, sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { attachment, cases } from '@/db/schema';

/** The open cases that a person's device keeps: one's own first, then the newest of the others. */
export async function selectCasesToKeep(db: Executor, { organisationId, personId, limit }: { organisationId: string; personId: string; limit: number }) {
  return db
    .select({ id: cases.id, version: cases.version })
    .from(cases)
    .where(and(eq(cases.organisationId, organisationId), eq(cases.status, 'open')))
    .orderBy(sql`${cases.assignedTo} is not distinct from ${personId} desc`, desc(cases.openedAt), desc(cases.id))
    .limit(limit);
}

export async function selectStoredPhotos(db: Executor, { organisationId, caseIds }: { organisationId: string; caseIds: string[] }) {
  if (caseIds.length === 0) return [];
  return db
    .select({ id: attachment.id, caseId: attachment.caseId })
    .from(attachment)
    .where(and(eq(attachment.organisationId, organisationId), inArray(attachment.caseId, caseIds), eq(attachment.state, 'stored')));
}
