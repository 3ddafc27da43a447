import { updateOpenInvitation } from '@/db/queries/invitation';
import { forgetMailAddress } from '@/db/queries/mail';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { invitationInput } from '@/lib/schemas/person';
import { defineWrite } from '../define';

/** Takes an invitation back: its link stops working, and the address is forgotten. */
export const withdrawInvitation = defineWrite({
  name: 'withdraw.invitation',
  doing: 'withdraw invitations',
  roles: PERMITTED['people.manage'],
  input: invitationInput,
  run: async ({ tx, ctx, input: { invitationId }, audit }) => {
    const key = { organisationId: ctx.organisation.id, invitationId };
    const withdrawnAt = ctx.now();
    if (!(await updateOpenInvitation(tx, key, { withdrawnAt, email: null, tokenHash: null }))) throw notFound('invitation');
    await forgetMailAddress(tx, { organisationId: key.organisationId, entity: 'invitation', entityId: invitationId });
    audit({ entity: 'invitation', entityId: invitationId, changed: { withdrawnAt } });
  },
});
