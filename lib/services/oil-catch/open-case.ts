import { lockCatch, type OilCatch } from '@/db/queries/oil-catch';
import { conflict, notFound } from '@/lib/errors';
import type { Transaction } from '@/db/connect';
import type { LockedCase } from '../case/locked';

/** Nothing is weighed into a case that was called. */
export function refuseCalled({ status }: Pick<LockedCase, 'status'>): void {
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
