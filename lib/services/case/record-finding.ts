import { lockCase } from '@/db/queries/case';
import { selectFindings } from '@/db/queries/finding';
import { PERMITTED } from '@/lib/auth/permissions';
import { buildState } from '@/lib/case/build-state';
import type { Stage } from '@/lib/diagnose/types';
import { conflict, notFound } from '@/lib/errors';
import { recordFindingInput } from '@/lib/schemas/case';
import type { CaseState } from '@/lib/schemas/case-view';
import { defineWrite } from '../define';
import { compiledEdition } from '../edition/compiled';
import { gatherState } from './gather-state';
import { takenId, writeFinding } from './write-finding';

/**
 * Writes the answer to a check and ranks anew. The id is the client's: the same request sent twice writes once and
 * is answered alike. An answer older than the one that stands is kept, but isn't current.
 */
export const recordFinding = defineWrite({
  name: 'record.finding',
  doing: 'answer checks',
  roles: PERMITTED['case.work'],
  input: recordFindingInput,
  run: async ({ tx, ctx, input, audit, unchanged }): Promise<CaseState> => {
    const of = { organisationId: ctx.organisation.id, caseId: input.caseId };
    const head = await lockCase(tx, of);
    if (!head) throw notFound('case');
    const compiled = await compiledEdition(tx, { ...of, editionId: head.editionId });

    const rows = await selectFindings(tx, of);
    const known = rows.find((row) => row.id === input.id);
    if (known) {
      if (known.checkId !== input.checkId) throw takenId();
      unchanged();
      return buildState(await gatherState(tx, ctx, { caseId: of.caseId }));
    }
    refuseOver(head, input.stage);
    return writeFinding({ tx, ctx, audit }, { head, compiled, rows, input });
  },
});

/** A call ends the diagnosis: what is read at a repair, for a release or in a watch goes on until the case is closed. */
function refuseOver({ status }: { status: string }, { kind }: Stage): void {
  if (status === 'closed') throw conflict('This case is closed. Reopen it to go on.');
  if (status !== 'open' && kind === 'diagnosis') throw conflict('This case has been called. Reopen it to go on.');
}
