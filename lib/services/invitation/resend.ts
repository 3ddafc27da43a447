import { updateOpenInvitation } from '@/db/queries/invitation';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { invitationInput } from '@/lib/schemas/person';
import { defineWrite } from '../define';
import { invitationExpiry } from './expiry';

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
    await ctx.jobs.send(tx, 'mail-invitation', key);
    audit({ entity: 'invitation', entityId: invitationId, changed: { expiresAt } });
  },
});
