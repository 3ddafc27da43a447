import { selectUnit } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { unitIdInput } from '@/lib/schemas/unit';
import { defineRead } from '../define';
import { versionOf } from '../editing';
import { textsOf } from '../form-value';
import { unitFormValues } from './form-values';

/** The facts of a unit: measures in SI, and beside them what a change of it would hold. */
export const viewUnit = defineRead({
  name: 'view.unit',
  doing: 'see units',
  roles: PERMITTED['unit.see'],
  input: unitIdInput,
  run: async ({ tx, ctx, input }) => {
    const unit = await selectUnit(tx, { organisationId: ctx.organisation.id, unitId: input.unitId });
    if (!unit) throw notFound('unit');
    return { unit, values: textsOf(unitFormValues(unit, ctx.person.units)), version: versionOf(unit) };
  },
});
