import { and, asc, eq } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Executor } from '@/db/connect';
import { breakInEvent, breakInRun, person } from '@/db/schema';

interface OfCase {
  organisationId: string;
  caseId: string;
}

const ended = alias(person, 'ended');

export type BreakInRunRow = Awaited<ReturnType<typeof selectBreakInRuns>>[number];

/** The break-in runs of a case, the first first. */
export const selectBreakInRuns = (db: Executor, { organisationId, caseId }: OfCase) =>
  db
    .select({
      id: breakInRun.id,
      fitId: breakInRun.fitId,
      figures: breakInRun.figures,
      startedAt: breakInRun.startedAt,
      startedBy: person.name,
      endedAt: breakInRun.endedAt,
      endedBy: ended.name,
      outcome: breakInRun.outcome,
      whyStopped: breakInRun.whyStopped,
      hotCheck: breakInRun.hotCheck,
    })
    .from(breakInRun)
    .innerJoin(person, eq(person.id, breakInRun.startedBy))
    .leftJoin(ended, eq(ended.id, breakInRun.endedBy))
    .where(and(eq(breakInRun.organisationId, organisationId), eq(breakInRun.caseId, caseId)))
    .orderBy(asc(breakInRun.startedAt), asc(breakInRun.id));

export type BreakInEventRow = Awaited<ReturnType<typeof selectBreakInEvents>>[number];

/** What happened in the runs of a case, oldest first. */
export const selectBreakInEvents = (db: Executor, { organisationId, caseId }: OfCase) =>
  db
    .select({
      id: breakInEvent.id,
      runId: breakInEvent.runId,
      kind: breakInEvent.kind,
      reason: breakInEvent.reason,
      pressureTyped: breakInEvent.pressureTyped,
      pressurePa: breakInEvent.pressurePa,
      by: person.name,
      at: breakInEvent.at,
    })
    .from(breakInEvent)
    .innerJoin(person, eq(person.id, breakInEvent.personId))
    .where(and(eq(breakInEvent.organisationId, organisationId), eq(breakInEvent.caseId, caseId)))
    .orderBy(asc(breakInEvent.at), asc(breakInEvent.id));

/** @returns false when one with this id is there already, or another is under way in the case */
export async function insertBreakInRun(db: Executor, row: typeof breakInRun.$inferInsert): Promise<boolean> {
  return (await db.insert(breakInRun).values(row).onConflictDoNothing().returning({ id: breakInRun.id })).length > 0;
}

export async function updateBreakInRun(db: Executor, { organisationId, runId }: { organisationId: string; runId: string }, set: Partial<typeof breakInRun.$inferInsert>): Promise<void> {
  await db.update(breakInRun).set(set).where(and(eq(breakInRun.organisationId, organisationId), eq(breakInRun.id, runId)));
}

/** @returns false when one with this id is there already */
export async function insertBreakInEvent(db: Executor, row: typeof breakInEvent.$inferInsert): Promise<boolean> {
  return (await db.insert(breakInEvent).values(row).onConflictDoNothing().returning({ id: breakInEvent.id })).length > 0;
}
