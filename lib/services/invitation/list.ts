import { z } from 'zod';
import { listOpenInvitations } from '@/db/queries/invitation';
import { PERMITTED } from '@/lib/auth/permissions';
import { defineRead } from '../define';

/** The invitations that wait for an answer, expired ones included. */
export const listInvitations = defineRead({
  name: 'list.invitation',
  doing: 'see invitations',
  roles: PERMITTED['people.manage'],
  input: z.object({}),
  run: async ({ tx, ctx }) => {
    const rows = await listOpenInvitations(tx, { organisationId: ctx.organisation.id });
    return rows.map((row) => ({ ...row, hasExpired: row.expiresAt <= ctx.now() }));
  },
});
