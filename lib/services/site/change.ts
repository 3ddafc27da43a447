import { updateSite } from '@/db/queries/site';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { changeSiteInput } from '@/lib/schemas/organisation';
import { defineWrite } from '../define';
import { orTaken } from '../unique';
import { siteNameTaken } from './name-taken';

export const changeSite = defineWrite({
  name: 'change.site',
  doing: 'change a site',
  roles: PERMITTED['site.manage'],
  input: changeSiteInput,
  run: async ({ tx, ctx, input: { siteId, ...set }, audit }) => {
    const found = await orTaken('site_name', siteNameTaken, updateSite(tx, { organisationId: ctx.organisation.id, siteId }, set));
    if (!found) throw notFound('site');
    audit({ entity: 'site', entityId: siteId, changed: set });
  },
});
