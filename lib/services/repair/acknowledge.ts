import { PERMITTED } from '@/lib/auth/permissions';
import { repairWork } from '@/lib/case/view/repair-plan';
import { acknowledgeRepairInput } from '@/lib/schemas/repair';
import { lockCaseOf } from '../case/locked';
import { noteRead } from '../case/note-read';
import { defineWrite } from '../define';

/** Notes that a person read the cautions of a repair today, for a system that is opened. */
export const acknowledgeRepair = defineWrite({
  name: 'acknowledge.caution',
  doing: 'acknowledge cautions',
  roles: PERMITTED['case.work'],
  input: acknowledgeRepairInput,
  run: async (given) => {
    const { caseId, remedyId, cautions } = given.input;
    const { head, compiled } = await lockCaseOf(given.tx, { organisationId: given.ctx.organisation.id, caseId });
    const remedy = compiled.rulebook.remedies.find(({ id }) => id === remedyId);
    return noteRead(given, { head, work: repairWork(remedy ?? { cautions: [] }), what: 'repair', cautions });
  },
});
