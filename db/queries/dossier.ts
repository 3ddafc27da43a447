import { and, asc, desc, eq, sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { dossier, dossierSeal, dossierSending, mail, organisation, person } from '@/db/schema';

interface OfCase {
  organisationId: string;
  caseId: string;
}

interface Of {
  organisationId: string;
  dossierId: string;
}

const thisDossier = ({ organisationId, dossierId }: Of) => and(eq(dossier.organisationId, organisationId), eq(dossier.id, dossierId));

/** Takes the organisation's next number; others wait until this transaction ends, so that none is lost. */
export async function takeDossierNumber(db: Executor, organisationId: string): Promise<number> {
  const [row] = await db
    .update(organisation)
    .set({ nextDossierNumber: sql`${organisation.nextDossierNumber} + 1` })
    .where(eq(organisation.id, organisationId))
    .returning({ next: organisation.nextDossierNumber });
  if (!row) throw new Error('organisation not set');
  return row.next - 1;
}

/** @returns false when one with this id is there already */
export async function insertDossier(db: Executor, row: typeof dossier.$inferInsert): Promise<boolean> {
  return (await db.insert(dossier).values(row).onConflictDoNothing().returning({ id: dossier.id })).length > 0;
}

/** Keeps a hash to be verified by; once. */
export async function insertSeal(db: Executor, row: typeof dossierSeal.$inferInsert): Promise<void> {
  await db.insert(dossierSeal).values(row).onConflictDoNothing();
}

const HEAD = {
  id: dossier.id,
  caseId: dossier.caseId,
  reference: dossier.reference,
  madeAt: dossier.madeAt,
  madeBy: person.name,
  paper: dossier.paper,
  leftOut: sql<string[]>`${dossier.content} -> 'leftOut'`,
  state: dossier.state,
  error: dossier.error,
  bytes: dossier.bytes,
  pdfHash: dossier.pdfHash,
  contentHash: dossier.contentHash,
};

export type DossierHeadRow = Awaited<ReturnType<typeof selectDossiersOfCase>>[number];

/** The dossiers of a case without what they say, the latest first. */
export const selectDossiersOfCase = (db: Executor, { organisationId, caseId }: OfCase) =>
  db
    .select(HEAD)
    .from(dossier)
    .innerJoin(person, eq(person.id, dossier.madeBy))
    .where(and(eq(dossier.organisationId, organisationId), eq(dossier.caseId, caseId)))
    .orderBy(desc(dossier.number));

export async function selectDossier(db: Executor, of: Of) {
  const [row] = await db
    .select({ ...HEAD, content: dossier.content, objectKey: dossier.objectKey })
    .from(dossier)
    .innerJoin(person, eq(person.id, dossier.madeBy))
    .where(thisDossier(of));
  return row;
}

/** What a change of one needs; nobody else writes to it until this transaction ends. */
export async function lockDossier(db: Executor, of: Of) {
  const [row] = await db.select({ id: dossier.id, caseId: dossier.caseId, reference: dossier.reference, state: dossier.state, objectKey: dossier.objectKey, madeAt: dossier.madeAt }).from(dossier).where(thisDossier(of)).for('update');
  return row;
}

export async function updateDossier(db: Executor, of: Of, change: Partial<Pick<typeof dossier.$inferInsert, 'state' | 'objectKey' | 'bytes' | 'pdfHash' | 'error'>>): Promise<void> {
  await db.update(dossier).set(change).where(thisDossier(of));
}

/** @returns false when one with this id is there already */
export async function insertSending(db: Executor, row: typeof dossierSending.$inferInsert): Promise<boolean> {
  return (await db.insert(dossierSending).values(row).onConflictDoNothing().returning({ id: dossierSending.id })).length > 0;
}

/** To whom the dossiers of a case went, with where each mail stands, oldest first. */
export const selectSendings = (db: Executor, { organisationId, caseId }: OfCase) =>
  db
    .select({
      id: dossierSending.id,
      dossierId: dossierSending.dossierId,
      to: dossierSending.toAddress,
      words: dossierSending.words,
      mailId: dossierSending.mailId,
      sentBy: person.name,
      at: dossierSending.at,
      state: mail.state,
      error: mail.lastError,
      sentAt: mail.sentAt,
    })
    .from(dossierSending)
    .innerJoin(mail, and(eq(mail.organisationId, dossierSending.organisationId), eq(mail.id, dossierSending.mailId)))
    .innerJoin(person, eq(person.id, dossierSending.sentBy))
    .where(and(eq(dossierSending.organisationId, organisationId), eq(dossierSending.caseId, caseId)))
    .orderBy(asc(dossierSending.at), asc(dossierSending.id));

/** What the mail of a sending is written from. */
export async function selectSendingOfMail(db: Executor, { organisationId, mailId }: { organisationId: string; mailId: string }) {
  const [row] = await db
    .select({ words: dossierSending.words, sentBy: person.name, reference: dossier.reference, contentHash: dossier.contentHash, title: sql<string>`${dossier.content} ->> 'title'`, organisation: sql<string>`${dossier.content} ->> 'organisation'` })
    .from(dossierSending)
    .innerJoin(dossier, and(eq(dossier.organisationId, dossierSending.organisationId), eq(dossier.id, dossierSending.dossierId)))
    .innerJoin(person, eq(person.id, dossierSending.sentBy))
    .where(and(eq(dossierSending.organisationId, organisationId), eq(dossierSending.mailId, mailId)));
  return row;
}

/** Whether a dossier of any organisation has this reference and hash; nothing else is told. */
export async function findDossier(db: Executor, { reference, hash }: { reference: string; hash: string }): Promise<{ kind: 'content' | 'pdf'; madeAt: Date } | undefined> {
  const { rows } = await db.execute<{ kind: string; madeAt: string | Date }>(sql`select kind, made_at as "madeAt" from find_dossier(${reference}, ${hash})`);
  const [row] = rows;
  return row && { kind: row.kind === 'pdf' ? 'pdf' : 'content', madeAt: new Date(row.madeAt) };
}
