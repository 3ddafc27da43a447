import { revokeApiToken } from '@/db/queries/api-token';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { tokenInput } from '@/lib/schemas/token';
import { defineWrite } from '../define';

/** Ends one of one's own tokens at once; it can't be brought back. */
export const revokeToken = defineWrite({
  name: 'revoke.api-token',
  doing: 'revoke tokens',
  roles: PERMITTED['own-settings'],
  input: tokenInput,
  run: async ({ tx, ctx, input: { tokenId }, audit }) => {
    const revoked = await revokeApiToken(tx, { organisationId: ctx.organisation.id, tokenId, personId: ctx.person.id, at: ctx.now() });
    if (!revoked) throw notFound('token');
    audit({ entity: 'api-token', entityId: tokenId, changed: { revoked: true } });
    return { id: tokenId };
  },
});
