import { and, eq, sql } from 'drizzle-orm';
import type { Executor } from '@/db/connect';
import { idempotentAnswer } from '@/db/schema';

interface Key {
  organisationId: string;
  personId: string;
  key: string;
}

/** Makes a request with the same key wait until this transaction ends. */
export async function lockIdempotencyKey(db: Executor, { organisationId, personId, key }: Key): Promise<void> {
  await db.execute(sql`select pg_advisory_xact_lock(hashtextextended(${`${organisationId}/${personId}/${key}`}, 0))`);
}

export async function selectIdempotentAnswer(db: Executor, { organisationId, personId, key }: Key) {
  const [row] = await db
    .select({ requestHash: idempotentAnswer.requestHash, status: idempotentAnswer.status, result: idempotentAnswer.result })
    .from(idempotentAnswer)
    .where(and(eq(idempotentAnswer.organisationId, organisationId), eq(idempotentAnswer.personId, personId), eq(idempotentAnswer.key, key)));
  return row;
}

export async function insertIdempotentAnswer(db: Executor, row: typeof idempotentAnswer.$inferInsert): Promise<void> {
  await db.insert(idempotentAnswer).values(row);
}

/** Of every organisation (drizzle/0006). */
export async function sweepIdempotentAnswers(db: Executor, before: Date): Promise<void> {
  await db.execute(sql`select sweep_idempotent_answers(${before.toISOString()})`);
}
