import type { Transaction } from '@/db/connect';
import { lockRepair } from '@/db/queries/repair';
import type { CompiledRulebook } from '@/lib/diagnose';
import type { Remedy } from '@/lib/diagnose/types';
import { conflict, notFound } from '@/lib/errors';
import { lockCaseOf, type LockedCase } from '../case/locked';

interface Of {
  organisationId: string;
  caseId: string;
}

type Row = NonNullable<Awaited<ReturnType<typeof lockRepair>>>;

/** A repair of a case that is still at hand, locked, with its remedy. */
export async function lockRepairOf(tx: Transaction, of: Of & { repairId: string }): Promise<{ head: LockedCase; compiled: CompiledRulebook; row: Row; remedy: Remedy }> {
  const { head, compiled } = await lockCaseOf(tx, of);
  const row = await lockRepair(tx, of);
  const remedy = row?.caseId === of.caseId ? compiled.rulebook.remedies.find(({ id }) => id === row.remedyId) : undefined;
  if (!row || !remedy) throw notFound('repair');
  return { head, compiled, row, remedy };
}

export function refuseEnded({ endedAt }: Pick<Row, 'endedAt'>): void {
  if (endedAt) throw conflict('This repair is finished. Choose it again to go on with it.');
}

/** A case that is closed is over. */
export function refuseClosed({ status }: Pick<LockedCase, 'status'>): void {
  if (status === 'closed') throw conflict('This case is closed. Reopen it to go on.');
}
