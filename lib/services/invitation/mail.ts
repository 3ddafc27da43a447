import { asTenant, type Transaction } from '@/db/connect';
import { insertAudit } from '@/db/queries/audit';
import { findOpenInvitationById, setInvitationToken } from '@/db/queries/invitation';
import { isMailReplaced, type MailAtHand } from '@/db/queries/mail';
import { findOrganisation } from '@/db/queries/organisation';
import { hashToken, mailedToken } from '@/lib/auth/token';
import type { JobQueue } from '@/lib/jobs';
import type { Post } from '../mail/send';
import { postMail } from '../mail/post';

/** Posts the mail of an invitation. Its text, which holds the link, is made when it is sent. */
export const postInvitation = (
  tx: Transaction,
  jobs: JobQueue,
  { organisation, invitationId, email, by, at }: { organisation: { id: string; name: string }; invitationId: string; email: string; by: string; at: Date },
): Promise<string> =>
  postMail(tx, jobs, {
    organisationId: organisation.id,
    kind: 'invitation',
    to: email,
    subject: `${organisation.name} invites you to Carryover`,
    entity: 'invitation',
    entityId: invitationId,
    by,
    at,
  });

/** The text of a posted invitation; nothing when it was withdrawn, accepted or sent anew in the meantime, or has run out. */
export async function invitationText({ db, now, baseUrl, secret }: Post, mail: MailAtHand): Promise<string | undefined> {
  const { organisationId, entityId: invitationId } = mail;
  const token = mailedToken(secret, 'invitation', mail.id);
  const open = await asTenant(db, { organisationId }, async (tx) => {
    const invitation = await findOpenInvitationById(tx, { organisationId, invitationId });
    const organisation = await findOrganisation(tx, { organisationId });
    if (!invitation || !organisation || invitation.expiresAt <= now() || (await isMailReplaced(tx, mail))) return undefined;
    if (await setInvitationToken(tx, { organisationId, invitationId, tokenHash: hashToken(token) })) {
      await insertAudit(tx, [{ organisationId, action: 'mail.invitation', entity: 'invitation', entityId: invitationId, changed: { link: 'made' }, at: now() }]);
    }
    return { invitedBy: invitation.invitedBy, organisation: organisation.name };
  });
  return (
    open &&
    `Hello,

${open.invitedBy} invites you to work with ${open.organisation} in Carryover, where compressor cases are worked on. Begin here within seven days:

${new URL(`/invite/${token}`, baseUrl).href}

The link works once. If you did not expect it, do nothing.
`
  );
}
