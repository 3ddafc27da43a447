import { insertCatch, lockCatch } from '@/db/queries/oil-catch';
import { PERMITTED } from '@/lib/auth/permissions';
import { isCaught } from '@/lib/case/weighings';
import { conflict, invalid } from '@/lib/errors';
import { CATCH_MEASURES, startCatchInput } from '@/lib/schemas/oil-catch';
import { lockCaseOf } from '../case/locked';
import { refuseUnread } from '../case/write-finding';
import { defineWrite } from '../define';
import { readMeasures } from '../units-of-measure';
import { refuseCalled } from './open-case';
import { queueReminder, remindAfter } from './reminder';

/** Begins to catch oil for a check of a case, from a clean start. The id is the client's: sent twice, it begins once. */
export const startCatch = defineWrite({
  name: 'start.oil-catch',
  doing: 'catch oil for a case',
  roles: PERMITTED['case.work'],
  input: startCatchInput,
  run: async ({ tx, ctx, input: { id, caseId, checkId, stage, place, remindEveryDays, ...typed }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const { head, compiled } = await lockCaseOf(tx, of);
    const known = await lockCatch(tx, { ...of, catchId: id });
    if (known && known.caseId !== caseId) throw conflict('This id belongs to another catch.');
    if (known) {
      unchanged();
      return { id, caseId };
    }
    refuseCalled(head);
    const check = compiled.checks.get(checkId)?.check;
    if (!check || !isCaught(check)) throw invalid({ checkId: 'This check is not answered by oil that is caught.' });
    await refuseUnread(tx, ctx, { head, compiled, check });

    const at = ctx.now();
    const { columns, asTyped } = readMeasures(ctx, CATCH_MEASURES, typed);
    const remindAt = remindAfter(at, remindEveryDays);
    const written = await insertCatch(tx, { ...of, ...columns, id, checkId, stage, startedAt: at, startedBy: ctx.person.id, asTyped, place, remindEveryDays, remindAt });
    if (!written) throw conflict('Oil is being caught for this check already: weigh that, or take its bottle down first.');
    await queueReminder(tx, ctx.jobs, { ...of, catchId: id, due: remindAt });
    audit({ entity: 'oil-catch', entityId: id, changed: { caseId, checkId, ...columns, place, remindEveryDays } });
    return { id, caseId };
  },
});
