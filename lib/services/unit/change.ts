import { lockUnit, selectUnit, updateUnit } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { changeUnitInput } from '@/lib/schemas/unit';
import { defineWrite } from '../define';
import { changedFields, refuseStale } from '../editing';
import { refuseTakenNumber, refuseUnknownSite } from './add-unit';
import { unitFormValues } from './form-values';
import { unitColumns } from './unit-columns';

/** Changes the facts of a unit; refused when somebody else changed them since the form was opened. */
export const changeUnit = defineWrite({
  name: 'change.unit',
  doing: 'change units',
  roles: PERMITTED['unit.edit'],
  input: changeUnitInput,
  run: async ({ tx, ctx, input, audit, unchanged }) => {
    const { unitId, version, ...facts } = input;
    const of = { organisationId: ctx.organisation.id, unitId };
    await lockUnit(tx, of);
    const before = await selectUnit(tx, of);
    if (!before) throw notFound('unit');
    refuseStale(before, { version, what: 'unit', typed: facts, stored: unitFormValues(before, ctx.person.units) });

    const next = unitColumns(ctx, facts, before);
    const changed = changedFields(before, next);
    if (Object.keys(changed).length === 0) {
      unchanged();
      return { id: unitId };
    }
    if (changed.siteId) await refuseUnknownSite({ tx, ctx }, next.siteId);
    await refuseTakenNumber({ tx, ctx }, { fleetNumber: next.fleetNumber, unitId });
    await updateUnit(tx, of, { ...changed, updatedAt: ctx.now() });
    audit({ entity: 'unit', entityId: unitId, changed });
    return { id: unitId };
  },
});
