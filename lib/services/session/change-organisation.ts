import { organisationsOf } from '@/db/queries/sign-in';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { changeOrganisationOfSessionInput } from '@/lib/schemas/person';
import { defineRead } from '../define';

/** Says whether one may go on in another organisation: only where one works. Nothing is written but the cookie. */
export const changeOrganisationOfSession = defineRead({
  name: 'change-organisation.session',
  doing: 'go on in another organisation',
  roles: PERMITTED['own-settings'],
  input: changeOrganisationOfSessionInput,
  run: async ({ tx, ctx, input: { organisationId } }) => {
    const mine = await organisationsOf(tx, ctx.person.id);
    if (!mine.some(({ id }) => id === organisationId)) throw notFound('organisation');
    return { organisationId };
  },
});
