import { insertCaseEvent, lockCase, updateCase } from '@/db/queries/case';
import { selectWatchUnderWay } from '@/db/queries/watch';
import { PERMITTED } from '@/lib/auth/permissions';
import { conflict, notFound } from '@/lib/errors';
import { reopenCaseInput } from '@/lib/schemas/case';
import { defineWrite } from '../define';
import { refuseOldVersion } from '../editing';

/** Takes the call back: the case can be answered again. The call and why it was taken back stay in the history. */
export const reopenCase = defineWrite({
  name: 'reopen.case',
  doing: 'reopen cases',
  roles: PERMITTED['case.work'],
  input: reopenCaseInput,
  run: async ({ tx, ctx, input, audit }) => {
    const of = { organisationId: ctx.organisation.id, caseId: input.caseId };
    const row = await lockCase(tx, of);
    if (!row) throw notFound('case');
    refuseOldVersion(row.version, { decidedOn: input.version, what: 'case' });
    if (row.status === 'open') throw conflict('This case is open.');
    if (await selectWatchUnderWay(tx, of)) throw conflict('This case is being watched. End the watch first, and say why.');
    const at = ctx.now();
    const written = await insertCaseEvent(tx, { ...of, id: input.id, kind: 'reopened', reason: input.reason, personId: ctx.person.id, at });
    if (!written) throw conflict('This id belongs to something else.');
    await updateCase(tx, of, { status: 'open', closedAt: null });
    audit({ entity: 'case', entityId: of.caseId, changed: { status: 'open', reason: input.reason } });
    return { id: of.caseId };
  },
});
