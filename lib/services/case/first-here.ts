import type { Transaction } from '@/db/connect';
import { findMember } from '@/db/queries/membership';

/** The first of some people who is a member still; null: none is here any more. */
export async function firstHere(tx: Transaction, organisationId: string, people: readonly (string | null)[]) {
  for (const personId of people) {
    const found = personId ? await findMember(tx, { organisationId, personId }) : undefined;
    if (found && !found.endedAt) return found;
  }
  return null;
}
