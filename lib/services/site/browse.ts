import { listSites } from '@/db/queries/site';
import { ANYONE } from '@/lib/auth/roles';
import { browseInput, pageOf } from '@/lib/schemas/browse';
import { defineRead } from '../define';

/** Sites one page after another, by name. */
export const browseSites = defineRead({
  name: 'browse.site',
  doing: 'see sites',
  roles: ANYONE,
  input: browseInput,
  run: async ({ tx, ctx, input }) => {
    const { rows, next } = pageOf(await listSites(tx, { organisationId: ctx.organisation.id }), { ...input, keysOf: ({ name, id }) => [name, id] });
    return { sites: rows, next };
  },
});
