import { and, asc, desc, eq, inArray, isNull } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { cases, person, unitHold } from '@/db/schema';

type Held = typeof unitHold.$inferSelect;

const standsOn = ({ organisationId, unitIds }: { organisationId: string; unitIds: string[] }) =>
  and(eq(unitHold.organisationId, organisationId), inArray(unitHold.unitId, unitIds), isNull(unitHold.endedAt));

/** What stands against the release of these units, in the order of the cases that found it. */
export async function selectStandingHolds(db: Executor, of: { organisationId: string; unitIds: string[] }) {
  if (of.unitIds.length === 0) return [];
  return db
    .select({
      id: unitHold.id,
      unitId: unitHold.unitId,
      caseId: unitHold.caseId,
      number: cases.number,
      editionId: cases.editionId,
      checkId: unitHold.checkId,
      placedAt: unitHold.placedAt,
      passedAt: unitHold.passedAt,
    })
    .from(unitHold)
    .innerJoin(cases, and(eq(cases.organisationId, unitHold.organisationId), eq(cases.id, unitHold.caseId)))
    .where(standsOn(of))
    .orderBy(asc(cases.number), asc(unitHold.checkId));
}

/** Those of a unit that somebody lifted, the latest first. */
export async function selectLiftedHolds(db: Executor, { organisationId, unitId }: { organisationId: string; unitId: string }) {
  return db
    .select({
      id: unitHold.id,
      caseId: unitHold.caseId,
      number: cases.number,
      editionId: cases.editionId,
      checkId: unitHold.checkId,
      endedAt: unitHold.endedAt,
      by: person.name,
      liftFound: unitHold.liftFound,
      liftBasis: unitHold.liftBasis,
      liftJudgement: unitHold.liftJudgement,
    })
    .from(unitHold)
    .innerJoin(cases, and(eq(cases.organisationId, unitHold.organisationId), eq(cases.id, unitHold.caseId)))
    .innerJoin(person, eq(person.id, unitHold.endedBy))
    .where(and(eq(unitHold.organisationId, organisationId), eq(unitHold.unitId, unitId), eq(unitHold.ended, 'lifted')))
    .orderBy(desc(unitHold.endedAt), desc(unitHold.id));
}

/** The one that stands for a check of a unit, locked. */
export async function lockHoldOfCheck(db: Executor, { organisationId, unitId, checkId }: { organisationId: string; unitId: string; checkId: string }): Promise<Held | undefined> {
  const [row] = await db
    .select()
    .from(unitHold)
    .where(and(standsOn({ organisationId, unitIds: [unitId] }), eq(unitHold.checkId, checkId)))
    .for('update');
  return row;
}

/** One by its id, locked, whether it stands or not. */
export async function lockHold(db: Executor, { organisationId, unitId, holdId }: { organisationId: string; unitId: string; holdId: string }): Promise<Held | undefined> {
  const [row] = await db
    .select()
    .from(unitHold)
    .where(and(eq(unitHold.organisationId, organisationId), eq(unitHold.unitId, unitId), eq(unitHold.id, holdId)))
    .for('update');
  return row;
}

/** One that another case has placed meanwhile stays as it is. */
export async function insertHolds(db: Executor, rows: (typeof unitHold.$inferInsert)[]): Promise<void> {
  if (rows.length > 0) await db.insert(unitHold).values(rows).onConflictDoNothing();
}

export async function updateHold(db: Executor, { organisationId, id }: Pick<Held, 'organisationId' | 'id'>, set: Partial<typeof unitHold.$inferInsert>): Promise<void> {
  await db.update(unitHold).set(set).where(and(eq(unitHold.organisationId, organisationId), eq(unitHold.id, id)));
}
