import { lockCase } from '@/db/queries/case';
import { updateCatch } from '@/db/queries/oil-catch';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { endCatchInput, remindCatchInput } from '@/lib/schemas/oil-catch';
import { defineWrite } from '../define';
import { lockCatchOf, refuseEnded } from './open-case';
import { planReminder } from './reminder';

/** Notes that the bottle is down. What was weighed stands; nobody is reminded any more. */
export const endCatch = defineWrite({
  name: 'end.oil-catch',
  doing: 'catch oil for a case',
  roles: PERMITTED['case.work'],
  input: endCatchInput,
  run: async ({ tx, ctx, input: { caseId, catchId, whyEnded }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId, catchId };
    if (!(await lockCase(tx, of))) throw notFound('case');
    const { endedAt } = await lockCatchOf(tx, of);
    if (endedAt) unchanged();
    else {
      await updateCatch(tx, of, { endedAt: ctx.now(), endedBy: ctx.person.id, endedWhy: whyEnded, remindAt: null });
      audit({ entity: 'oil-catch', entityId: catchId, changed: { caseId, ended: true, reason: whyEnded } });
    }
    return { id: catchId, caseId };
  },
});

/** Changes how often somebody is reminded to weigh, from now on. */
export const remindOfCatch = defineWrite({
  name: 'remind.oil-catch',
  doing: 'catch oil for a case',
  roles: PERMITTED['case.work'],
  input: remindCatchInput,
  run: async ({ tx, ctx, input: { caseId, catchId, remindEveryDays }, audit }) => {
    const of = { organisationId: ctx.organisation.id, caseId, catchId };
    if (!(await lockCase(tx, of))) throw notFound('case');
    refuseEnded(await lockCatchOf(tx, of));
    await planReminder(tx, ctx.jobs, { ...of, from: ctx.now(), everyDays: remindEveryDays });
    audit({ entity: 'oil-catch', entityId: catchId, changed: { caseId, remindEveryDays } });
    return { id: catchId, caseId };
  },
});
