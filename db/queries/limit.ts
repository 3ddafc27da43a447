import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { adoptedLimit, cases, compressorModel, fit, person, unit } from '@/db/schema';

const standing = (organisationId: string) => and(eq(adoptedLimit.organisationId, organisationId), isNull(adoptedLimit.withdrawnAt));

/** The limits that stand, of one check or of all, in the order of adoption. */
export async function selectLimits(db: Executor, { organisationId, checkId }: { organisationId: string; checkId?: string }) {
  return db
    .select({
      id: adoptedLimit.id,
      checkId: adoptedLimit.checkId,
      modelId: adoptedLimit.modelId,
      modelName: compressorModel.name,
      country: adoptedLimit.country,
      vehicleKind: adoptedLimit.vehicleKind,
      builtFrom: adoptedLimit.builtFrom,
      builtBefore: adoptedLimit.builtBefore,
      least: adoptedLimit.leastSi,
      most: adoptedLimit.mostSi,
      below: adoptedLimit.below,
      source: adoptedLimit.source,
      person: person.name,
      adoptedAt: adoptedLimit.createdAt,
    })
    .from(adoptedLimit)
    .innerJoin(person, eq(person.id, adoptedLimit.personId))
    .leftJoin(compressorModel, and(eq(compressorModel.organisationId, adoptedLimit.organisationId), eq(compressorModel.id, adoptedLimit.modelId)))
    .where(and(standing(organisationId), ...(checkId ? [eq(adoptedLimit.checkId, checkId)] : [])))
    .orderBy(asc(adoptedLimit.createdAt), asc(adoptedLimit.id));
}

/** @returns false when there is one with this id already: the same request came twice. */
export async function insertLimit(db: Executor, row: typeof adoptedLimit.$inferInsert): Promise<boolean> {
  return (await db.insert(adoptedLimit).values(row).onConflictDoNothing().returning({ id: adoptedLimit.id })).length > 0;
}

/** @returns false when none of this id stands */
export async function withdrawLimit(db: Executor, { organisationId, limitId, at, by, reason }: { organisationId: string; limitId: string; at: Date; by: string; reason: string }): Promise<boolean> {
  const changed = await db
    .update(adoptedLimit)
    .set({ withdrawnAt: at, withdrawnBy: by, withdrawnReason: reason })
    .where(and(standing(organisationId), eq(adoptedLimit.id, limitId)))
    .returning({ id: adoptedLimit.id });
  return changed.length > 0;
}

/** What of a case's unit decides which limits hold: the model is that of the fit the case was opened on. */
export async function selectLimitFacts(db: Executor, { organisationId, caseId }: { organisationId: string; caseId: string }) {
  const [row] = await db
    .select({ modelId: fit.modelId, country: unit.country, vehicleKind: unit.vehicleKind, builtOn: unit.builtOn })
    .from(cases)
    .innerJoin(unit, and(eq(unit.organisationId, cases.organisationId), eq(unit.id, cases.unitId)))
    .leftJoin(fit, and(eq(fit.organisationId, cases.organisationId), eq(fit.id, cases.fitId)))
    .where(and(eq(cases.organisationId, organisationId), eq(cases.id, caseId)));
  return row;
}
