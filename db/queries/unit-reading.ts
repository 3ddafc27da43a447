import { and, asc, desc, eq, inArray, isNotNull, notExists, sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { person, removal, unitReading } from '@/db/schema';

interface Of {
  organisationId: string;
  unitId: string;
}

export async function insertReading(db: Executor, row: typeof unitReading.$inferInsert): Promise<void> {
  await db.insert(unitReading).values(row);
}

/** A reading is never changed; one that was wrong is struck out, and then it isn't in any list. */
const notStruckOut = (db: Executor) =>
  notExists(
    db
      .select({ one: sql`1` })
      .from(removal)
      .where(and(eq(removal.organisationId, unitReading.organisationId), eq(removal.entity, 'unit-reading'), eq(removal.entityId, unitReading.id))),
  );

/** The readings of a unit by date; those of one day in the order in which they were written down. */
export async function selectReadings(db: Executor, { organisationId, unitId }: Of) {
  return db
    .select({
      id: unitReading.id,
      readOn: unitReading.readOn,
      odometerM: unitReading.odometerM,
      engineS: unitReading.engineS,
      odometerReplaced: unitReading.odometerReplaced,
      engineHoursReplaced: unitReading.engineHoursReplaced,
      asTyped: unitReading.asTyped,
      source: unitReading.source,
      note: unitReading.note,
      by: person.name,
    })
    .from(unitReading)
    .leftJoin(person, eq(person.id, unitReading.createdBy))
    .where(and(eq(unitReading.organisationId, organisationId), eq(unitReading.unitId, unitId), notStruckOut(db)))
    .orderBy(asc(unitReading.readOn), asc(unitReading.createdAt), asc(unitReading.id));
}

export type ReadingRow = Awaited<ReturnType<typeof selectReadings>>[number];

/** The last odometer of each unit, for lists. */
export async function selectLatestOdometers(db: Executor, { organisationId, unitIds }: { organisationId: string; unitIds: string[] }) {
  if (unitIds.length === 0) return [];
  return db
    .selectDistinctOn([unitReading.unitId], { unitId: unitReading.unitId, readOn: unitReading.readOn, odometerM: unitReading.odometerM })
    .from(unitReading)
    .where(
      and(eq(unitReading.organisationId, organisationId), inArray(unitReading.unitId, unitIds), isNotNull(unitReading.odometerM), notStruckOut(db)),
    )
    .orderBy(unitReading.unitId, desc(unitReading.readOn), desc(unitReading.createdAt), desc(unitReading.id));
}
