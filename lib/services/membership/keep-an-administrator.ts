import type { Transaction } from '@/db/connect';
import { lockAdministrators } from '@/db/queries/membership';
import { conflict } from '@/lib/errors';

/** An organisation without an administrator could never have one again. */
export async function keepAnAdministrator(tx: Transaction, { organisationId, losing }: { organisationId: string; losing: string }): Promise<void> {
  const administrators = await lockAdministrators(tx, { organisationId });
  if (administrators.includes(losing) && administrators.length === 1) {
    throw conflict('This is the only administrator. Make somebody else one first.', { roles: 'The organisation needs an administrator.' });
  }
}
