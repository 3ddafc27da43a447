import { and, desc, eq } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { person, removal } from '@/db/schema';

/** Nothing that a case may cite is deleted: a row here says who hid or showed it, when and why. */
export async function insertRemoval(db: Executor, row: typeof removal.$inferInsert): Promise<void> {
  await db.insert(removal).values(row);
}

/** The last thing that was said about hiding it. */
export async function selectLastRemoval(db: Executor, { organisationId, entity, entityId }: { organisationId: string; entity: string; entityId: string }) {
  const [row] = await db
    .select({ kind: removal.kind, reason: removal.reason, by: person.name, at: removal.at })
    .from(removal)
    .innerJoin(person, eq(person.id, removal.personId))
    .where(and(eq(removal.organisationId, organisationId), eq(removal.entity, entity), eq(removal.entityId, entityId)))
    .orderBy(desc(removal.at), desc(removal.id))
    .limit(1);
  return row;
}
