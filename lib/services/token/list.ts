import { z } from 'zod';
import { selectApiTokens } from '@/db/queries/api-token';
import { PERMITTED } from '@/lib/auth/permissions';
import { isScope } from '@/lib/auth/scopes';
import { defineRead } from '../define';

/** One's own tokens, those that don't work any more included. */
export const listTokens = defineRead({
  name: 'list.api-token',
  doing: 'see your tokens',
  roles: PERMITTED['own-settings'],
  input: z.object({}),
  run: async ({ tx, ctx }) => {
    const now = ctx.now();
    const rows = await selectApiTokens(tx, { organisationId: ctx.organisation.id, personId: ctx.person.id });
    return rows.map(({ revokedAt, ...row }) => ({
      ...row,
      scopes: row.scopes.filter(isScope),
      state: revokedAt ? ('revoked' as const) : row.expiresAt <= now ? ('expired' as const) : ('works' as const),
    }));
  },
});
export type TokenRow = Awaited<ReturnType<typeof listTokens>>[number];
