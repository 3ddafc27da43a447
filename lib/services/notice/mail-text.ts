import { asTenant } from '@/db/connect';
import type { MailAtHand } from '@/db/queries/mail';
import { findMember } from '@/db/queries/membership';
import { selectNoticesOfMail } from '@/db/queries/notice';
import type { Post } from '../mail/send';
import { placeOf, sentenceOf } from './sentence';

/** The text of a mail that tells one notice or those of a day; nothing when its reader has left. */
export async function noticesText({ db, baseUrl }: Post, { organisationId, id: mailId, entityId: personId }: MailAtHand): Promise<string | undefined> {
  return asTenant(db, { organisationId }, async (tx) => {
    const member = await findMember(tx, { organisationId, personId });
    const notices = await selectNoticesOfMail(tx, { organisationId, mailId });
    if (!member || member.endedAt || notices.length === 0) return undefined;
    const told = notices.map((one) => `${sentenceOf(one)}\n${new URL(placeOf(one) ?? '/notices', baseUrl).href}`);
    return `Hello ${member.name},

${told.join('\n\n')}

Which of these come by mail, and when, is yours to set: ${new URL('/settings/notices', baseUrl).href}
`;
  });
}
