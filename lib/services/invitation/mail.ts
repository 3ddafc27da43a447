import { asTenant } from '@/db/connect';
import { insertAudit } from '@/db/queries/audit';
import { findOpenInvitationById, updateOpenInvitation } from '@/db/queries/invitation';
import { findOrganisation } from '@/db/queries/organisation';
import { hashToken, newToken } from '@/lib/auth/token';
import type { JobData } from '@/lib/jobs';
import type { Post } from '../password/mail-reset';

/**
 * Makes the link of an invitation and mails it. Tried again, it makes another link, so that a mail which went out
 * although the server reported an error holds a dead one.
 */
export async function mailInvitation({ db, mailer, now, baseUrl }: Post, { organisationId, invitationId }: JobData['mail-invitation']): Promise<void> {
  const token = newToken();
  const open = await asTenant(db, { organisationId }, async (tx) => {
    const invitation = await findOpenInvitationById(tx, { organisationId, invitationId });
    const organisation = await findOrganisation(tx, { organisationId });
    if (!invitation?.email || !organisation || invitation.expiresAt <= now()) return undefined;
    await updateOpenInvitation(tx, { organisationId, invitationId }, { tokenHash: hashToken(token) });
    await insertAudit(tx, [{ organisationId, action: 'mail.invitation', entity: 'invitation', entityId: invitationId, changed: { link: 'made' }, at: now() }]);
    return { to: invitation.email, invitedBy: invitation.invitedBy, organisation: organisation.name };
  });
  // Withdrawn or accepted in the meantime: there is nothing left to send.
  if (!open) return;
  await mailer.send({
    to: open.to,
    subject: `${open.organisation} invites you to Carryover`,
    text: `Hello,

${open.invitedBy} invites you to work with ${open.organisation} in Carryover, where compressor cases are worked on. Begin here within seven days:

${new URL(`/invite/${token}`, baseUrl).href}

The link works once. If you did not expect it, do nothing.
`,
  });
}
