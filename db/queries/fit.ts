import { and, asc, desc, eq, inArray, isNull } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { compressorModel, fit, site, unit } from '@/db/schema';

interface Of {
  organisationId: string;
  fitId: string;
}

const WHOLE = {
  id: fit.id,
  unitId: fit.unitId,
  modelId: fit.modelId,
  modelName: compressorModel.name,
  condition: fit.condition,
  installedOn: fit.installedOn,
  installedOdometerM: fit.installedOdometerM,
  installedEngineS: fit.installedEngineS,
  removedOn: fit.removedOn,
  removedOdometerM: fit.removedOdometerM,
  removedEngineS: fit.removedEngineS,
  whyOut: fit.whyOut,
  sealant: fit.sealant,
  dischargeLine: fit.dischargeLine,
  governor: fit.governor,
  feedLine: fit.feedLine,
  intakeHose: fit.intakeHose,
  dryerCartridge: fit.dryerCartridge,
  driveGear: fit.driveGear,
  systemCleaned: fit.systemCleaned,
  breakInRun: fit.breakInRun,
  asTyped: fit.asTyped,
  note: fit.note,
  createdAt: fit.createdAt,
  updatedAt: fit.updatedAt,
};

const ofItsModel = and(eq(compressorModel.organisationId, fit.organisationId), eq(compressorModel.id, fit.modelId));

export async function selectFit(db: Executor, { organisationId, fitId }: Of) {
  const [row] = await db
    .select(WHOLE)
    .from(fit)
    .innerJoin(compressorModel, ofItsModel)
    .where(and(eq(fit.organisationId, organisationId), eq(fit.id, fitId), isNull(fit.hiddenAt)));
  return row;
}

/** The fits of a unit, the latest first. */
export async function selectFitsOfUnit(db: Executor, { organisationId, unitId }: { organisationId: string; unitId: string }) {
  return db
    .select(WHOLE)
    .from(fit)
    .innerJoin(compressorModel, ofItsModel)
    .where(and(eq(fit.organisationId, organisationId), eq(fit.unitId, unitId), isNull(fit.hiddenAt)))
    .orderBy(desc(fit.installedOn), desc(fit.id));
}

export type FitRow = Awaited<ReturnType<typeof selectFitsOfUnit>>[number];

/** What is on each unit now, for lists. */
export async function selectCurrentFits(db: Executor, { organisationId, unitIds }: { organisationId: string; unitIds: string[] }) {
  if (unitIds.length === 0) return [];
  return db
    .selectDistinctOn([fit.unitId], { unitId: fit.unitId, modelName: compressorModel.name, installedOn: fit.installedOn })
    .from(fit)
    .innerJoin(compressorModel, ofItsModel)
    .where(and(eq(fit.organisationId, organisationId), inArray(fit.unitId, unitIds), isNull(fit.removedOn), isNull(fit.hiddenAt)))
    .orderBy(fit.unitId, desc(fit.installedOn), desc(fit.id));
}

/** Units that a compressor of the model is on now. */
export async function selectUnitsWithModel(db: Executor, { organisationId, modelId }: { organisationId: string; modelId: string }) {
  return db
    .select({ fitId: fit.id, unitId: fit.unitId, fleetNumber: unit.fleetNumber, siteName: site.name, condition: fit.condition, installedOn: fit.installedOn })
    .from(fit)
    .innerJoin(unit, and(eq(unit.organisationId, fit.organisationId), eq(unit.id, fit.unitId)))
    .innerJoin(site, and(eq(site.organisationId, unit.organisationId), eq(site.id, unit.siteId)))
    .where(and(eq(fit.organisationId, organisationId), eq(fit.modelId, modelId), isNull(fit.removedOn), isNull(fit.hiddenAt), isNull(unit.hiddenAt)))
    .orderBy(asc(unit.fleetNumber));
}

export async function insertFit(db: Executor, row: typeof fit.$inferInsert) {
  const [inserted] = await db.insert(fit).values(row).onConflictDoNothing().returning({ id: fit.id });
  return inserted;
}

export async function updateFit(db: Executor, { organisationId, fitId }: Of, change: Partial<typeof fit.$inferInsert>): Promise<void> {
  await db.update(fit).set(change).where(and(eq(fit.organisationId, organisationId), eq(fit.id, fitId)));
}
