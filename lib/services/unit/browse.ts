import { browseUnits as selectUnits } from '@/db/queries/browse';
import { PERMITTED } from '@/lib/auth/permissions';
import { browseUnitsInput, cutPage } from '@/lib/schemas/browse';
import { defineRead } from '../define';

/** Units one page after another; also for a field that finds one while somebody types. */
export const browseUnits = defineRead({
  name: 'browse.unit',
  doing: 'see units',
  roles: PERMITTED['unit.see'],
  input: browseUnitsInput,
  run: async ({ tx, ctx, input: { q, site, hidden, limit, cursor } }) => {
    const found = await selectUnits(tx, { organisationId: ctx.organisation.id, limit: limit + 1, text: q, siteId: site, hidden, after: cursor });
    const { rows, next } = cutPage(found, { limit, keysOf: ({ rank, fleetNumber, id }) => [rank, fleetNumber, id] });
    return { units: rows.map(({ rank: _, ...row }) => row), next };
  },
});
