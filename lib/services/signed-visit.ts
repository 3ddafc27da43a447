import { asTenant, type Transaction } from '@/db/connect';
import { AppError } from '@/lib/errors';
import type { Visitor } from './context';
import { tryOrRefuse, type Tried } from './session/tries';

/** A link that leads nowhere is refused with one sentence, whatever the reason. */
export const deadLink = (message: string) => new AppError('not-found', message);

interface Link<Said> {
  token: string;
  /** What a token of ours says; undefined for any other. */
  read: (secret: string, token: string) => Said | undefined;
  limit: Tried;
  notOurs: string;
}

/** Does something with what a signed link says, as the organisation that gave it out, for somebody without a sign-in. */
export async function throughSignedLink<Said extends { organisationId: string }, Result>(
  visitor: Visitor,
  { token, read, limit, notOurs }: Link<Said>,
  work: (tx: Transaction, said: Said) => Promise<Result>,
): Promise<Result> {
  await tryOrRefuse(visitor, limit, visitor.network);
  const said = read(visitor.signingSecret, token);
  if (!said) throw deadLink(notOurs);
  return asTenant(visitor.db, { organisationId: said.organisationId }, (tx) => work(tx, said));
}
