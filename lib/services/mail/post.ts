import type { Executor } from '@/db/connect';
import { insertMail } from '@/db/queries/mail';
import { newId } from '@/lib/ids';
import type { JobQueue } from '@/lib/jobs';

interface Posted {
  organisationId: string;
  /** "invitation": who makes its text, when that is not given here, goes by it. */
  kind: string;
  to: string;
  subject: string;
  /** Left out where it holds a secret, which is made when the mail is sent (`text-at-sending.ts`). */
  text?: string;
  /** What it is about. */
  entity: string;
  entityId: string;
  /** Who brought it about, and hears when it can't be delivered. */
  by?: string;
  /** An object of the storage. */
  attachment?: { key: string; name: string };
  at: Date;
}

/**
 * Posts a mail: it goes out when the transaction commits, and not at all when it doesn't.
 *
 * @param tx with the organisation set
 * @returns the id of the mail
 */
export async function postMail(tx: Executor, jobs: JobQueue, { organisationId, kind, to, subject, text, entity, entityId, by, attachment, at }: Posted): Promise<string> {
  const id = newId(at.getTime());
  await insertMail(tx, {
    organisationId,
    id,
    kind,
    toAddress: to,
    subject,
    body: text ?? null,
    entity,
    entityId,
    postedBy: by ?? null,
    attachmentKey: attachment?.key ?? null,
    attachmentName: attachment?.name ?? null,
    createdAt: at,
  });
  await jobs.send(tx, 'send-mail', { organisationId, mailId: id });
  return id;
}
