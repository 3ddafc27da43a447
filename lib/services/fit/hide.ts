import { selectFit, updateFit } from '@/db/queries/fit';
import { insertRemoval } from '@/db/queries/removal';
import { lockUnit } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { hideFitInput } from '@/lib/schemas/fit';
import { defineWrite } from '../define';
import { strikeFitReadings } from './fit-readings';

/** Strikes out a fit that was entered by mistake, with its readings. One that was real is taken out instead. */
export const hideFit = defineWrite({
  name: 'hide.fit',
  doing: 'strike out fits',
  roles: PERMITTED['unit.edit'],
  input: hideFitInput,
  run: async (work) => {
    const { tx, ctx, input, audit } = work;
    const of = { organisationId: ctx.organisation.id, fitId: input.fitId };
    const fit = await selectFit(tx, of);
    if (!fit) throw notFound('fit');
    await lockUnit(tx, { organisationId: of.organisationId, unitId: fit.unitId });
    const at = ctx.now();
    await strikeFitReadings(work, fit);
    await updateFit(tx, of, { hiddenAt: at, updatedAt: at });
    await insertRemoval(tx, { organisationId: of.organisationId, id: newId(at.getTime()), entity: 'fit', entityId: fit.id, kind: 'hide', reason: input.reason, personId: ctx.person.id, at });
    audit({ entity: 'fit', entityId: fit.id, changed: { hidden: true, reason: input.reason } });
    return { id: fit.id, unitId: fit.unitId };
  },
});
