import { and, desc, eq, inArray, isNull, or, sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { call, caseEvent, cases, finding, findingNote, fit, site, unit } from '@/db/schema';

/**
 * What is found, as ids: the owner's functions of drizzle/0016, which alone can use the indexes of `search_entry`. They
 * narrow by the organisation given and by the one that the transaction has set. The rows themselves are read below as any
 * other rows are.
 */
export type EntryKind = 'unit' | 'case' | 'fit' | 'note' | 'call' | 'event';

export interface FoundEntry {
  kind: EntryKind;
  id: string;
  likeness: number;
  at: Date;
  /** How many of this kind were found in all. */
  total: number;
}

/** Entries with all of the words, each from its beginning; the likeliest first. */
export async function searchEntries(
  db: Executor,
  { organisationId, kinds, tsquery, most }: { organisationId: string; kinds: readonly EntryKind[]; tsquery: string; most: number },
): Promise<FoundEntry[]> {
  const { rows } = await db.execute<Record<keyof FoundEntry, unknown>>(
    sql`select kind, id, likeness, at, total from search_entries(${organisationId}, string_to_array(${kinds.join()}, ','), ${tsquery}::tsquery, ${most})`,
  );
  return rows.map(({ at, ...row }) => ({ ...(row as Omit<FoundEntry, 'at'>), at: new Date(at as string) }));
}

export interface FoundNumber {
  id: string;
  key: string;
  /** The very number, one that begins so, one that holds it, one that is like it. */
  manner: 0 | 1 | 2 | 3;
  /** How many there are in all of the first three. */
  sure: number;
}

/** Of four characters one that is wrong leaves a quarter of the trigrams; PostgreSQL's own threshold, 0.3, would miss those. */
const LIKENESS = '0.2';

/** Units whose fleet number is, holds or is like this one, both as `fleetKey` of lib/search has them. */
export async function searchFleetNumbers(
  db: Executor,
  { organisationId, key, near, most }: { organisationId: string; key: string; near: boolean; most: number },
): Promise<FoundNumber[]> {
  await db.execute(sql`select set_config('pg_trgm.similarity_threshold', ${LIKENESS}, true)`);
  const { rows } = await db.execute(sql`select id, fleet_key as key, manner, sure from search_fleet_numbers(${organisationId}, ${key}, ${near}, ${most})`);
  return rows as unknown as FoundNumber[];
}

interface OfIds {
  organisationId: string;
  ids: readonly string[];
}

export async function selectFoundUnits(db: Executor, { organisationId, ids }: OfIds) {
  if (ids.length === 0) return [];
  return db
    .select({ id: unit.id, fleetNumber: unit.fleetNumber, vehicleKind: unit.vehicleKind, engineFamily: unit.engineFamily, note: unit.note, siteName: site.name })
    .from(unit)
    .innerJoin(site, and(eq(site.organisationId, unit.organisationId), eq(site.id, unit.siteId)))
    .where(and(eq(unit.organisationId, organisationId), inArray(unit.id, [...ids]), isNull(unit.hiddenAt)));
}

/** Cases are counted from 1. */
const NO_NUMBER = 0;

/** A case that is meant by its number, or because it is of a unit that is; those that stand first, the latest of them first. */
export async function selectMeantCases(
  db: Executor,
  { organisationId, number, unitIds, most }: { organisationId: string; number: number | null; unitIds: readonly string[]; most: number },
): Promise<{ id: string }[]> {
  if (number === null && unitIds.length === 0) return [];
  const byNumber = eq(cases.number, number ?? NO_NUMBER);
  return db
    .select({ id: cases.id })
    .from(cases)
    .where(and(eq(cases.organisationId, organisationId), or(byNumber, inArray(cases.unitId, [...unitIds]))))
    .orderBy(desc(byNumber), sql`${cases.status} = 'closed'`, desc(cases.number))
    .limit(most);
}

const ITS_CASE = {
  caseId: cases.id,
  number: cases.number,
  status: cases.status,
  fleetNumber: unit.fleetNumber,
  siteName: site.name,
  timeZone: site.timeZone,
  openedAt: cases.openedAt,
  editionId: cases.editionId,
};

const itsUnit = and(eq(unit.organisationId, cases.organisationId), eq(unit.id, cases.unitId));
const itsSite = and(eq(site.organisationId, cases.organisationId), eq(site.id, cases.siteId));

export async function selectFoundCases(db: Executor, { organisationId, ids }: OfIds) {
  if (ids.length === 0) return [];
  return db
    .select({ ...ITS_CASE, complaints: cases.complaints, words: cases.complaintWords })
    .from(cases)
    .innerJoin(unit, itsUnit)
    .innerJoin(site, itsSite)
    .where(and(eq(cases.organisationId, organisationId), inArray(cases.id, [...ids])));
}

/** Words beside findings, with the check that each is of. */
export async function selectFoundNotes(db: Executor, { organisationId, ids }: OfIds) {
  if (ids.length === 0) return [];
  return db
    .select({ ...ITS_CASE, id: findingNote.id, words: findingNote.text, checkId: finding.checkId, at: findingNote.createdAt })
    .from(findingNote)
    .innerJoin(finding, and(eq(finding.organisationId, findingNote.organisationId), eq(finding.id, findingNote.findingId)))
    .innerJoin(cases, and(eq(cases.organisationId, findingNote.organisationId), eq(cases.id, findingNote.caseId)))
    .innerJoin(unit, itsUnit)
    .innerJoin(site, itsSite)
    .where(and(eq(findingNote.organisationId, organisationId), inArray(findingNote.id, [...ids])));
}

export async function selectFoundCalls(db: Executor, { organisationId, ids }: OfIds) {
  if (ids.length === 0) return [];
  return db
    .select({ ...ITS_CASE, id: call.id, unlistedCause: call.unlistedCause, whyNotLeading: call.whyNotLeading, at: call.at })
    .from(call)
    .innerJoin(cases, and(eq(cases.organisationId, call.organisationId), eq(cases.id, call.caseId)))
    .innerJoin(unit, itsUnit)
    .innerJoin(site, itsSite)
    .where(and(eq(call.organisationId, organisationId), inArray(call.id, [...ids])));
}

export async function selectFoundEvents(db: Executor, { organisationId, ids }: OfIds) {
  if (ids.length === 0) return [];
  return db
    .select({ ...ITS_CASE, id: caseEvent.id, words: caseEvent.reason, at: caseEvent.at })
    .from(caseEvent)
    .innerJoin(cases, and(eq(cases.organisationId, caseEvent.organisationId), eq(cases.id, caseEvent.caseId)))
    .innerJoin(unit, itsUnit)
    .innerJoin(site, itsSite)
    .where(and(eq(caseEvent.organisationId, organisationId), inArray(caseEvent.id, [...ids])));
}

export async function selectFoundFits(db: Executor, { organisationId, ids }: OfIds) {
  if (ids.length === 0) return [];
  return db
    .select({ id: fit.id, unitId: fit.unitId, words: fit.note, installedOn: fit.installedOn, fleetNumber: unit.fleetNumber })
    .from(fit)
    .innerJoin(unit, and(eq(unit.organisationId, fit.organisationId), eq(unit.id, fit.unitId)))
    .where(and(eq(fit.organisationId, organisationId), inArray(fit.id, [...ids]), isNull(fit.hiddenAt)));
}
