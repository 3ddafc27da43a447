import { countLiveTokens, insertApiToken } from '@/db/queries/api-token';
import { PERMITTED } from '@/lib/auth/permissions';
import { scopesFor } from '@/lib/auth/scopes';
import { hashToken, newPersonalToken } from '@/lib/auth/token';
import { conflict, invalid } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { createTokenInput } from '@/lib/schemas/token';
import { defineWrite } from '../define';

const A_DAY_MS = 86_400_000;
const MOST_LIVE = 50;
const SHOWN_CHARACTERS = 4;

/** Makes a personal token. It is in the answer and nowhere else: what is kept is its hash. */
export const createToken = defineWrite({
  name: 'create.api-token',
  doing: 'make tokens',
  roles: PERMITTED['own-settings'],
  input: createTokenInput,
  run: async ({ tx, ctx, input: { name, scopes, days }, audit }) => {
    const of = { organisationId: ctx.organisation.id, personId: ctx.person.id };
    const useless = scopes.find((scope) => !scopesFor(ctx.roles).includes(scope));
    if (useless) throw invalid({ scopes: `Your role allows nothing of “${useless}”.` });
    const now = ctx.now();
    if ((await countLiveTokens(tx, { ...of, now })) >= MOST_LIVE) throw conflict(`You have ${MOST_LIVE} tokens that work. Revoke one first.`);
    const token = newPersonalToken();
    const id = newId(now.getTime());
    const expiresAt = new Date(now.getTime() + days * A_DAY_MS);
    await insertApiToken(tx, { ...of, id, name, scopes, expiresAt, tokenHash: hashToken(token), ending: token.slice(-SHOWN_CHARACTERS), createdAt: now });
    audit({ entity: 'api-token', entityId: id, changed: { name, scopes, expiresAt } });
    return { id, name, token, expiresAt };
  },
});
