import type { Transaction } from '@/db/connect';
import { selectPublishedEdition } from '@/db/queries/edition';
import type { Check } from '@/lib/diagnose/types';
import { compiledEdition } from '../edition/compiled';

/** The checks of the edition in force that are measured: those a limit can be adopted for. */
export async function measuredChecks(tx: Transaction, organisationId: string): Promise<Check[]> {
  const edition = await selectPublishedEdition(tx, organisationId);
  if (!edition) return [];
  const { checks } = await compiledEdition(tx, { organisationId, editionId: edition.id });
  return [...checks.values()].map(({ check }) => check).filter(({ kind, fromRecord }) => kind === 'measured' && !fromRecord);
}

/** One of them. */
export async function checkInForce(tx: Transaction, { organisationId, checkId }: { organisationId: string; checkId: string }): Promise<Check | undefined> {
  return (await measuredChecks(tx, organisationId)).find(({ id }) => id === checkId);
}
