import { sql, type SQL } from 'drizzle-orm';
import type { Executor } from '@/db/connect';

/** The owner's functions (drizzle/0002_before_sign_in.sql): what is read and written before anybody is signed in. */

async function rowsOf<Row extends object>(db: Executor, query: SQL): Promise<Row[]> {
  const { rows } = await db.execute(query);
  return rows as Row[];
}

export interface SignIn {
  personId: string;
  passwordHash: string;
  sessionVersion: number;
}

export async function findSignIn(db: Executor, email: string): Promise<SignIn | undefined> {
  const [row] = await rowsOf<SignIn>(
    db,
    sql`select person_id as "personId", password_hash as "passwordHash", session_version as "sessionVersion" from find_sign_in(${email})`,
  );
  return row;
}

export interface Standing {
  email: string;
  name: string;
  sessionVersion: number;
  unitPreferences: Record<string, string> | null;
  organisationName: string;
  country: string;
  currency: string;
  roles: string[];
  mayRelease: boolean;
  siteId: string | null;
}

export async function findStanding(
  db: Executor,
  { organisationId, personId }: { organisationId: string; personId: string },
): Promise<Standing | undefined> {
  const [row] = await rowsOf<Standing>(
    db,
    sql`select email, name, session_version as "sessionVersion", unit_preferences as "unitPreferences",
          organisation_name as "organisationName", country, currency, roles, may_release as "mayRelease", site_id as "siteId"
        from standing(${personId}, ${organisationId})`,
  );
  return row;
}

export const organisationsOf = (db: Executor, personId: string) =>
  rowsOf<{ id: string; name: string }>(db, sql`select id, name from organisations_of(${personId})`);

export async function raiseSessionVersion(db: Executor, personId: string): Promise<boolean> {
  const [row] = await rowsOf<{ raised: boolean }>(db, sql`select raise_session_version(${personId}) as raised`);
  return row?.raised ?? false;
}

export interface OpenInvitation {
  organisationName: string;
  email: string;
  roles: string[];
  hasSignIn: boolean;
}

export async function findOpenInvitation(
  db: Executor,
  { tokenHash, now }: { tokenHash: string; now: Date },
): Promise<OpenInvitation | undefined> {
  const [row] = await rowsOf<OpenInvitation>(
    db,
    sql`select organisation_name as "organisationName", email, roles, has_sign_in as "hasSignIn"
        from open_invitation(${tokenHash}, ${now.toISOString()})`,
  );
  return row;
}

export interface AcceptedInvitation {
  organisationId: string;
  invitationId: string;
  personId: string;
  roles: string[];
}

export async function acceptInvitation(
  db: Executor,
  given: { tokenHash: string; now: Date; newPersonId: string; name: string | null; passwordHash: string | null },
): Promise<AcceptedInvitation | undefined> {
  const [row] = await rowsOf<AcceptedInvitation>(
    db,
    sql`select organisation_id as "organisationId", invitation_id as "invitationId", person_id as "personId", roles
        from accept_invitation(${given.tokenHash}, ${given.now.toISOString()}, ${given.newPersonId}, ${given.name}, ${given.passwordHash})`,
  );
  return row;
}

export async function startPasswordReset(
  db: Executor,
  given: { id: string; email: string; tokenHash: string; now: Date; expiresAt: Date },
): Promise<{ name: string } | undefined> {
  const [row] = await rowsOf<{ name: string }>(
    db,
    sql`select name from start_password_reset(${given.id}, ${given.email}, ${given.tokenHash}, ${given.now.toISOString()}, ${given.expiresAt.toISOString()})`,
  );
  return row;
}

export async function isPasswordResetOpen(db: Executor, { tokenHash, now }: { tokenHash: string; now: Date }): Promise<boolean> {
  const [row] = await rowsOf<{ open: boolean }>(db, sql`select password_reset_is_open(${tokenHash}, ${now.toISOString()}) as open`);
  return row?.open ?? false;
}

export async function usePasswordReset(
  db: Executor,
  { tokenHash, now, passwordHash }: { tokenHash: string; now: Date; passwordHash: string },
): Promise<{ personId: string } | undefined> {
  const [row] = await rowsOf<{ personId: string }>(
    db,
    sql`select person_id as "personId" from use_password_reset(${tokenHash}, ${now.toISOString()}, ${passwordHash})`,
  );
  return row;
}

export async function sweepPasswordResets(db: Executor, before: Date): Promise<number> {
  const [row] = await rowsOf<{ gone: string }>(db, sql`select sweep_password_resets(${before.toISOString()}) as gone`);
  return Number(row?.gone ?? 0);
}
