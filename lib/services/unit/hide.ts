import { insertRemoval } from '@/db/queries/removal';
import { lockUnit, selectUnit, updateUnit } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { hideUnitInput, showUnitInput } from '@/lib/schemas/unit';
import { defineWrite, type Work } from '../define';

/** Takes a unit out of lists and searches; its cases and history stay. */
export const hideUnit = defineWrite({
  name: 'hide.unit',
  doing: 'hide units',
  roles: PERMITTED['unit.edit'],
  input: hideUnitInput,
  run: (work) => setHidden(work, { ...work.input, hidden: true }),
});

/** Puts a hidden unit back into the lists. */
export const showUnit = defineWrite({
  name: 'show.unit',
  doing: 'show units again',
  roles: PERMITTED['unit.edit'],
  input: showUnitInput,
  run: (work) => setHidden(work, { unitId: work.input.unitId, reason: work.input.reason ?? 'Needed again', hidden: false }),
});

async function setHidden({ tx, ctx, audit, unchanged }: Work<unknown>, { unitId, reason, hidden }: { unitId: string; reason: string; hidden: boolean }) {
  const of = { organisationId: ctx.organisation.id, unitId };
  await lockUnit(tx, of);
  const unit = await selectUnit(tx, of);
  if (!unit) throw notFound('unit');
  if ((unit.hiddenAt !== null) === hidden) {
    unchanged();
    return { id: unitId };
  }
  const at = ctx.now();
  const kind = hidden ? 'hide' : 'show';
  await updateUnit(tx, of, { hiddenAt: hidden ? at : null, updatedAt: at });
  await insertRemoval(tx, { organisationId: of.organisationId, id: newId(at.getTime()), entity: 'unit', entityId: unitId, kind, reason, personId: ctx.person.id, at });
  audit({ entity: 'unit', entityId: unitId, changed: { hidden, reason } });
  return { id: unitId };
}
