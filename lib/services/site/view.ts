import { z } from 'zod';
import { findSite } from '@/db/queries/site';
import { ANYONE } from '@/lib/auth/roles';
import { notFound } from '@/lib/errors';
import { rowId } from '@/lib/schemas/common';
import { defineRead } from '../define';

export const viewSite = defineRead({
  name: 'view.site',
  doing: 'see sites',
  roles: ANYONE,
  input: z.object({ siteId: rowId }),
  run: async ({ tx, ctx, input: { siteId } }) => {
    const site = await findSite(tx, { organisationId: ctx.organisation.id, siteId });
    if (!site) throw notFound('site');
    return site;
  },
});
