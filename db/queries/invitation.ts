import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { invitation, person, site } from '@/db/schema';

interface Key {
  organisationId: string;
  invitationId: string;
}

const isOpen = and(isNull(invitation.acceptedAt), isNull(invitation.withdrawnAt));

const columns = {
  id: invitation.id,
  email: invitation.email,
  roles: invitation.roles,
  siteName: site.name,
  expiresAt: invitation.expiresAt,
  invitedBy: person.name,
  createdAt: invitation.createdAt,
};

const selectInvitations = (db: Executor) =>
  db
    .select(columns)
    .from(invitation)
    .innerJoin(person, eq(person.id, invitation.invitedBy))
    .leftJoin(site, and(eq(site.organisationId, invitation.organisationId), eq(site.id, invitation.siteId)));

/** Those neither accepted nor withdrawn, expired ones included. */
export const listOpenInvitations = (db: Executor, { organisationId }: { organisationId: string }) =>
  selectInvitations(db).where(and(eq(invitation.organisationId, organisationId), isOpen)).orderBy(asc(invitation.createdAt), asc(invitation.id));

export async function findOpenInvitationById(db: Executor, { organisationId, invitationId }: Key) {
  const [row] = await selectInvitations(db).where(and(eq(invitation.organisationId, organisationId), eq(invitation.id, invitationId), isOpen));
  return row;
}

/** False when the address has an open invitation already. */
export async function insertInvitation(db: Executor, values: typeof invitation.$inferInsert): Promise<boolean> {
  const rows = await db
    .insert(invitation)
    .values(values)
    .onConflictDoNothing({ target: [invitation.organisationId, invitation.email] })
    .returning({ id: invitation.id });
  return rows.length > 0;
}

export async function updateOpenInvitation(
  db: Executor,
  { organisationId, invitationId }: Key,
  set: Partial<Pick<typeof invitation.$inferInsert, 'tokenHash' | 'expiresAt' | 'withdrawnAt' | 'email'>>,
): Promise<boolean> {
  const rows = await db
    .update(invitation)
    .set(set)
    .where(and(eq(invitation.organisationId, organisationId), eq(invitation.id, invitationId), isOpen))
    .returning({ id: invitation.id });
  return rows.length > 0;
}

/** @returns false when it is not open, or has this token already */
export async function setInvitationToken(db: Executor, { organisationId, invitationId, tokenHash }: Key & { tokenHash: string }): Promise<boolean> {
  const rows = await db
    .update(invitation)
    .set({ tokenHash })
    .where(and(eq(invitation.organisationId, organisationId), eq(invitation.id, invitationId), isOpen, sql`${invitation.tokenHash} is distinct from ${tokenHash}`))
    .returning({ id: invitation.id });
  return rows.length > 0;
}
