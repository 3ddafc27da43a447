import { PERMITTED } from '@/lib/auth/permissions';
import type { CompiledRulebook } from '@/lib/diagnose';
import type { Check } from '@/lib/diagnose/types';
import { acknowledgeWorkInput } from '@/lib/schemas/case';
import { breakInWork } from '../break-in/work';
import { defineWrite } from '../define';
import { fittingWork } from '../fitting/work';
import { lockCaseOf } from './locked';
import { noteRead } from './note-read';

const WORKS: Record<'fitting' | 'break-in', (compiled: CompiledRulebook) => Pick<Check, 'cautions' | 'setUp'>> = { fitting: fittingWork, 'break-in': breakInWork };

/** Notes that a person read the cautions of a fitting, or of a break-in run, today. */
export const acknowledgeWork = defineWrite({
  name: 'acknowledge.caution',
  doing: 'acknowledge cautions',
  roles: PERMITTED['case.work'],
  input: acknowledgeWorkInput,
  run: async (given) => {
    const { caseId, work, cautions } = given.input;
    const { head, compiled } = await lockCaseOf(given.tx, { organisationId: given.ctx.organisation.id, caseId });
    return noteRead(given, { head, work: WORKS[work](compiled), what: 'work', cautions });
  },
});
