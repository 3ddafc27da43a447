import { insertCaseEvent, lockCase, updateCase } from '@/db/queries/case';
import { findMember } from '@/db/queries/membership';
import { PERMITTED } from '@/lib/auth/permissions';
import { hasAnyRole, isRole } from '@/lib/auth/roles';
import { invalid, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { assignCaseInput } from '@/lib/schemas/case';
import { defineWrite } from '../define';
import { refuseOldVersion } from '../editing';
import { notify } from '../notice/notify';

/** Gives a case to somebody of the organisation, or to nobody. */
export const assignCase = defineWrite({
  name: 'assign.case',
  doing: 'assign cases',
  roles: PERMITTED['case.work'],
  input: assignCaseInput,
  run: async ({ tx, ctx, input, audit }) => {
    const of = { organisationId: ctx.organisation.id, caseId: input.caseId };
    const row = await lockCase(tx, of);
    if (!row) throw notFound('case');
    refuseOldVersion(row.version, { decidedOn: input.version, what: 'case' });
    if (input.personId) {
      const member = await findMember(tx, { ...of, personId: input.personId });
      const canWork = member && !member.endedAt && hasAnyRole(member.roles.filter(isRole), PERMITTED['case.work']);
      if (!canWork) throw invalid({ personId: 'Choose somebody of your organisation who works on cases.' });
    }
    const at = ctx.now();
    await updateCase(tx, of, { assignedTo: input.personId });
    const eventId = newId(at.getTime());
    await insertCaseEvent(tx, { ...of, id: eventId, kind: 'assigned', personId: ctx.person.id, at });
    if (input.personId !== row.assignedTo) await notify(tx, ctx, { ...of, personId: input.personId, kind: 'assigned', key: eventId, about: { by: ctx.person.id } });
    audit({ entity: 'case', entityId: of.caseId, changed: { assignedTo: input.personId } });
    return { id: of.caseId };
  },
});
