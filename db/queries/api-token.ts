import { and, desc, eq, gt, isNull, lt, or, sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { apiToken } from '@/db/schema';

interface Key {
  organisationId: string;
  tokenId: string;
}

interface Instants {
  expiresAt: Date;
  revokedAt: Date | null;
  lastUsedAt: Date | null;
}

export interface FoundToken extends Instants {
  organisationId: string;
  id: string;
  personId: string;
  scopes: string[];
}

/** Whose token it is, before an organisation is set (drizzle/0006): expired and revoked ones too. */
export async function findApiToken(db: Executor, tokenHash: string): Promise<FoundToken | undefined> {
  const { rows } = await db.execute(
    sql`select organisation_id as "organisationId", id, person_id as "personId", scopes,
          expires_at as "expiresAt", revoked_at as "revokedAt", last_used_at as "lastUsedAt"
        from find_api_token(${tokenHash})`,
  );
  // Instants come as text from a statement that Drizzle has no columns of.
  const [row] = rows as unknown as (Omit<FoundToken, keyof Instants> & Record<keyof Instants, string | null>)[];
  const instant = (text: string | null) => (text === null ? null : new Date(text));
  return row && { ...row, expiresAt: new Date(row.expiresAt ?? 0), revokedAt: instant(row.revokedAt), lastUsedAt: instant(row.lastUsedAt) };
}

export async function insertApiToken(db: Executor, row: typeof apiToken.$inferInsert): Promise<void> {
  await db.insert(apiToken).values(row);
}

/** Somebody's own, the newest first; never the hash. */
export const selectApiTokens = (db: Executor, { organisationId, personId }: { organisationId: string; personId: string }) =>
  db
    .select({
      id: apiToken.id,
      name: apiToken.name,
      ending: apiToken.ending,
      scopes: apiToken.scopes,
      createdAt: apiToken.createdAt,
      expiresAt: apiToken.expiresAt,
      lastUsedAt: apiToken.lastUsedAt,
      revokedAt: apiToken.revokedAt,
    })
    .from(apiToken)
    .where(and(eq(apiToken.organisationId, organisationId), eq(apiToken.personId, personId)))
    .orderBy(desc(apiToken.createdAt), desc(apiToken.id));

/** How many of somebody's tokens work. */
export const countLiveTokens = (db: Executor, { organisationId, personId, now }: { organisationId: string; personId: string; now: Date }) =>
  db.$count(
    apiToken,
    and(eq(apiToken.organisationId, organisationId), eq(apiToken.personId, personId), isNull(apiToken.revokedAt), gt(apiToken.expiresAt, now)),
  );

/** Whether there was such a token of this person that wasn't revoked yet. */
export async function revokeApiToken(db: Executor, { organisationId, tokenId, personId, at }: Key & { personId: string; at: Date }): Promise<boolean> {
  const rows = await db
    .update(apiToken)
    .set({ revokedAt: at })
    .where(and(eq(apiToken.organisationId, organisationId), eq(apiToken.id, tokenId), eq(apiToken.personId, personId), isNull(apiToken.revokedAt)))
    .returning({ id: apiToken.id });
  return rows.length > 0;
}

/** Notes that a token was used, unless that was noted after `unlessSince`. */
export async function noteTokenUse(db: Executor, { organisationId, tokenId, at, unlessSince }: Key & { at: Date; unlessSince: Date }): Promise<void> {
  await db
    .update(apiToken)
    .set({ lastUsedAt: at })
    .where(and(eq(apiToken.organisationId, organisationId), eq(apiToken.id, tokenId), or(isNull(apiToken.lastUsedAt), lt(apiToken.lastUsedAt, unlessSince))));
}
