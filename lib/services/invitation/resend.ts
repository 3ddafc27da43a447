import { findOpenInvitationById, updateOpenInvitation } from '@/db/queries/invitation';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { invitationInput } from '@/lib/schemas/person';
import { defineWrite } from '../define';
import { invitationExpiry } from './expiry';
import { postInvitation } from './mail';

/** Sends an invitation again with a new link for another seven days; the one sent before stops working at once. */
export const resendInvitation = defineWrite({
  name: 'resend.invitation',
  doing: 'invite people',
  roles: PERMITTED['people.manage'],
  input: invitationInput,
  run: async ({ tx, ctx, input: { invitationId }, audit }) => {
    const key = { organisationId: ctx.organisation.id, invitationId };
    const expiresAt = invitationExpiry(ctx.now());
    if (!(await updateOpenInvitation(tx, key, { tokenHash: null, expiresAt }))) throw notFound('invitation');
    const email = (await findOpenInvitationById(tx, key))?.email;
    if (!email) throw notFound('invitation');
    await postInvitation(tx, ctx.jobs, { organisation: ctx.organisation, invitationId, email, by: ctx.person.id, at: ctx.now() });
    audit({ entity: 'invitation', entityId: invitationId, changed: { expiresAt } });
  },
});
