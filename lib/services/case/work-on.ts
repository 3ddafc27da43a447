import type { Transaction } from '@/db/connect';
import { selectCaseHead } from '@/db/queries/case';
import { selectAcknowledgements } from '@/db/queries/finding';
import { siteDay } from '@/lib/case/site-day';
import { notFound } from '@/lib/errors';
import type { Ctx } from '../context';
import { compiledEdition } from '../edition/compiled';

/**
 * A case with its rulebook and what this person has read of cautions today: all that work on it takes which ranks nothing.
 *
 * @throws AppError "not-found"
 */
export async function workOn(tx: Transaction, ctx: Ctx, caseId: string) {
  const of = { organisationId: ctx.organisation.id, caseId };
  const caseHead = await selectCaseHead(tx, of);
  if (!caseHead) throw notFound('case');
  return {
    caseHead,
    compiled: await compiledEdition(tx, { ...of, editionId: caseHead.editionId }),
    acknowledged: await selectAcknowledgements(tx, { ...of, personId: ctx.person.id, onDay: siteDay(ctx.now(), caseHead.timeZone) }),
  };
}
