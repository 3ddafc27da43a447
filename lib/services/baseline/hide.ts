import { hideBaselineSet, selectBaselineSet } from '@/db/queries/baseline';
import { insertRemoval } from '@/db/queries/removal';
import { lockUnit } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { hideBaselineInput } from '@/lib/schemas/baseline';
import { defineWrite } from '../define';

/** Hides a set that was wrong: nothing is compared with it any more. Findings that were, keep what they were compared with. */
export const hideBaseline = defineWrite({
  name: 'hide.baseline-set',
  doing: 'hide healthy baselines',
  roles: PERMITTED['case.work'],
  input: hideBaselineInput,
  run: async ({ tx, ctx, input: { unitId, setId, whyHidden: reason }, audit }) => {
    const organisationId = ctx.organisation.id;
    await lockUnit(tx, { organisationId, unitId });
    const set = await selectBaselineSet(tx, { organisationId, setId });
    if (!set || set.hiddenAt || set.unitId !== unitId) throw notFound('set');
    const at = ctx.now();
    await hideBaselineSet(tx, { organisationId, setId, at });
    await insertRemoval(tx, { organisationId, id: newId(at.getTime()), entity: 'baseline-set', entityId: setId, kind: 'hide', reason, personId: ctx.person.id, at });
    audit({ entity: 'baseline-set', entityId: setId, changed: { unitId, hidden: true, reason } });
    return { unitId };
  },
});
