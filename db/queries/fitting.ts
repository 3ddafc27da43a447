import { and, asc, eq } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Executor } from '@/db/connect';
import { compressorModel, fit, fitting, installAnswer, person } from '@/db/schema';

interface OfCase {
  organisationId: string;
  caseId: string;
}

interface OfFitting {
  organisationId: string;
  fittingId: string;
}

const finished = alias(person, 'finished');

export type FittingRow = Awaited<ReturnType<typeof selectFittings>>[number];

/** The fittings of a case, the first first. */
export const selectFittings = (db: Executor, { organisationId, caseId }: OfCase) =>
  db
    .select({
      id: fitting.id,
      fitId: fitting.fitId,
      startedAt: fitting.startedAt,
      startedBy: person.name,
      finishedAt: fitting.finishedAt,
      finishedBy: finished.name,
      installedOn: fit.installedOn,
      modelId: fit.modelId,
      modelName: compressorModel.name,
      driveGear: compressorModel.driveGear,
      cooling: compressorModel.cooling,
    })
    .from(fitting)
    .innerJoin(fit, and(eq(fit.organisationId, fitting.organisationId), eq(fit.id, fitting.fitId)))
    .innerJoin(compressorModel, and(eq(compressorModel.organisationId, fit.organisationId), eq(compressorModel.id, fit.modelId)))
    .innerJoin(person, eq(person.id, fitting.startedBy))
    .leftJoin(finished, eq(finished.id, fitting.finishedBy))
    .where(and(eq(fitting.organisationId, organisationId), eq(fitting.caseId, caseId)))
    .orderBy(asc(fitting.startedAt), asc(fitting.id));

export type InstallAnswerRow = Awaited<ReturnType<typeof selectInstallAnswers>>[number];

/** What was said of the points of a case's fittings, oldest first. */
export const selectInstallAnswers = (db: Executor, { organisationId, caseId }: OfCase) =>
  db
    .select({
      id: installAnswer.id,
      fittingId: installAnswer.fittingId,
      pointId: installAnswer.pointId,
      answer: installAnswer.answer,
      value: installAnswer.value,
      note: installAnswer.note,
      by: person.name,
      at: installAnswer.at,
    })
    .from(installAnswer)
    .innerJoin(person, eq(person.id, installAnswer.personId))
    .where(and(eq(installAnswer.organisationId, organisationId), eq(installAnswer.caseId, caseId)))
    .orderBy(asc(installAnswer.at), asc(installAnswer.id));

/** @returns false when one with this id is there already, or another is under way in the case */
export async function insertFitting(db: Executor, row: typeof fitting.$inferInsert): Promise<boolean> {
  return (await db.insert(fitting).values(row).onConflictDoNothing().returning({ id: fitting.id })).length > 0;
}

export async function finishFittingRow(db: Executor, { organisationId, fittingId }: OfFitting, set: { finishedAt: Date; finishedBy: string }): Promise<void> {
  await db.update(fitting).set(set).where(and(eq(fitting.organisationId, organisationId), eq(fitting.id, fittingId)));
}

/** @returns false when one with this id is there already */
export async function insertInstallAnswer(db: Executor, row: typeof installAnswer.$inferInsert): Promise<boolean> {
  return (await db.insert(installAnswer).values(row).onConflictDoNothing().returning({ id: installAnswer.id })).length > 0;
}
