import { and, asc, desc, eq, gte, isNull } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Executor } from '@/db/connect';
import { cases, person, watch, watchLink, watchReading } from '@/db/schema';

interface OfCase {
  organisationId: string;
  caseId: string;
}
interface OfWatch {
  organisationId: string;
  watchId: string;
}

export type WatchRow = typeof watch.$inferSelect;
export type WatchLinkRow = typeof watchLink.$inferSelect;

const ended = alias(person, 'ended');
const takenBack = alias(person, 'taken_back');

/** Those of a case, the latest first. */
export const selectWatches = (db: Executor, { organisationId, caseId }: OfCase) =>
  db
    .select({ row: watch, startedBy: person.name, endedBy: ended.name, comebackNumber: cases.number })
    .from(watch)
    .innerJoin(person, eq(person.id, watch.startedBy))
    .leftJoin(ended, eq(ended.id, watch.endedBy))
    .leftJoin(cases, and(eq(cases.organisationId, watch.organisationId), eq(cases.id, watch.comebackCaseId)))
    .where(and(eq(watch.organisationId, organisationId), eq(watch.caseId, caseId)))
    .orderBy(desc(watch.startedAt), desc(watch.id));

/** The one under way on a case. */
export async function selectWatchUnderWay(db: Executor, { organisationId, caseId }: OfCase): Promise<WatchRow | undefined> {
  const [row] = await db.select().from(watch).where(and(eq(watch.organisationId, organisationId), eq(watch.caseId, caseId), isNull(watch.endedAt)));
  return row;
}

export async function findWatch(db: Executor, { organisationId, watchId }: OfWatch): Promise<WatchRow | undefined> {
  const [row] = await db.select().from(watch).where(and(eq(watch.organisationId, organisationId), eq(watch.id, watchId)));
  return row;
}

export async function lockWatch(db: Executor, { organisationId, watchId }: OfWatch): Promise<WatchRow | undefined> {
  const [row] = await db.select().from(watch).where(and(eq(watch.organisationId, organisationId), eq(watch.id, watchId))).for('update');
  return row;
}

/** @returns false when one with this id is there already, or one is under way for the case */
export async function insertWatch(db: Executor, row: typeof watch.$inferInsert): Promise<boolean> {
  return (await db.insert(watch).values(row).onConflictDoNothing().returning({ id: watch.id })).length > 0;
}

export async function updateWatch(db: Executor, { organisationId, watchId }: OfWatch, set: Partial<typeof watch.$inferInsert>): Promise<void> {
  await db.update(watch).set(set).where(and(eq(watch.organisationId, organisationId), eq(watch.id, watchId)));
}

export type WatchReadingRow = Awaited<ReturnType<typeof selectWatchReadings>>[number];

/** The readings of a watch, oldest first, those that were taken back too. */
export const selectWatchReadings = (db: Executor, { organisationId, watchId }: OfWatch) =>
  db
    .select({ row: watchReading, by: person.name, takenBackBy: takenBack.name })
    .from(watchReading)
    .leftJoin(person, eq(person.id, watchReading.personId))
    .leftJoin(takenBack, eq(takenBack.id, watchReading.takenBackBy))
    .where(and(eq(watchReading.organisationId, organisationId), eq(watchReading.watchId, watchId)))
    .orderBy(asc(watchReading.at), asc(watchReading.id));

/** @returns false when one with this id is there already */
export async function insertWatchReading(db: Executor, row: typeof watchReading.$inferInsert): Promise<boolean> {
  return (await db.insert(watchReading).values(row).onConflictDoNothing().returning({ id: watchReading.id })).length > 0;
}

export async function updateWatchReading(db: Executor, { organisationId, readingId }: { organisationId: string; readingId: string }, set: Partial<typeof watchReading.$inferInsert>): Promise<void> {
  await db.update(watchReading).set(set).where(and(eq(watchReading.organisationId, organisationId), eq(watchReading.id, readingId)));
}

/** The links of a watch, the latest first. */
export const selectWatchLinks = (db: Executor, { organisationId, watchId }: OfWatch) =>
  db
    .select({ row: watchLink, createdBy: person.name })
    .from(watchLink)
    .innerJoin(person, eq(person.id, watchLink.createdBy))
    .where(and(eq(watchLink.organisationId, organisationId), eq(watchLink.watchId, watchId)))
    .orderBy(desc(watchLink.createdAt), desc(watchLink.id));

/** A link, locked, so that it is used once. */
export async function lockWatchLink(db: Executor, { organisationId, linkId }: { organisationId: string; linkId: string }): Promise<WatchLinkRow | undefined> {
  const [row] = await db.select().from(watchLink).where(and(eq(watchLink.organisationId, organisationId), eq(watchLink.id, linkId))).for('update');
  return row;
}

/** @returns false when one with this id is there already */
export async function insertWatchLink(db: Executor, row: typeof watchLink.$inferInsert): Promise<boolean> {
  return (await db.insert(watchLink).values(row).onConflictDoNothing().returning({ id: watchLink.id })).length > 0;
}

export async function updateWatchLink(db: Executor, { organisationId, linkId }: { organisationId: string; linkId: string }, set: Partial<typeof watchLink.$inferInsert>): Promise<void> {
  await db.update(watchLink).set(set).where(and(eq(watchLink.organisationId, organisationId), eq(watchLink.id, linkId)));
}

/** Those under way on a unit, for whichever of its cases, the oldest first. */
export const selectWatchesUnderWayOfUnit = (db: Executor, { organisationId, unitId }: { organisationId: string; unitId: string }) =>
  db
    .select({ row: watch, caseNumber: cases.number })
    .from(watch)
    .innerJoin(cases, and(eq(cases.organisationId, watch.organisationId), eq(cases.id, watch.caseId)))
    .where(and(eq(watch.organisationId, organisationId), eq(watch.unitId, unitId), isNull(watch.endedAt)))
    .orderBy(asc(watch.startedAt), asc(watch.id));

const ofComeback = alias(cases, 'of_comeback');

/** The case that a case came back from; none for most. */
export async function selectCameBackFrom(db: Executor, { organisationId, caseId }: OfCase): Promise<{ caseId: string; number: number } | null> {
  const [row] = await db
    .select({ caseId: cases.id, number: cases.number })
    .from(ofComeback)
    .innerJoin(cases, and(eq(cases.organisationId, ofComeback.organisationId), eq(cases.id, ofComeback.comebackOf)))
    .where(and(eq(ofComeback.organisationId, organisationId), eq(ofComeback.id, caseId)));
  return row ?? null;
}

/** Cases that may be what came back: open ones of the unit that no other goes before, opened while it was watched. */
export const selectMayHaveComeBack = (db: Executor, { organisationId, unitId, since }: { organisationId: string; unitId: string; since: Date }) =>
  db
    .select({ caseId: cases.id, number: cases.number, openedAt: cases.openedAt })
    .from(cases)
    .where(and(eq(cases.organisationId, organisationId), eq(cases.unitId, unitId), eq(cases.status, 'open'), isNull(cases.comebackOf), gte(cases.openedAt, since)))
    .orderBy(desc(cases.openedAt), desc(cases.id));
