import { insertInvitation } from '@/db/queries/invitation';
import { findCurrentMemberByEmail } from '@/db/queries/membership';
import { findSite } from '@/db/queries/site';
import { PERMITTED } from '@/lib/auth/permissions';
import { conflict, invalid } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { inviteInput } from '@/lib/schemas/person';
import { defineWrite } from '../define';
import { invitationExpiry } from './expiry';
import { postInvitation } from './mail';

/** Invites an address by mail. Whether it has a sign-in elsewhere makes no difference that shows here. */
export const invite = defineWrite({
  name: 'invite.person',
  doing: 'invite people',
  roles: PERMITTED['people.manage'],
  input: inviteInput,
  run: async ({ tx, ctx, input: { email, roles, siteId }, audit }) => {
    const organisationId = ctx.organisation.id;
    if (siteId && !(await findSite(tx, { organisationId, siteId }))) throw invalid({ siteId: 'Choose a site from the list.' });
    if (await findCurrentMemberByEmail(tx, { organisationId, email })) {
      throw conflict('Somebody with this address works here already.', { email: 'This address is in the list of people.' });
    }
    const id = newId();
    const inserted = await insertInvitation(tx, {
      organisationId,
      id,
      email,
      roles,
      siteId,
      expiresAt: invitationExpiry(ctx.now()),
      invitedBy: ctx.person.id,
      createdAt: ctx.now(),
    });
    if (!inserted) throw conflict('This address has been invited already.', { email: 'Send the invitation again instead; it is in the list.' });
    await postInvitation(tx, ctx.jobs, { organisation: ctx.organisation, invitationId: id, email, by: ctx.person.id, at: ctx.now() });
    audit({ entity: 'invitation', entityId: id, changed: { roles, siteId } });
    return { invitationId: id };
  },
});
