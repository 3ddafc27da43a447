import { and, asc, eq, isNull, sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { membership, person, site } from '@/db/schema';

interface Key {
  organisationId: string;
  personId: string;
}

const columns = {
  personId: membership.personId,
  name: person.name,
  email: person.email,
  roles: membership.roles,
  siteId: membership.siteId,
  siteName: site.name,
  mayRelease: membership.mayRelease,
  releaseBasis: membership.releaseBasis,
  endedAt: membership.endedAt,
  createdAt: membership.createdAt,
};

const selectMembers = (db: Executor) =>
  db
    .select(columns)
    .from(membership)
    .innerJoin(person, eq(person.id, membership.personId))
    .leftJoin(site, and(eq(site.organisationId, membership.organisationId), eq(site.id, membership.siteId)));

/** Everybody who works or worked here; those who left come last. */
export const listMembers = (db: Executor, { organisationId }: { organisationId: string }) =>
  selectMembers(db)
    .where(eq(membership.organisationId, organisationId))
    .orderBy(sql`${membership.endedAt} is not null`, asc(person.name), asc(person.id));

export async function findMember(db: Executor, { organisationId, personId }: Key) {
  const [row] = await selectMembers(db).where(and(eq(membership.organisationId, organisationId), eq(membership.personId, personId)));
  return row;
}

export async function findCurrentMemberByEmail(db: Executor, { organisationId, email }: { organisationId: string; email: string }) {
  const [row] = await selectMembers(db).where(
    and(eq(membership.organisationId, organisationId), eq(person.email, email), isNull(membership.endedAt)),
  );
  return row;
}

export async function updateMember(
  db: Executor,
  { organisationId, personId }: Key,
  set: Partial<Pick<typeof membership.$inferInsert, 'roles' | 'siteId' | 'mayRelease' | 'releaseBasis' | 'endedAt'>>,
): Promise<boolean> {
  const rows = await db
    .update(membership)
    .set(set)
    .where(and(eq(membership.organisationId, organisationId), eq(membership.personId, personId), isNull(membership.endedAt)))
    .returning({ personId: membership.personId });
  return rows.length > 0;
}

/** The current administrators, locked: two of them taking each other's role away must not both succeed. */
export async function lockAdministrators(db: Executor, { organisationId }: { organisationId: string }): Promise<string[]> {
  const rows = await db
    .select({ personId: membership.personId })
    .from(membership)
    .where(and(eq(membership.organisationId, organisationId), isNull(membership.endedAt), sql`'administrator' = any(${membership.roles})`))
    .orderBy(membership.personId)
    .for('update');
  return rows.map((row) => row.personId);
}
