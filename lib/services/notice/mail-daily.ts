import { asTenant } from '@/db/connect';
import { insertAudit } from '@/db/queries/audit';
import { findMember } from '@/db/queries/membership';
import { lockNoticesForTheDay, noteNoticeMail } from '@/db/queries/notice';
import { jobs, type JobData } from '@/lib/jobs';
import { postMail } from '../mail/post';
import type { Post } from '../mail/send';

/**
 * Posts the day's mail to one person: what waits for it and was not read meanwhile. Each notice asks for it by a job of its
 * own; the first tells all, the others find nothing. Marks and mail are written together, so that a worker that is killed
 * does both or neither, and two at once tell each notice once.
 */
export async function mailDailyNotices({ db, now }: Pick<Post, 'db' | 'now'>, owner: JobData['mail-daily-notices']): Promise<void> {
  const { organisationId, personId } = owner;
  await asTenant(db, { organisationId }, async (tx) => {
    const waiting = await lockNoticesForTheDay(tx, owner);
    const member = await findMember(tx, owner);
    if (waiting.length === 0 || !member || member.endedAt) return;
    const at = now();
    const subject = waiting.length === 1 ? 'One notice since yesterday' : `${waiting.length} notices since yesterday`;
    const mailId = await postMail(tx, jobs, { organisationId, kind: 'daily-notices', to: member.email, subject, entity: 'person', entityId: personId, at });
    for (const noticeId of waiting) await noteNoticeMail(tx, { organisationId, noticeId, mailId });
    await insertAudit(tx, [{ organisationId, action: 'mail.notice', entity: 'person', entityId: personId, changed: { notices: waiting.length }, at }]);
  });
}
