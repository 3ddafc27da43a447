import { and, asc, eq, sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { call, caseEvent, cases, compressorModel, edition, fit, organisation, person, site, unit } from '@/db/schema';
import { authorName } from './author';

interface Of {
  organisationId: string;
  caseId: string;
}

const thisCase = ({ organisationId, caseId }: Of) => and(eq(cases.organisationId, organisationId), eq(cases.id, caseId));

/** Takes the organisation's next case number; others wait until this transaction ends, so that none is lost. */
export async function takeCaseNumber(db: Executor, organisationId: string): Promise<number> {
  const [row] = await db
    .update(organisation)
    .set({ nextCaseNumber: sql`${organisation.nextCaseNumber} + 1` })
    .where(eq(organisation.id, organisationId))
    .returning({ next: organisation.nextCaseNumber });
  if (!row) throw new Error('organisation not set');
  return row.next - 1;
}

export async function insertCase(db: Executor, row: typeof cases.$inferInsert) {
  const [inserted] = await db.insert(cases).values(row).onConflictDoNothing().returning({ id: cases.id, number: cases.number });
  return inserted;
}

/** What an answer needs of its case; the row is locked, so that runs of one case follow each other. */
export async function lockCase(db: Executor, of: Of) {
  const [row] = await db
    .select({
      id: cases.id,
      number: cases.number,
      unitId: cases.unitId,
      siteId: cases.siteId,
      editionId: cases.editionId,
      status: cases.status,
      assignedTo: cases.assignedTo,
      vehicleState: cases.vehicleState,
      version: cases.version,
      openedAt: cases.openedAt,
      timeZone: site.timeZone,
      labourRatePerHour: organisation.labourRatePerHour,
    })
    .from(cases)
    .innerJoin(site, and(eq(site.organisationId, cases.organisationId), eq(site.id, cases.siteId)))
    .innerJoin(organisation, eq(organisation.id, cases.organisationId))
    .where(thisCase(of))
    .for('update', { of: cases });
  return row;
}

/** The head of the case page: the case with the names of what it refers to. */
export async function selectCaseHead(db: Executor, of: Of) {
  const [row] = await db
    .select({
      id: cases.id,
      number: cases.number,
      status: cases.status,
      version: cases.version,
      complaints: cases.complaints,
      complaintWords: cases.complaintWords,
      odometerM: cases.odometerM,
      engineS: cases.engineS,
      asTyped: cases.asTyped,
      vehicleState: cases.vehicleState,
      openedAt: cases.openedAt,
      openedBy: authorName(cases.openedByName),
      assignedTo: cases.assignedTo,
      editionId: cases.editionId,
      editionNumber: edition.number,
      unitId: cases.unitId,
      fleetNumber: unit.fleetNumber,
      vehicleKind: unit.vehicleKind,
      siteId: cases.siteId,
      siteName: site.name,
      timeZone: site.timeZone,
      fitId: cases.fitId,
      installedOn: fit.installedOn,
      modelName: compressorModel.name,
      labourRatePerHour: organisation.labourRatePerHour,
    })
    .from(cases)
    .innerJoin(organisation, eq(organisation.id, cases.organisationId))
    .innerJoin(unit, and(eq(unit.organisationId, cases.organisationId), eq(unit.id, cases.unitId)))
    .innerJoin(site, and(eq(site.organisationId, cases.organisationId), eq(site.id, cases.siteId)))
    .innerJoin(edition, and(eq(edition.organisationId, cases.organisationId), eq(edition.id, cases.editionId)))
    .leftJoin(person, eq(person.id, cases.openedBy))
    .leftJoin(fit, and(eq(fit.organisationId, cases.organisationId), eq(fit.id, cases.fitId)))
    .leftJoin(compressorModel, and(eq(compressorModel.organisationId, fit.organisationId), eq(compressorModel.id, fit.modelId)))
    .where(thisCase(of));
  return row;
}

export async function updateCase(db: Executor, of: Of, change: Partial<typeof cases.$inferInsert>) {
  await db
    .update(cases)
    .set({ ...change, version: sql`${cases.version} + 1` })
    .where(thisCase(of));
}

export async function insertCaseEvent(db: Executor, row: typeof caseEvent.$inferInsert) {
  const inserted = await db.insert(caseEvent).values(row).onConflictDoNothing().returning({ id: caseEvent.id });
  return inserted.length > 0;
}

export async function selectCaseEvents(db: Executor, { organisationId, caseId }: Of) {
  return db
    .select({ id: caseEvent.id, kind: caseEvent.kind, reason: caseEvent.reason, callId: caseEvent.callId, person: authorName(caseEvent.byName), at: caseEvent.at })
    .from(caseEvent)
    .leftJoin(person, eq(person.id, caseEvent.personId))
    .where(and(eq(caseEvent.organisationId, organisationId), eq(caseEvent.caseId, caseId)))
    .orderBy(asc(caseEvent.at), asc(caseEvent.id));
}

export async function insertCall(db: Executor, row: typeof call.$inferInsert) {
  const inserted = await db.insert(call).values(row).onConflictDoNothing().returning({ id: call.id });
  return inserted.length > 0;
}

export async function selectCalls(db: Executor, { organisationId, caseId }: Of) {
  return db
    .select({
      id: call.id,
      mainCause: call.mainCause,
      contributingCauses: call.contributingCauses,
      sureness: call.sureness,
      proof: call.proof,
      whyNotLeading: call.whyNotLeading,
      unlistedCause: call.unlistedCause,
      runId: call.runId,
      person: person.name,
      at: call.at,
    })
    .from(call)
    .innerJoin(person, eq(person.id, call.personId))
    .where(and(eq(call.organisationId, organisationId), eq(call.caseId, caseId)))
    .orderBy(asc(call.at), asc(call.id));
}
