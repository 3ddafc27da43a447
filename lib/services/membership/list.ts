import { z } from 'zod';
import { listMembers } from '@/db/queries/membership';
import { PERMITTED } from '@/lib/auth/permissions';
import { defineRead } from '../define';

/** Everybody who works or worked here, with roles. */
export const listPeople = defineRead({
  name: 'list.membership',
  doing: 'see the list of people',
  roles: PERMITTED['people.manage'],
  input: z.object({}),
  run: ({ tx, ctx }) => listMembers(tx, { organisationId: ctx.organisation.id }),
});
