import { and, asc, eq } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Executor } from '@/db/connect';
import { person, repair, repairStep } from '@/db/schema';

interface OfCase {
  organisationId: string;
  caseId: string;
}

interface OfRepair {
  organisationId: string;
  repairId: string;
}

const assigned = alias(person, 'assigned');
const ended = alias(person, 'ended');

export type RepairRow = Awaited<ReturnType<typeof selectRepairs>>[number];

/** What was chosen for a case, in that order. */
export const selectRepairs = (db: Executor, { organisationId, caseId }: OfCase) =>
  db
    .select({
      id: repair.id,
      remedyId: repair.remedyId,
      chosenAt: repair.chosenAt,
      chosenBy: person.name,
      whyBefore: repair.whyBefore,
      plannedOn: repair.plannedOn,
      assignedTo: repair.assignedTo,
      assignedToName: assigned.name,
      endedAt: repair.endedAt,
      endedBy: ended.name,
      outcome: repair.outcome,
      whyDropped: repair.whyDropped,
    })
    .from(repair)
    .innerJoin(person, eq(person.id, repair.chosenBy))
    .leftJoin(assigned, eq(assigned.id, repair.assignedTo))
    .leftJoin(ended, eq(ended.id, repair.endedBy))
    .where(and(eq(repair.organisationId, organisationId), eq(repair.caseId, caseId)))
    .orderBy(asc(repair.chosenAt), asc(repair.id));

export type StepRow = Awaited<ReturnType<typeof selectSteps>>[number];

/** What was said of the steps of a case's repairs, oldest first. */
export const selectSteps = (db: Executor, { organisationId, caseId }: OfCase) =>
  db
    .select({ id: repairStep.id, repairId: repairStep.repairId, step: repairStep.step, mark: repairStep.mark, value: repairStep.value, note: repairStep.note, by: person.name, at: repairStep.at })
    .from(repairStep)
    .innerJoin(person, eq(person.id, repairStep.personId))
    .where(and(eq(repairStep.organisationId, organisationId), eq(repairStep.caseId, caseId)))
    .orderBy(asc(repairStep.at), asc(repairStep.id));

export async function lockRepair(db: Executor, { organisationId, repairId }: OfRepair) {
  const [row] = await db.select().from(repair).where(and(eq(repair.organisationId, organisationId), eq(repair.id, repairId))).for('update');
  return row;
}

/** @returns false when one with this id is there already, or the remedy is at hand */
export async function insertRepair(db: Executor, row: typeof repair.$inferInsert): Promise<boolean> {
  return (await db.insert(repair).values(row).onConflictDoNothing().returning({ id: repair.id })).length > 0;
}

export async function updateRepair(db: Executor, { organisationId, repairId }: OfRepair, set: Partial<typeof repair.$inferInsert>): Promise<void> {
  await db.update(repair).set(set).where(and(eq(repair.organisationId, organisationId), eq(repair.id, repairId)));
}

/** @returns false when one with this id is there already */
export async function insertStep(db: Executor, row: typeof repairStep.$inferInsert): Promise<boolean> {
  return (await db.insert(repairStep).values(row).onConflictDoNothing().returning({ id: repairStep.id })).length > 0;
}
