import { z } from 'zod';
import { listMembers } from '@/db/queries/membership';
import { PERMITTED } from '@/lib/auth/permissions';
import { hasAnyRole, isRole } from '@/lib/auth/roles';
import { defineRead } from '../define';

type Member = Awaited<ReturnType<typeof listMembers>>[number];

export const canBeGiven = ({ endedAt, roles }: Pick<Member, 'endedAt' | 'roles'>) => !endedAt && hasAnyRole(roles.filter(isRole), PERMITTED['case.work']);

/** Those who can be given a case: whoever works on cases and has not left. */
export const listAssignable = defineRead({
  name: 'list.assignable',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: z.object({}),
  run: async ({ tx, ctx }) =>
    (await listMembers(tx, { organisationId: ctx.organisation.id }))
      .filter(canBeGiven)
      .map(({ personId, name }) => ({ id: personId, name })),
});
