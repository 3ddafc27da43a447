import { and, asc, eq } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { site } from '@/db/schema';

interface Key {
  organisationId: string;
  siteId: string;
}

const columns = { id: site.id, name: site.name, timeZone: site.timeZone };

export const listSites = (db: Executor, { organisationId }: { organisationId: string }) =>
  db.select(columns).from(site).where(eq(site.organisationId, organisationId)).orderBy(asc(site.name), asc(site.id));

export async function findSite(db: Executor, { organisationId, siteId }: Key) {
  const [row] = await db.select(columns).from(site).where(and(eq(site.organisationId, organisationId), eq(site.id, siteId)));
  return row;
}

/** The same, locked against another change. */
export async function lockSite(db: Executor, { organisationId, siteId }: Key) {
  const [row] = await db.select(columns).from(site).where(and(eq(site.organisationId, organisationId), eq(site.id, siteId))).for('update');
  return row;
}

export async function insertSite(db: Executor, values: { organisationId: string; id: string; name: string; timeZone: string }): Promise<void> {
  await db.insert(site).values(values);
}

export async function updateSite(db: Executor, { organisationId, siteId }: Key, set: { name: string; timeZone: string }): Promise<boolean> {
  const rows = await db
    .update(site)
    .set(set)
    .where(and(eq(site.organisationId, organisationId), eq(site.id, siteId)))
    .returning({ id: site.id });
  return rows.length > 0;
}
