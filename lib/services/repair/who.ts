import type { Transaction } from '@/db/connect';
import { findMember } from '@/db/queries/membership';
import { invalid } from '@/lib/errors';
import { canBeGiven } from '../case/assignable';
import type { Ctx } from '../context';
import { notify } from '../notice/notify';

/** Throws unless work can be given to this person; nobody is fine. */
export async function refuseStranger(tx: Transaction, { organisationId, assignedTo }: { organisationId: string; assignedTo: string | null }): Promise<void> {
  if (assignedTo === null) return;
  const member = await findMember(tx, { organisationId, personId: assignedTo });
  if (!member || !canBeGiven(member)) throw invalid({ assignedTo: 'Choose somebody of your organisation who works on cases.' });
}

/** Tells whom a repair was given to. A repair that goes back to somebody who had it before is news again. */
export const tellOfRepair = (tx: Transaction, ctx: Ctx, { caseId, repairId, assignedTo, remedy }: { caseId: string; repairId: string; assignedTo: string | null; remedy: string }): Promise<void> =>
  notify(tx, ctx, { organisationId: ctx.organisation.id, personId: assignedTo, kind: 'repair-assigned', caseId, key: `${repairId} ${ctx.now().toISOString()}`, about: { by: ctx.person.id, what: remedy } });
