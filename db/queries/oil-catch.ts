import { and, asc, desc, eq, inArray, isNull } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Executor } from '@/db/connect';
import { oilCatch, oilWeighing, person } from '@/db/schema';

interface OfCase {
  organisationId: string;
  caseId: string;
}

interface OfCatch {
  organisationId: string;
  catchId: string;
}

export type OilCatch = typeof oilCatch.$inferSelect;

const endedBy = alias(person, 'ended_by');
const takenBackBy = alias(person, 'taken_back_by');

/** Those of a case, the latest first. */
export const selectCatches = (db: Executor, { organisationId, caseId }: OfCase) =>
  db
    .select({
      id: oilCatch.id,
      checkId: oilCatch.checkId,
      startedAt: oilCatch.startedAt,
      startedBy: person.name,
      engineS: oilCatch.engineS,
      asTyped: oilCatch.asTyped,
      place: oilCatch.place,
      remindEveryDays: oilCatch.remindEveryDays,
      remindAt: oilCatch.remindAt,
      endedAt: oilCatch.endedAt,
      endedBy: endedBy.name,
      endedWhy: oilCatch.endedWhy,
    })
    .from(oilCatch)
    .innerJoin(person, eq(person.id, oilCatch.startedBy))
    .leftJoin(endedBy, eq(endedBy.id, oilCatch.endedBy))
    .where(and(eq(oilCatch.organisationId, organisationId), eq(oilCatch.caseId, caseId)))
    .orderBy(desc(oilCatch.startedAt), desc(oilCatch.id));

/** Those under way on a case: which check, and since when. */
export const selectCatchesUnderWay = (db: Executor, { organisationId, caseId }: OfCase) =>
  db
    .select({ id: oilCatch.id, checkId: oilCatch.checkId, startedAt: oilCatch.startedAt, remindAt: oilCatch.remindAt })
    .from(oilCatch)
    .where(and(eq(oilCatch.organisationId, organisationId), eq(oilCatch.caseId, caseId), isNull(oilCatch.endedAt)))
    .orderBy(asc(oilCatch.startedAt), asc(oilCatch.id));

export async function lockCatch(db: Executor, { organisationId, catchId }: OfCatch): Promise<OilCatch | undefined> {
  const [row] = await db.select().from(oilCatch).where(and(eq(oilCatch.organisationId, organisationId), eq(oilCatch.id, catchId))).for('update');
  return row;
}

/** @returns false when one with this id is there already, or one is under way for the check */
export async function insertCatch(db: Executor, row: typeof oilCatch.$inferInsert): Promise<boolean> {
  return (await db.insert(oilCatch).values(row).onConflictDoNothing().returning({ id: oilCatch.id })).length > 0;
}

export async function updateCatch(db: Executor, { organisationId, catchId }: OfCatch, set: Partial<typeof oilCatch.$inferInsert>): Promise<void> {
  await db.update(oilCatch).set(set).where(and(eq(oilCatch.organisationId, organisationId), eq(oilCatch.id, catchId)));
}

export type WeighingRow = Awaited<ReturnType<typeof selectWeighings>>[number];

/** The weighings of some catches, oldest first, those that were taken back too. */
export async function selectWeighings(db: Executor, { organisationId, catchIds }: { organisationId: string; catchIds: string[] }) {
  if (catchIds.length === 0) return [];
  return db
    .select({
      id: oilWeighing.id,
      catchId: oilWeighing.catchId,
      massKg: oilWeighing.massKg,
      massErrorKg: oilWeighing.massErrorKg,
      engineS: oilWeighing.engineS,
      ranS: oilWeighing.ranS,
      asTyped: oilWeighing.asTyped,
      note: oilWeighing.note,
      by: person.name,
      at: oilWeighing.at,
      findingId: oilWeighing.findingId,
      takenBackAt: oilWeighing.takenBackAt,
      takenBackBy: takenBackBy.name,
      takenBackWhy: oilWeighing.takenBackWhy,
      takenBackFindingId: oilWeighing.takenBackFindingId,
    })
    .from(oilWeighing)
    .innerJoin(person, eq(person.id, oilWeighing.personId))
    .leftJoin(takenBackBy, eq(takenBackBy.id, oilWeighing.takenBackBy))
    .where(and(eq(oilWeighing.organisationId, organisationId), inArray(oilWeighing.catchId, catchIds)))
    .orderBy(asc(oilWeighing.at), asc(oilWeighing.id));
}

/** @returns false when one with this id is there already */
export async function insertWeighing(db: Executor, row: typeof oilWeighing.$inferInsert): Promise<boolean> {
  return (await db.insert(oilWeighing).values(row).onConflictDoNothing().returning({ id: oilWeighing.id })).length > 0;
}

export async function updateWeighing(db: Executor, { organisationId, weighingId }: { organisationId: string; weighingId: string }, set: Partial<typeof oilWeighing.$inferInsert>): Promise<void> {
  await db.update(oilWeighing).set(set).where(and(eq(oilWeighing.organisationId, organisationId), eq(oilWeighing.id, weighingId)));
}
