import { selectCalls, selectCaseEvents } from '@/db/queries/case';
import { PERMITTED } from '@/lib/auth/permissions';
import { repairPlanView } from '@/lib/case/view/repair-plan';
import { repairPlanInput, type RepairPlanView } from '@/lib/schemas/repair';
import { gatherState } from '../case/gather-state';
import { standingCall } from '../case/standing-call';
import { defineRead } from '../define';

/** Which repairs, and in which order, as the case stands now: by chance, minutes, parts and the organisation's labour rate. */
export const readRepairPlan = defineRead({
  name: 'read.repair-plan',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: repairPlanInput,
  run: async ({ tx, ctx, input: { caseId } }): Promise<RepairPlanView> => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const { caseHead, compiled, run, acknowledged } = await gatherState(tx, ctx, { caseId });
    const call = standingCall(await selectCalls(tx, of), await selectCaseEvents(tx, of));
    return repairPlanView({
      caseId,
      compiled,
      causes: run.ranking.causes,
      currency: ctx.organisation.currency,
      labourRatePerHour: caseHead.labourRatePerHour,
      called: call ? [call.mainCause, ...call.contributingCauses] : [],
      acknowledged,
    });
  },
});
