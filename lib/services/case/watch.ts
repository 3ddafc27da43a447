import { selectCaseHead } from '@/db/queries/case';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { readCaseInput } from '@/lib/schemas/case';
import { defineRead } from '../define';

/** Whether somebody may hear of the writes to a case. */
export const watchCase = defineRead({
  name: 'read.case',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: readCaseInput.omit({ at: true }),
  run: async ({ tx, ctx, input }) => {
    const of = { organisationId: ctx.organisation.id, caseId: input.caseId };
    if (!(await selectCaseHead(tx, of))) throw notFound('case');
    return of;
  },
});
