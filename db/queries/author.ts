import { sql, type AnyColumn } from 'drizzle-orm';
import { person } from '@/db/schema';

/** Who did something: the person, or the name that somebody without a sign-in gave. With `person` joined from the left. */
export const authorName = (byName: AnyColumn) => sql<string>`coalesce(${person.name}, ${byName})`;
