import { and, desc, eq, sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { call, cases } from '@/db/schema';

/** The cases of a unit, the latest first, each with the cause that was called last. */
export async function selectCasesOfUnit(db: Executor, { organisationId, unitId }: { organisationId: string; unitId: string }) {
  const lastCalled = db
    .select({ mainCause: call.mainCause })
    .from(call)
    .where(and(eq(call.organisationId, cases.organisationId), eq(call.caseId, cases.id)))
    .orderBy(desc(call.at), desc(call.id))
    .limit(1);
  return db
    .select({
      id: cases.id,
      number: cases.number,
      status: cases.status,
      complaints: cases.complaints,
      openedAt: cases.openedAt,
      closedAt: cases.closedAt,
      editionId: cases.editionId,
      // A case that was reopened has no call that stands.
      mainCause: sql<string | null>`case when ${cases.status} = 'open' then null else ${lastCalled} end`,
    })
    .from(cases)
    .where(and(eq(cases.organisationId, organisationId), eq(cases.unitId, unitId)))
    .orderBy(desc(cases.openedAt), desc(cases.id));
}
