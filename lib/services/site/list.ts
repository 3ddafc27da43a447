import { z } from 'zod';
import { listSites as selectSites } from '@/db/queries/site';
import { ANYONE } from '@/lib/auth/roles';
import { defineRead } from '../define';

/** The workshops and depots of the organisation. */
export const listSites = defineRead({
  name: 'list.site',
  doing: 'see sites',
  roles: ANYONE,
  input: z.object({}),
  run: ({ tx, ctx }) => selectSites(tx, { organisationId: ctx.organisation.id }),
});
