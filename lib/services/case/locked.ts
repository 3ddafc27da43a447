import type { Transaction } from '@/db/connect';
import { lockCase } from '@/db/queries/case';
import type { CompiledRulebook } from '@/lib/diagnose';
import { notFound } from '@/lib/errors';
import { compiledEdition } from '../edition/compiled';

export type LockedCase = NonNullable<Awaited<ReturnType<typeof lockCase>>>;

/**
 * A case, locked, with its rulebook.
 *
 * @throws AppError "not-found"
 */
export async function lockCaseOf(tx: Transaction, of: { organisationId: string; caseId: string }): Promise<{ head: LockedCase; compiled: CompiledRulebook }> {
  const head = await lockCase(tx, of);
  if (!head) throw notFound('case');
  return { head, compiled: await compiledEdition(tx, { ...of, editionId: head.editionId }) };
}
