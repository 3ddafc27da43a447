import { lockCase } from '@/db/queries/case';
import { insertAcknowledgements } from '@/db/queries/finding';
import { PERMITTED } from '@/lib/auth/permissions';
import { siteDay } from '@/lib/case/site-day';
import { REPAIR_SET_UP } from '@/lib/case/view/repair-plan';
import { dangersOf } from '@/lib/diagnose/cautions';
import { invalid, notFound } from '@/lib/errors';
import { acknowledgeRepairInput } from '@/lib/schemas/repair';
import { defineWrite } from '../define';
import { compiledEdition } from '../edition/compiled';

/** Notes that a person read the cautions of a repair today, for a system that is opened. */
export const acknowledgeRepair = defineWrite({
  name: 'acknowledge.caution',
  doing: 'acknowledge cautions',
  roles: PERMITTED['case.work'],
  input: acknowledgeRepairInput,
  run: async ({ tx, ctx, input: { caseId, remedyId, cautions }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const row = await lockCase(tx, of);
    if (!row) throw notFound('case');
    const { rulebook } = await compiledEdition(tx, { ...of, editionId: row.editionId });
    const remedy = rulebook.remedies.find(({ id }) => id === remedyId);
    if (!remedy || cautions.some(({ cautionId }) => !remedy.cautions.includes(cautionId))) throw invalid({ cautions: 'These are not the cautions of this repair.' });
    const at = ctx.now();
    const dangers = dangersOf(REPAIR_SET_UP);
    const onDay = siteDay(at, row.timeZone);
    const written = await insertAcknowledgements(tx, cautions.map(({ id, cautionId }) => ({ ...of, id, cautionId, personId: ctx.person.id, onDay, dangers, at })));
    if (written === 0) unchanged();
    else audit({ entity: 'caution_acknowledgement', entityId: caseId, changed: { cautions: cautions.map(({ cautionId }) => cautionId), dangers, onDay } });
    return cautions.map(({ cautionId }) => ({ cautionId, dangers }));
  },
});
