import { searchUnits as selectUnitsLike } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { searchUnitsInput } from '@/lib/schemas/unit';
import { defineRead } from '../define';

/** Units by part of their number, for a field that finds one while somebody types. */
export const searchUnits = defineRead({
  name: 'search.unit',
  doing: 'see units',
  roles: PERMITTED['unit.see'],
  input: searchUnitsInput,
  run: async ({ tx, ctx, input }) => ({
    units: await selectUnitsLike(tx, { organisationId: ctx.organisation.id, text: input.q, limit: input.limit }),
  }),
});
