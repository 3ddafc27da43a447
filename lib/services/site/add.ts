import { insertSite } from '@/db/queries/site';
import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { addSiteInput } from '@/lib/schemas/organisation';
import { defineWrite } from '../define';
import { orTaken } from '../unique';
import { siteNameTaken } from './name-taken';

export const addSite = defineWrite({
  name: 'add.site',
  doing: 'add a site',
  roles: PERMITTED['site.manage'],
  input: addSiteInput,
  run: async ({ tx, ctx, input, audit }) => {
    const id = newId();
    await orTaken('site_name', siteNameTaken, insertSite(tx, { organisationId: ctx.organisation.id, id, ...input }));
    audit({ entity: 'site', entityId: id, changed: input });
    return { siteId: id };
  },
});
