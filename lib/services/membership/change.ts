import { findMember, updateMember } from '@/db/queries/membership';
import { raiseSessionVersion } from '@/db/queries/sign-in';
import { findSite } from '@/db/queries/site';
import { PERMITTED } from '@/lib/auth/permissions';
import { invalid, notFound } from '@/lib/errors';
import { changeMemberInput } from '@/lib/schemas/person';
import { defineWrite } from '../define';
import { keepAnAdministrator } from './keep-an-administrator';

/** Changes somebody's roles, site and right to release. New rights hold from a new sign-in: every session ends. */
export const changeMember = defineWrite({
  name: 'change.membership',
  doing: 'change what people may do',
  roles: PERMITTED['people.manage'],
  input: changeMemberInput,
  run: async ({ tx, ctx, input: { personId, roles, siteId, mayRelease, releaseBasis }, audit }) => {
    const key = { organisationId: ctx.organisation.id, personId };
    if (!roles.includes('administrator')) await keepAnAdministrator(tx, { organisationId: key.organisationId, losing: personId });
    const before = await findMember(tx, key);
    if (!before || before.endedAt) throw notFound('person');
    if (siteId && !(await findSite(tx, { organisationId: key.organisationId, siteId }))) throw invalid({ siteId: 'Choose a site from the list.' });

    const after = { roles, siteId, mayRelease, releaseBasis: mayRelease ? releaseBasis : null };
    await updateMember(tx, key, after);
    const rightsChanged = before.mayRelease !== mayRelease || before.roles.join() !== roles.join();
    if (rightsChanged) await raiseSessionVersion(tx, personId);
    audit({ entity: 'membership', entityId: personId, changed: after });
    return { signedOut: rightsChanged };
  },
});
