import type { Transaction } from '@/db/connect';
import { selectFitsOfUnit } from '@/db/queries/fit';
import { selectUnit } from '@/db/queries/unit';
import { selectReadings } from '@/db/queries/unit-reading';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { browseOfUnitInput, pageOf } from '@/lib/schemas/browse';
import { defineRead } from '../define';

interface Of {
  organisationId: string;
  unitId: string;
}

async function refuseUnknownUnit(tx: Transaction, of: Of): Promise<void> {
  if (!(await selectUnit(tx, of))) throw notFound('unit');
}

/** The readings of a unit by date. */
export const browseReadings = defineRead({
  name: 'browse.unit-reading',
  doing: 'see units',
  roles: PERMITTED['unit.see'],
  input: browseOfUnitInput,
  run: async ({ tx, ctx, input: { unitId, ...page } }) => {
    const of = { organisationId: ctx.organisation.id, unitId };
    await refuseUnknownUnit(tx, of);
    const { rows, next } = pageOf(await selectReadings(tx, of), { ...page, keysOf: ({ readOn, id }) => [readOn, id] });
    return { readings: rows, next };
  },
});

/** The compressors that were fitted to a unit by date, struck-out ones left out. */
export const browseFits = defineRead({
  name: 'browse.fit',
  doing: 'see fits',
  roles: PERMITTED['unit.see'],
  input: browseOfUnitInput,
  run: async ({ tx, ctx, input: { unitId, ...page } }) => {
    const of = { organisationId: ctx.organisation.id, unitId };
    await refuseUnknownUnit(tx, of);
    const { rows, next } = pageOf(await selectFitsOfUnit(tx, of), { ...page, keysOf: ({ installedOn, id }) => [installedOn, id] });
    return { fits: rows, next };
  },
});
