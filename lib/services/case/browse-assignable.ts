import { listMembers } from '@/db/queries/membership';
import { PERMITTED } from '@/lib/auth/permissions';
import { browseInput, pageOf } from '@/lib/schemas/browse';
import { defineRead } from '../define';
import { canBeGiven } from './assignable';

/** Those who can be given a case, one page after another, by name. */
export const browseAssignable = defineRead({
  name: 'browse.assignable',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: browseInput,
  run: async ({ tx, ctx, input }) => {
    const people = (await listMembers(tx, { organisationId: ctx.organisation.id })).filter(canBeGiven).map(({ personId, name }) => ({ id: personId, name }));
    const { rows, next } = pageOf(people, { ...input, keysOf: ({ name, id }) => [name, id] });
    return { people: rows, next };
  },
});
