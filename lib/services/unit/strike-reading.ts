import { insertRemoval } from '@/db/queries/removal';
import { lockUnit } from '@/db/queries/unit';
import { selectReadings } from '@/db/queries/unit-reading';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { strikeReadingInput } from '@/lib/schemas/unit';
import { defineWrite, type Work } from '../define';

/** Strikes out a reading that was wrong: the row stays, and nothing counts with it any more. */
export const strikeReading = defineWrite({
  name: 'strike.unit-reading',
  doing: 'strike out readings',
  roles: PERMITTED['unit.edit'],
  input: strikeReadingInput,
  run: async (work) => {
    const { unitId, readingId, whyWrong } = work.input;
    const of = { organisationId: work.ctx.organisation.id, unitId };
    await lockUnit(work.tx, of);
    const readings = await selectReadings(work.tx, of);
    if (!readings.some((reading) => reading.id === readingId)) throw notFound('reading');
    await strikeOut(work, { readingId, reason: whyWrong });
    return { unitId };
  },
});

/** Within a service's transaction. */
export async function strikeOut({ tx, ctx, audit }: Work<unknown>, { readingId, reason }: { readingId: string; reason: string }): Promise<void> {
  const at = ctx.now();
  await insertRemoval(tx, { organisationId: ctx.organisation.id, id: newId(at.getTime()), entity: 'unit-reading', entityId: readingId, kind: 'hide', reason, personId: ctx.person.id, at });
  audit({ entity: 'unit-reading', entityId: readingId, changed: { struckOut: true, reason } });
}
