import { lockCase } from '@/db/queries/case';
import { lockCatch, type OilCatch } from '@/db/queries/oil-catch';
import type { CompiledRulebook } from '@/lib/diagnose';
import { conflict, notFound } from '@/lib/errors';
import type { Transaction } from '@/db/connect';
import { compiledEdition } from '../edition/compiled';

type Head = NonNullable<Awaited<ReturnType<typeof lockCase>>>;

/** The case that oil is caught for, locked, with its rulebook. */
export async function lockCaseOf(tx: Transaction, of: { organisationId: string; caseId: string }): Promise<{ head: Head; compiled: CompiledRulebook }> {
  const head = await lockCase(tx, of);
  if (!head) throw notFound('case');
  return { head, compiled: await compiledEdition(tx, { ...of, editionId: head.editionId }) };
}

export function refuseCalled({ status }: Pick<Head, 'status'>): void {
  if (status !== 'open') throw conflict('This case has been called. Reopen it to go on.');
}

/** A catch of a case, locked. */
export async function lockCatchOf(tx: Transaction, { organisationId, caseId, catchId }: { organisationId: string; caseId: string; catchId: string }): Promise<OilCatch> {
  const row = await lockCatch(tx, { organisationId, catchId });
  if (!row || row.caseId !== caseId) throw notFound('catch');
  return row;
}

export function refuseEnded({ endedAt }: Pick<OilCatch, 'endedAt'>): void {
  if (endedAt) throw conflict('The bottle was taken down already. Begin anew from a clean start.');
}
