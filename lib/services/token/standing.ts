import { asTenant, type Database } from '@/db/connect';
import { findApiToken, noteTokenUse } from '@/db/queries/api-token';
import { isScope, type Scope } from '@/lib/auth/scopes';
import { hashToken } from '@/lib/auth/token';
import { standingOf, type Standing } from '../session/standing';

const A_MINUTE_MS = 60_000;

export type TokenStanding = { works: true; standing: Standing; scopes: readonly Scope[] } | { works: false; why: 'unknown' | 'revoked' | 'expired' | 'left' };

/** What a request with a token stands on: its person as he or she is now, and what the token lets be done. */
export async function standingOfToken(db: Database, { token, now }: { token: string; now: Date }): Promise<TokenStanding> {
  const found = await findApiToken(db, hashToken(token));
  if (!found) return { works: false, why: 'unknown' };
  if (found.revokedAt) return { works: false, why: 'revoked' };
  if (found.expiresAt <= now) return { works: false, why: 'expired' };
  const { organisationId, personId } = found;
  const standing = await standingOf(db, { organisationId, personId });
  if (!standing) return { works: false, why: 'left' };
  await noteUse(db, { ...found, now });
  return { works: true, standing, scopes: found.scopes.filter(isScope) };
}

/** Once a minute is enough to tell a token that is used from one that is forgotten. */
async function noteUse(db: Database, { organisationId, personId, id, lastUsedAt, now }: { organisationId: string; personId: string; id: string; lastUsedAt: Date | null; now: Date }): Promise<void> {
  const unlessSince = new Date(now.getTime() - A_MINUTE_MS);
  if (lastUsedAt && lastUsedAt > unlessSince) return;
  await asTenant(db, { organisationId, personId }, (tx) => noteTokenUse(tx, { organisationId, tokenId: id, at: now, unlessSince }));
}
