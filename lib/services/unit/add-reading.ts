import { selectUnit } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { invalid, notFound } from '@/lib/errors';
import { addReadingInput } from '@/lib/schemas/unit';
import { siteDay } from '@/lib/case/site-day';
import { refuseFutureDay } from '../days';
import { defineWrite } from '../define';
import { noteReading } from './note-reading';

/** Writes down odometer and engine hours of a unit on a day. */
export const addReading = defineWrite({
  name: 'add.unit-reading',
  doing: 'add readings',
  roles: PERMITTED['unit.edit'],
  input: addReadingInput,
  run: async (work) => {
    const { tx, ctx, input } = work;
    const unit = await selectUnit(tx, { organisationId: ctx.organisation.id, unitId: input.unitId });
    if (!unit) throw notFound('unit');
    refuseFutureDay({ readOn: input.readOn }, siteDay(ctx.now(), unit.timeZone));
    const noted = await noteReading(work, { ...input, source: 'unit' });
    if (!noted) throw invalid({ odometer: 'Enter the odometer, the engine hours, or both.' });
    return { unitId: input.unitId };
  },
});
