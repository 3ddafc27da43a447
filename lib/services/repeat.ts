import { createHash } from 'node:crypto';
import type { Transaction } from '@/db/connect';
import { insertIdempotentAnswer, lockIdempotencyKey, selectIdempotentAnswer } from '@/db/queries/idempotent-answer';
import { invalid } from '@/lib/errors';
import type { Ctx } from './context';

/** How a request says that it may be a repeat: its `Idempotency-Key`, and what its answer will be kept with. */
export interface Repeat {
  key: string;
  /** Of the answer when the work is done. */
  status: number;
  /** It is answered from what was kept. */
  onReplay: (status: number) => void;
}

/**
 * Does the work of a write once for its key. What it comes to is kept in the write's own transaction, so that both are
 * there or neither; a request with the same key waits for it, and is then answered from it.
 *
 * @throws AppError "invalid" when the key was used for another request
 */
export async function onceForKey<Result>(tx: Transaction, ctx: Ctx, { name, input }: { name: string; input: unknown }, work: () => Promise<Result>): Promise<Result> {
  const { repeat } = ctx;
  if (!repeat) return work();
  const of = { organisationId: ctx.organisation.id, personId: ctx.person.id, key: repeat.key };
  const requestHash = createHash('sha256').update(JSON.stringify([name, input])).digest('hex');
  await lockIdempotencyKey(tx, of);
  const kept = await selectIdempotentAnswer(tx, of);
  if (kept && kept.requestHash !== requestHash) {
    throw invalid({ 'Idempotency-Key': 'Used before.' }, 'This Idempotency-Key was used for another request within the last day. Give each request a key of its own.');
  }
  if (kept) {
    repeat.onReplay(kept.status);
    // It was this service's result when it was kept; as JSON, which is all that a request with a key is answered in.
    return kept.result as Result;
  }
  const result = await work();
  await insertIdempotentAnswer(tx, { ...of, requestHash, status: repeat.status, result: result ?? {}, at: ctx.now() });
  return result;
}
