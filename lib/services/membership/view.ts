import { findMember } from '@/db/queries/membership';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { memberInput } from '@/lib/schemas/person';
import { defineRead } from '../define';

/** One person's place in the organisation. */
export const viewMember = defineRead({
  name: 'view.membership',
  doing: 'see the roles of people',
  roles: PERMITTED['people.manage'],
  input: memberInput,
  run: async ({ tx, ctx, input: { personId } }) => {
    const member = await findMember(tx, { organisationId: ctx.organisation.id, personId });
    if (!member) throw notFound('person');
    return member;
  },
});
