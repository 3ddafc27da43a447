import { and, asc, eq } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { savedView } from '@/db/schema';
import { naturally } from './natural';

interface Owner {
  organisationId: string;
  personId: string;
}

const ofOwner = ({ organisationId, personId }: Owner) => and(eq(savedView.organisationId, organisationId), eq(savedView.personId, personId));
const thisOne = ({ id, ...owner }: Owner & { id: string }) => and(ofOwner(owner), eq(savedView.id, id));

/** The views of one person; nobody else sees them. */
export async function selectSavedViews(db: Executor, { list, ...owner }: Owner & { list: string }) {
  return db
    .select({ id: savedView.id, name: savedView.name, query: savedView.query })
    .from(savedView)
    .where(and(ofOwner(owner), eq(savedView.list, list)))
    .orderBy(asc(naturally(savedView.name)), asc(savedView.id));
}

export async function findSavedView(db: Executor, key: Owner & { id: string }) {
  const [row] = await db.select({ id: savedView.id, list: savedView.list, name: savedView.name, query: savedView.query }).from(savedView).where(thisOne(key));
  return row;
}

/** Whether it was written: not when its id or its name is taken. */
export async function insertSavedView(db: Executor, row: typeof savedView.$inferInsert): Promise<boolean> {
  const inserted = await db.insert(savedView).values(row).onConflictDoNothing().returning({ id: savedView.id });
  return inserted.length > 0;
}

export async function renameSavedView(db: Executor, { name, ...key }: Owner & { id: string; name: string }): Promise<void> {
  await db.update(savedView).set({ name }).where(thisOne(key));
}

export async function deleteSavedView(db: Executor, key: Owner & { id: string }): Promise<boolean> {
  const gone = await db.delete(savedView).where(thisOne(key)).returning({ id: savedView.id });
  return gone.length > 0;
}
