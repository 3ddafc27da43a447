import { and, eq, lt, sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { attempt } from '@/db/schema';

/** Counts one more try and says how many there are in the window. */
export async function countAttempt(db: Executor, { key, windowStart }: { key: string; windowStart: Date }): Promise<number> {
  const [row] = await db
    .insert(attempt)
    .values({ key, windowStart, count: 1 })
    .onConflictDoUpdate({ target: [attempt.key, attempt.windowStart], set: { count: sql`${attempt.count} + 1` } })
    .returning({ count: attempt.count });
  return row?.count ?? 0;
}

export async function forgetAttempts(db: Executor, { key, windowStart }: { key: string; windowStart: Date }): Promise<void> {
  await db.delete(attempt).where(and(eq(attempt.key, key), eq(attempt.windowStart, windowStart)));
}

export async function sweepAttempts(db: Executor, before: Date): Promise<void> {
  await db.delete(attempt).where(lt(attempt.windowStart, before));
}
