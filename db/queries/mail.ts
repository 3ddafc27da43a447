import { and, eq, gt, isNotNull, sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { mail } from '@/db/schema';

interface Key {
  organisationId: string;
  mailId: string;
}

/** What a mail is about. */
interface About {
  organisationId: string;
  entity: string;
  entityId: string;
}

const of = ({ organisationId, mailId }: Key) => and(eq(mail.organisationId, organisationId), eq(mail.id, mailId));
const about = ({ organisationId, entity, entityId }: About) => and(eq(mail.organisationId, organisationId), eq(mail.entity, entity), eq(mail.entityId, entityId));

export async function insertMail(db: Executor, row: typeof mail.$inferInsert): Promise<void> {
  await db.insert(mail).values(row);
}

/** Counts an attempt at a mail that waits; nothing when there is none to make. */
export async function beginMailAttempt(db: Executor, key: Key & { at: Date }) {
  const [row] = await db
    .update(mail)
    .set({ attempts: sql`${mail.attempts} + 1`, lastTriedAt: key.at })
    .where(and(of(key), eq(mail.state, 'waiting')))
    .returning({
      id: mail.id,
      organisationId: mail.organisationId,
      kind: mail.kind,
      to: mail.toAddress,
      subject: mail.subject,
      body: mail.body,
      entity: mail.entity,
      entityId: mail.entityId,
      postedBy: mail.postedBy,
      attachmentKey: mail.attachmentKey,
      attachmentName: mail.attachmentName,
      createdAt: mail.createdAt,
    });
  return row;
}

export type MailAtHand = NonNullable<Awaited<ReturnType<typeof beginMailAttempt>>>;

/** What came of an attempt that failed. */
export async function noteMailFailure(db: Executor, { lastError, isOver, ...key }: Key & { lastError: string; isOver: boolean }): Promise<void> {
  await db
    .update(mail)
    .set({ lastError, state: isOver ? 'given-up' : 'waiting' })
    .where(and(of(key), eq(mail.state, 'waiting')));
}

/** One statement that commits by itself: give it no transaction. */
export async function noteMailSent(db: Executor, { organisationId, mailId, at }: Key & { at: Date }): Promise<void> {
  await db.execute(sql`select note_mail_sent(${organisationId}, ${mailId}, ${at.toISOString()})`);
}

/** A mail that was given up waits again. */
export async function reviveMail(db: Executor, key: Key): Promise<void> {
  await db
    .update(mail)
    .set({ state: 'waiting' })
    .where(and(of(key), eq(mail.state, 'given-up')));
}

/** Whether a newer mail of the same kind about the same thing has been posted. */
export async function isMailReplaced(db: Executor, row: MailAtHand): Promise<boolean> {
  const [newer] = await db
    .select({ id: mail.id })
    .from(mail)
    .where(and(about(row), eq(mail.kind, row.kind), gt(mail.createdAt, row.createdAt)))
    .limit(1);
  return newer !== undefined;
}

/** Forgets to whom mails about something went. */
export async function forgetMailAddress(db: Executor, what: About): Promise<void> {
  await db
    .update(mail)
    .set({ toAddress: null })
    .where(and(about(what), isNotNull(mail.toAddress)));
}
