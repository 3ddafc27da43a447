import { and, asc, count, desc, eq, ilike, isNotNull, isNull, sql, type SQL } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { compressorModel, fit } from '@/db/schema';
import { containing } from './like';

interface Of {
  organisationId: string;
  modelId: string;
}

const WHOLE = {
  id: compressorModel.id,
  name: compressorModel.name,
  displacementM3: compressorModel.displacementM3,
  boreM: compressorModel.boreM,
  strokeM: compressorModel.strokeM,
  cylinders: compressorModel.cylinders,
  driveRatio: compressorModel.driveRatio,
  cooling: compressorModel.cooling,
  unloading: compressorModel.unloading,
  intakeType: compressorModel.intakeType,
  drainOpening: compressorModel.drainOpening,
  oilFeedPlace: compressorModel.oilFeedPlace,
  driveGear: compressorModel.driveGear,
  portBoreM: compressorModel.portBoreM,
  lineSizeM: compressorModel.lineSizeM,
  breakInEngineRpm: compressorModel.breakInEngineRpm,
  breakInPressurePa: compressorModel.breakInPressurePa,
  breakInLeastS: compressorModel.breakInLeastS,
  breakInMostS: compressorModel.breakInMostS,
  breakInSource: compressorModel.breakInSource,
  asTyped: compressorModel.asTyped,
  note: compressorModel.note,
  createdAt: compressorModel.createdAt,
  updatedAt: compressorModel.updatedAt,
  hiddenAt: compressorModel.hiddenAt,
};

const thisModel = ({ organisationId, modelId }: Of) => and(eq(compressorModel.organisationId, organisationId), eq(compressorModel.id, modelId));

/** Hidden ones too, because fits name them. */
export async function selectModel(db: Executor, of: Of) {
  const [row] = await db.select(WHOLE).from(compressorModel).where(thisModel(of));
  return row;
}

export type ModelRow = NonNullable<Awaited<ReturnType<typeof selectModel>>>;

/** By its name, however it is capitalised. */
export async function selectModelByName(db: Executor, { organisationId, name }: { organisationId: string; name: string }) {
  const [row] = await db
    .select({ id: compressorModel.id, name: compressorModel.name, hiddenAt: compressorModel.hiddenAt })
    .from(compressorModel)
    .where(and(eq(compressorModel.organisationId, organisationId), sql`lower(${compressorModel.name}) = lower(${name})`))
    .limit(1);
  return row;
}

/** What can be fitted, for a select. */
export async function selectModelNames(db: Executor, organisationId: string) {
  return db
    .select({ id: compressorModel.id, name: compressorModel.name })
    .from(compressorModel)
    .where(and(eq(compressorModel.organisationId, organisationId), isNull(compressorModel.hiddenAt)))
    .orderBy(asc(compressorModel.name));
}

/** The id of the new row; undefined when its id or its name is taken. */
export async function insertModel(db: Executor, row: typeof compressorModel.$inferInsert) {
  const [inserted] = await db.insert(compressorModel).values(row).onConflictDoNothing().returning({ id: compressorModel.id });
  return inserted;
}

export async function lockModel(db: Executor, of: Of): Promise<boolean> {
  const rows = await db.select({ id: compressorModel.id }).from(compressorModel).where(thisModel(of)).for('update');
  return rows.length > 0;
}

export async function updateModel(db: Executor, of: Of, change: Partial<typeof compressorModel.$inferInsert>): Promise<void> {
  await db.update(compressorModel).set(change).where(thisModel(of));
}

export interface ModelFilter {
  organisationId: string;
  /** Part of a name. */
  text?: string;
  drainOpening?: string;
  hidden: boolean;
  sort: 'name' | 'displacement' | 'on-units';
  direction: 'asc' | 'desc';
  limit: number;
  offset: number;
}

export async function selectModels(db: Executor, filter: ModelFilter) {
  const onUnits = db
    .select({ modelId: fit.modelId, count: count().as('on_units') })
    .from(fit)
    .where(and(eq(fit.organisationId, filter.organisationId), isNull(fit.removedOn), isNull(fit.hiddenAt)))
    .groupBy(fit.modelId)
    .as('now_on');
  const where = and(
    eq(compressorModel.organisationId, filter.organisationId),
    filter.hidden ? isNotNull(compressorModel.hiddenAt) : isNull(compressorModel.hiddenAt),
    ...[
      filter.text && ilike(compressorModel.name, containing(filter.text)),
      filter.drainOpening && eq(compressorModel.drainOpening, filter.drainOpening),
    ].filter((condition): condition is SQL => Boolean(condition)),
  );
  const number = sql<number>`coalesce(${onUnits.count}, 0)`.mapWith(Number);
  const sortedBy = { name: compressorModel.name, displacement: compressorModel.displacementM3, 'on-units': number }[filter.sort];
  const rows = await db
    .select({
      id: compressorModel.id,
      name: compressorModel.name,
      displacementM3: compressorModel.displacementM3,
      cooling: compressorModel.cooling,
      drainOpening: compressorModel.drainOpening,
      intakeType: compressorModel.intakeType,
      onUnits: number,
    })
    .from(compressorModel)
    .leftJoin(onUnits, eq(onUnits.modelId, compressorModel.id))
    .where(where)
    .orderBy((filter.direction === 'asc' ? asc : desc)(sortedBy), asc(compressorModel.name))
    .limit(filter.limit)
    .offset(filter.offset);
  const [total] = await db.select({ count: count() }).from(compressorModel).where(where);
  return { rows, total: total?.count ?? 0 };
}
