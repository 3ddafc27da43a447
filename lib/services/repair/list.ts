import { selectRepairs, selectSteps } from '@/db/queries/repair';
import { PERMITTED } from '@/lib/auth/permissions';
import { checksAtRepair } from '@/lib/case/view/checks-at-repair';
import { repairWork } from '@/lib/case/view/repair-plan';
import { unreadOf } from '@/lib/case/view/work-cautions';
import { repairPlanInput, type RepairView } from '@/lib/schemas/repair';
import { workOn } from '../case/work-on';
import { defineRead } from '../define';
import { lastMarks } from './marks';

/** The repairs that were chosen for a case, with what was done of each. */
export const listRepairs = defineRead({
  name: 'list.repair',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: repairPlanInput,
  run: async ({ tx, ctx, input: { caseId } }): Promise<{ caseId: string; repairs: RepairView[] }> => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const { compiled, acknowledged } = await workOn(tx, ctx, caseId);
    const said = await selectSteps(tx, of);
    const repairs = (await selectRepairs(tx, of)).flatMap(({ chosenAt, endedAt, ...row }, i): RepairView[] => {
      const remedy = compiled.rulebook.remedies.find(({ id }) => id === row.remedyId);
      if (!remedy) return [];
      const marks = lastMarks(said.filter(({ repairId }) => repairId === row.id));
      return [
        {
          ...row,
          name: remedy.name,
          chosenAt: chosenAt.toISOString(),
          endedAt: endedAt?.toISOString() ?? null,
          ...unreadOf(compiled, repairWork(remedy), acknowledged),
          steps: remedy.steps.map((text, step) => ({ text, mark: markView(marks.get(step)) })),
          place: i + 1,
          looks: checksAtRepair(compiled, remedy),
        },
      ];
    });
    return { caseId, repairs };
  },
});

function markView(said: Awaited<ReturnType<typeof selectSteps>>[number] | undefined): RepairView['steps'][number]['mark'] {
  return said ? { mark: said.mark, value: said.value, note: said.note, by: said.by, at: said.at.toISOString() } : null;
}
