import { and, asc, desc, eq, sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { cases, gate, gateAnswer, gatePassage, person, unit } from '@/db/schema';

interface OfGate {
  organisationId: string;
  gateId: string;
}
interface OfPassage {
  organisationId: string;
  passageId: string;
}

export type GateRow = typeof gate.$inferSelect;
export type GatePassageRow = typeof gatePassage.$inferSelect;
export type GateAnswerRow = typeof gateAnswer.$inferSelect;

/** The gates of a site with how often they were passed, the latest first. */
export const selectGates = (db: Executor, { organisationId, siteId }: { organisationId: string; siteId: string }) =>
  db
    .select({
      row: gate,
      createdBy: person.name,
      passages: sql<number>`(select count(*)::int from ${gatePassage} p where p.organisation_id = ${gate.organisationId} and p.gate_id = ${gate.id} and p.ended_at is not null)`,
    })
    .from(gate)
    .innerJoin(person, eq(person.id, gate.createdBy))
    .where(and(eq(gate.organisationId, organisationId), eq(gate.siteId, siteId)))
    .orderBy(desc(gate.createdAt), desc(gate.id));

/** A gate, locked: passages of one gate follow each other, so that two of one unit open one case. */
export async function lockGate(db: Executor, { organisationId, gateId }: OfGate): Promise<GateRow | undefined> {
  const [row] = await db.select().from(gate).where(and(eq(gate.organisationId, organisationId), eq(gate.id, gateId))).for('update');
  return row;
}

/** @returns false when one with this id is there already */
export async function insertGate(db: Executor, row: typeof gate.$inferInsert): Promise<boolean> {
  return (await db.insert(gate).values(row).onConflictDoNothing().returning({ id: gate.id })).length > 0;
}

export async function updateGate(db: Executor, { organisationId, gateId }: OfGate, set: Partial<typeof gate.$inferInsert>): Promise<void> {
  await db.update(gate).set(set).where(and(eq(gate.organisationId, organisationId), eq(gate.id, gateId)));
}

/** The unit of a site that bears a number, however it is capitalised; hidden ones are not there. */
export async function selectUnitAtSite(db: Executor, { organisationId, siteId, fleetNumber }: { organisationId: string; siteId: string; fleetNumber: string }) {
  const [row] = await db
    .select({ id: unit.id })
    .from(unit)
    .where(and(eq(unit.organisationId, organisationId), eq(unit.siteId, siteId), sql`lower(${unit.fleetNumber}) = lower(${fleetNumber})`, sql`${unit.hiddenAt} is null`))
    .limit(1);
  return row;
}

/** The open case of a unit, the latest when there are several. */
export async function selectOpenCase(db: Executor, { organisationId, unitId }: { organisationId: string; unitId: string }) {
  const [row] = await db
    .select({ id: cases.id, editionId: cases.editionId })
    .from(cases)
    .where(and(eq(cases.organisationId, organisationId), eq(cases.unitId, unitId), eq(cases.status, 'open')))
    .orderBy(desc(cases.openedAt), desc(cases.id))
    .limit(1);
  return row;
}

/** A passage with the number of its unit, locked. */
export async function lockPassage(db: Executor, { organisationId, passageId }: OfPassage) {
  const [row] = await db
    .select({ passage: gatePassage, fleetNumber: unit.fleetNumber })
    .from(gatePassage)
    .innerJoin(unit, and(eq(unit.organisationId, gatePassage.organisationId), eq(unit.id, gatePassage.unitId)))
    .where(and(eq(gatePassage.organisationId, organisationId), eq(gatePassage.id, passageId)))
    .for('update', { of: gatePassage });
  return row;
}

/** The new row; undefined when one with this id is there already. */
export async function insertPassage(db: Executor, row: typeof gatePassage.$inferInsert): Promise<GatePassageRow | undefined> {
  const [inserted] = await db.insert(gatePassage).values(row).onConflictDoNothing().returning();
  return inserted;
}

export async function updatePassage(db: Executor, { organisationId, passageId }: OfPassage, set: Partial<typeof gatePassage.$inferInsert>): Promise<void> {
  await db.update(gatePassage).set(set).where(and(eq(gatePassage.organisationId, organisationId), eq(gatePassage.id, passageId)));
}

export const selectGateAnswers = (db: Executor, { organisationId, passageId }: OfPassage): Promise<GateAnswerRow[]> =>
  db.select().from(gateAnswer).where(and(eq(gateAnswer.organisationId, organisationId), eq(gateAnswer.passageId, passageId))).orderBy(asc(gateAnswer.place));

/** @returns false when it is there already, by its id or for its check */
export async function insertGateAnswer(db: Executor, row: typeof gateAnswer.$inferInsert): Promise<boolean> {
  return (await db.insert(gateAnswer).values(row).onConflictDoNothing().returning({ id: gateAnswer.id })).length > 0;
}
