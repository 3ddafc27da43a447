import type { Transaction } from '@/db/connect';
import { findMember } from '@/db/queries/membership';
import { invalid } from '@/lib/errors';
import { canBeGiven } from '../case/assignable';

/** Throws unless work can be given to this person; nobody is fine. */
export async function refuseStranger(tx: Transaction, { organisationId, assignedTo }: { organisationId: string; assignedTo: string | null }): Promise<void> {
  if (assignedTo === null) return;
  const member = await findMember(tx, { organisationId, personId: assignedTo });
  if (!member || !canBeGiven(member)) throw invalid({ assignedTo: 'Choose somebody of your organisation who works on cases.' });
}
