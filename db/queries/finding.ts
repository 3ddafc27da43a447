import { and, asc, eq, lte, type SQL } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { cautionAcknowledgement, finding, findingNote, person } from '@/db/schema';
import { authorName } from './author';

interface Of {
  organisationId: string;
  caseId: string;
}

const ofCase = ({ organisationId, caseId }: Of): SQL[] => [eq(finding.organisationId, organisationId), eq(finding.caseId, caseId)];

export type FindingRow = Awaited<ReturnType<typeof selectFindings>>[number];

/** All findings of a case, replaced ones included, as they were received; `receivedBy` shows a past state. */
export async function selectFindings(db: Executor, of: Of & { receivedBy?: Date }) {
  return db
    .select({
      id: finding.id,
      checkId: finding.checkId,
      stage: finding.stage,
      source: finding.source,
      askedBecause: finding.askedBecause,
      kind: finding.kind,
      shares: finding.shares,
      reliability: finding.reliability,
      valueTyped: finding.valueTyped,
      errorTyped: finding.errorTyped,
      unit: finding.unit,
      valueSi: finding.valueSi,
      errorSi: finding.errorSi,
      sum: finding.sum,
      judgement: finding.judgement,
      baseline: finding.baseline,
      person: authorName(finding.byName),
      correctedAt: finding.correctedAt,
      receivedAt: finding.receivedAt,
      late: finding.late,
    })
    .from(finding)
    .leftJoin(person, eq(person.id, finding.personId))
    .where(and(...ofCase(of), ...(of.receivedBy ? [lte(finding.receivedAt, of.receivedBy)] : [])))
    .orderBy(asc(finding.receivedAt), asc(finding.id));
}

/** @returns false when a finding with this id is there already: the same request came twice. */
export async function insertFinding(db: Executor, row: typeof finding.$inferInsert): Promise<boolean> {
  const inserted = await db.insert(finding).values(row).onConflictDoNothing().returning({ id: finding.id });
  return inserted.length > 0;
}

export async function insertFindings(db: Executor, rows: (typeof finding.$inferInsert)[]): Promise<void> {
  if (rows.length > 0) await db.insert(finding).values(rows);
}

/** Which case a finding id belongs to, if any: a repeated id under another case is a mistake, not a repeat. */
export async function selectFindingCase(db: Executor, { organisationId, findingId }: { organisationId: string; findingId: string }) {
  const [row] = await db
    .select({ caseId: finding.caseId, checkId: finding.checkId })
    .from(finding)
    .where(and(eq(finding.organisationId, organisationId), eq(finding.id, findingId)));
  return row;
}

export async function insertFindingNote(db: Executor, row: typeof findingNote.$inferInsert): Promise<boolean> {
  const inserted = await db.insert(findingNote).values(row).onConflictDoNothing().returning({ id: findingNote.id });
  return inserted.length > 0;
}

export async function selectFindingNotes(db: Executor, { organisationId, caseId, by }: Of & { by?: Date }) {
  return db
    .select({ id: findingNote.id, findingId: findingNote.findingId, text: findingNote.text, person: person.name, at: findingNote.createdAt })
    .from(findingNote)
    .innerJoin(person, eq(person.id, findingNote.personId))
    .where(
      and(
        eq(findingNote.organisationId, organisationId),
        eq(findingNote.caseId, caseId),
        ...(by ? [lte(findingNote.createdAt, by)] : []),
      ),
    )
    .orderBy(asc(findingNote.createdAt), asc(findingNote.id));
}

/** What a person has acknowledged in a case on a day of its site. */
export async function selectAcknowledgements(db: Executor, { organisationId, caseId, personId, onDay }: Of & { personId: string; onDay: string }) {
  return db
    .select({ cautionId: cautionAcknowledgement.cautionId, dangers: cautionAcknowledgement.dangers })
    .from(cautionAcknowledgement)
    .where(
      and(
        eq(cautionAcknowledgement.organisationId, organisationId),
        eq(cautionAcknowledgement.caseId, caseId),
        eq(cautionAcknowledgement.personId, personId),
        eq(cautionAcknowledgement.onDay, onDay),
      ),
    );
}

export async function insertAcknowledgements(db: Executor, rows: (typeof cautionAcknowledgement.$inferInsert)[]): Promise<number> {
  const inserted = await db.insert(cautionAcknowledgement).values(rows).onConflictDoNothing().returning({ id: cautionAcknowledgement.id });
  return inserted.length;
}
