import { selectUnit } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { createUnitInput } from '@/lib/schemas/unit';
import { siteDay } from '@/lib/case/site-day';
import { refuseFutureDay } from '../days';
import { defineWrite } from '../define';
import { addUnit } from './add-unit';
import { noteReading } from './note-reading';
import { unitColumns } from './unit-columns';

/** Adds a unit, with its first readings when they are given. */
export const createUnit = defineWrite({
  name: 'create.unit',
  doing: 'add units',
  roles: PERMITTED['unit.edit'],
  input: createUnitInput,
  run: async (work) => {
    const { tx, ctx } = work;
    const { id, odometer, engineHours, readOn, ...facts } = work.input;
    const organisationId = ctx.organisation.id;
    const known = await selectUnit(tx, { organisationId, unitId: id });
    const added = await addUnit(work, { id, ...unitColumns(ctx, facts) });
    const unit = await selectUnit(tx, { organisationId, unitId: id });
    // Sent twice: the readings are there already.
    if (known || !unit) return added;
    const today = siteDay(ctx.now(), unit.timeZone);
    if (readOn) refuseFutureDay({ readOn }, today);
    await noteReading(work, { unitId: id, readOn: readOn ?? today, odometer, engineHours, source: 'unit' });
    return added;
  },
});
