import type { Transaction } from '@/db/connect';
import { lockWatch, type WatchRow } from '@/db/queries/watch';
import { conflict, notFound } from '@/lib/errors';

/** A watch of a case, locked. The case is locked before it. */
export async function lockWatchOf(tx: Transaction, of: { organisationId: string; caseId: string; watchId: string }): Promise<WatchRow> {
  const row = await lockWatch(tx, of);
  if (!row || row.caseId !== of.caseId) throw notFound('watch');
  return row;
}

export function refuseEnded({ endedAt }: Pick<WatchRow, 'endedAt'>): void {
  if (endedAt) throw conflict('This watch has ended. Nothing is read into it any more.');
}
