import { insertAcknowledgements } from '@/db/queries/finding';
import { PERMITTED } from '@/lib/auth/permissions';
import { siteDay } from '@/lib/case/site-day';
import type { CompiledRulebook } from '@/lib/diagnose';
import { dangersOf } from '@/lib/diagnose/cautions';
import type { Check } from '@/lib/diagnose/types';
import { invalid } from '@/lib/errors';
import { acknowledgeWorkInput } from '@/lib/schemas/case';
import { breakInWork } from '../break-in/work';
import { defineWrite } from '../define';
import { fittingWork } from '../fitting/work';
import { lockCaseOf } from './locked';

const WORKS: Record<'fitting' | 'break-in', (compiled: CompiledRulebook) => Pick<Check, 'cautions' | 'setUp'>> = { fitting: fittingWork, 'break-in': breakInWork };

/** Notes that a person read the cautions of a fitting, or of a break-in run, today, in the danger that the work is. */
export const acknowledgeWork = defineWrite({
  name: 'acknowledge.caution',
  doing: 'acknowledge cautions',
  roles: PERMITTED['case.work'],
  input: acknowledgeWorkInput,
  run: async ({ tx, ctx, input: { caseId, work, cautions }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const { head, compiled } = await lockCaseOf(tx, of);
    const { cautions: known, setUp } = WORKS[work](compiled);
    if (cautions.some(({ cautionId }) => !known.includes(cautionId))) throw invalid({ cautions: 'These are not the cautions of this work.' });
    const at = ctx.now();
    const dangers = dangersOf(setUp);
    const onDay = siteDay(at, head.timeZone);
    const written = await insertAcknowledgements(tx, cautions.map(({ id, cautionId }) => ({ ...of, id, cautionId, personId: ctx.person.id, onDay, dangers, at })));
    if (written === 0) unchanged();
    else audit({ entity: 'caution_acknowledgement', entityId: caseId, changed: { cautions: cautions.map(({ cautionId }) => cautionId), dangers, onDay } });
    return cautions.map(({ cautionId }) => ({ cautionId, dangers }));
  },
});
