import { and, desc, eq, isNull, type SQL } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { baselineFigure, baselineSet, person, unit } from '@/db/schema';
import type { BaselineSet } from '@/lib/baseline/set';

interface Of {
  organisationId: string;
}

/** @returns false when a set with this id is there already */
export async function insertBaselineSet(
  db: Executor,
  row: typeof baselineSet.$inferInsert,
  figures: readonly Omit<typeof baselineFigure.$inferInsert, 'organisationId' | 'setId'>[],
): Promise<boolean> {
  const inserted = await db.insert(baselineSet).values(row).onConflictDoNothing().returning({ id: baselineSet.id });
  if (inserted.length === 0) return false;
  await db.insert(baselineFigure).values(figures.map((figure) => ({ ...figure, organisationId: row.organisationId, setId: row.id })));
  return true;
}

/** Whose set it is; hidden ones too. */
export async function selectBaselineSet(db: Executor, { organisationId, setId }: Of & { setId: string }) {
  const [row] = await db
    .select({ id: baselineSet.id, unitId: baselineSet.unitId, hiddenAt: baselineSet.hiddenAt })
    .from(baselineSet)
    .where(and(eq(baselineSet.organisationId, organisationId), eq(baselineSet.id, setId)));
  return row;
}

export async function hideBaselineSet(db: Executor, { organisationId, setId, at }: Of & { setId: string; at: Date }): Promise<void> {
  await db.update(baselineSet).set({ hiddenAt: at }).where(and(eq(baselineSet.organisationId, organisationId), eq(baselineSet.id, setId)));
}

export type BaselineSetRow = BaselineSet & { note: string | null; by: string | null; asTyped: Record<string, string> };

/** The sets of a unit that count, the latest first. */
export const selectSetsOfUnit = (db: Executor, { organisationId, unitId }: Of & { unitId: string }): Promise<BaselineSetRow[]> =>
  selectSets(db, organisationId, eq(baselineSet.unitId, unitId));

/** Those of all units that had a compressor of the model on them when they were measured. Units that were hidden, as entered twice say, don't count. */
export const selectSetsOfModel = (db: Executor, { organisationId, modelId }: Of & { modelId: string }): Promise<BaselineSetRow[]> =>
  selectSets(db, organisationId, and(eq(baselineSet.modelId, modelId), isNull(unit.hiddenAt)));

async function selectSets(db: Executor, organisationId: string, which: SQL | undefined): Promise<BaselineSetRow[]> {
  const rows = await db
    .select({
      id: baselineSet.id,
      unitId: baselineSet.unitId,
      measuredOn: baselineSet.measuredOn,
      occasion: baselineSet.occasion,
      conditions: baselineSet.conditions,
      asTyped: baselineSet.asTyped,
      note: baselineSet.note,
      by: person.name,
      figure: baselineFigure.figure,
      si: baselineFigure.valueSi,
      errorSi: baselineFigure.errorSi,
    })
    .from(baselineSet)
    .innerJoin(unit, and(eq(unit.organisationId, baselineSet.organisationId), eq(unit.id, baselineSet.unitId)))
    .innerJoin(baselineFigure, and(eq(baselineFigure.organisationId, baselineSet.organisationId), eq(baselineFigure.setId, baselineSet.id)))
    .leftJoin(person, eq(person.id, baselineSet.createdBy))
    .where(and(eq(baselineSet.organisationId, organisationId), isNull(baselineSet.hiddenAt), which))
    .orderBy(desc(baselineSet.measuredOn), desc(baselineSet.id));
  const sets = new Map<string, BaselineSetRow>();
  for (const { figure, si, errorSi, ...set } of rows) {
    const known = sets.get(set.id) ?? { ...set, figures: {} };
    known.figures[figure] = { si, errorSi };
    sets.set(set.id, known);
  }
  return [...sets.values()];
}
