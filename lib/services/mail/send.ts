import { setTimeout as sleep } from 'node:timers/promises';
import { asTenant, whileLocked, type Database, type Executor } from '@/db/connect';
import { beginMailAttempt, noteMailFailure, noteMailSent, type MailAtHand } from '@/db/queries/mail';
import type { JobData } from '@/lib/jobs';
import { NoUseTrying, type Attempt } from '@/lib/jobs/attempt';
import type { Mail, Mailer } from '@/lib/mail';
import { mailFailure } from '@/lib/mail/failure';
import type { Storage } from '@/lib/storage';
import { tellOfBounced } from '../notice/bounced';
import { textAtSending } from './text-at-sending';

/** What a job that mails needs. */
export interface Post {
  db: Database;
  mailer: Mailer;
  storage: Storage;
  now: () => Date;
  /** Where the application is reached. */
  baseUrl: string;
  /** What the tokens of mailed links are made with. */
  secret: string;
}

/**
 * Sends a mail that was posted, once. A second copy goes out when the process is killed between the server's word that
 * it has the mail and our note of it, and only then; it carries the same Message-ID and the same link. What is tried is
 * noted in transactions of its own, so that it outlives a failure. The lock is on this mail alone and belongs to a
 * connection, not to a transaction: a slow server holds up nothing else, and no row.
 */
export async function sendMail(post: Post, { organisationId, mailId }: JobData['send-mail'], { isLast }: Pick<Attempt, 'isLast'>): Promise<void> {
  const key = { organisationId, mailId };
  const isOurs = await whileLocked(post.db, `mail ${mailId}`, async (own) => {
    const mail = await asTenant(own, key, (tx) => beginMailAttempt(tx, { ...key, at: post.now() }));
    // Sent already, or given up.
    if (!mail) return;
    const fail = (lastError: string, isOver: boolean) =>
      asTenant(own, key, async (tx) => {
        await noteMailFailure(tx, { ...key, lastError, isOver });
        if (isOver) await tellOfBounced(tx, post.now, mail);
      });
    const letter = await letterOf(post, mail).catch(async (error: unknown) => {
      await fail('The mail could not be put together.', isLast);
      throw error;
    });
    if (!letter) return asTenant(own, key, (tx) => noteMailFailure(tx, { ...key, lastError: 'It was not needed any more when it was to be sent.', isOver: true }));
    try {
      await post.mailer.send(letter);
    } catch (error) {
      const { sentence, isFinal } = mailFailure(error);
      await fail(sentence, isFinal || isLast);
      throw isFinal ? new NoUseTrying(sentence, { cause: error }) : new Error(sentence, { cause: error });
    }
    await noteSent(post, own, { ...key, at: post.now() });
  });
  if (!isOurs) throw new Error('Another worker is sending this mail.');
}

/** @returns undefined when there is nothing to say any more, or nobody to say it to */
async function letterOf(post: Post, mail: MailAtHand): Promise<Mail | undefined> {
  const { id, to, subject } = mail;
  if (to === null) return undefined;
  const text = await textAtSending(post, mail);
  return text === undefined ? undefined : { id, to, subject, text, attachments: await attachmentOf(post, mail) };
}

async function attachmentOf({ storage }: Post, { id, attachmentKey, attachmentName }: MailAtHand) {
  if (attachmentKey === null) return undefined;
  const content = await storage.get(attachmentKey);
  if (!content) throw new Error(`The attachment of mail ${id} is gone`);
  return [{ filename: attachmentName ?? 'attachment', content }];
}

/** Waits between tries to note what can't be taken back. */
const WAITS_MS = [100, 500, 1_000, 2_000];

/** The mail is out: should the connection have gone meanwhile, another one notes it. */
async function noteSent({ db }: Post, own: Executor, sent: Parameters<typeof noteMailSent>[1]): Promise<void> {
  try {
    await noteMailSent(own, sent);
  } catch (error) {
    for (const wait of WAITS_MS) {
      await sleep(wait);
      const isNoted = await noteMailSent(db, sent).then(() => true, () => false);
      if (isNoted) return;
    }
    throw error;
  }
}
