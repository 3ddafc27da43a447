import { eq } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { person } from '@/db/schema';

interface Key {
  personId: string;
}

export async function findPerson(db: Executor, { personId }: Key) {
  const [row] = await db
    .select({ id: person.id, name: person.name, email: person.email, unitPreferences: person.unitPreferences })
    .from(person)
    .where(eq(person.id, personId));
  return row;
}

/** Changes the person signed in; row-level security lets no other row through. Whether there was one. */
export async function updatePerson(
  db: Executor,
  { personId }: Key,
  set: { name?: string; unitPreferences?: Record<string, string>; passwordHash?: string },
): Promise<boolean> {
  const rows = await db.update(person).set(set).where(eq(person.id, personId)).returning({ id: person.id });
  return rows.length > 0;
}
