import { updateMember } from '@/db/queries/membership';
import { raiseSessionVersion } from '@/db/queries/sign-in';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { memberInput } from '@/lib/schemas/person';
import { defineWrite } from '../define';
import { keepAnAdministrator } from './keep-an-administrator';

/** Somebody leaves: signed out at once, no way back in. Cases go on naming whoever worked on them. */
export const endMembership = defineWrite({
  name: 'end.membership',
  doing: 'end somebody\'s membership',
  roles: PERMITTED['people.manage'],
  input: memberInput,
  run: async ({ tx, ctx, input: { personId }, audit }) => {
    const key = { organisationId: ctx.organisation.id, personId };
    await keepAnAdministrator(tx, { organisationId: key.organisationId, losing: personId });
    const endedAt = ctx.now();
    if (!(await updateMember(tx, key, { endedAt, mayRelease: false, releaseBasis: null }))) throw notFound('person');
    await raiseSessionVersion(tx, personId);
    audit({ entity: 'membership', entityId: personId, changed: { endedAt } });
  },
});
