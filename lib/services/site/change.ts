import { lockSite, updateSite } from '@/db/queries/site';
import { PERMITTED } from '@/lib/auth/permissions';
import { AppError, notFound } from '@/lib/errors';
import { changeSiteInput } from '@/lib/schemas/organisation';
import { defineWrite } from '../define';
import { orTaken } from '../unique';
import { siteNameTaken } from './name-taken';
import { siteVersion } from './version';

export const changeSite = defineWrite({
  name: 'change.site',
  doing: 'change a site',
  roles: PERMITTED['site.manage'],
  input: changeSiteInput,
  run: async ({ tx, ctx, input: { siteId, version, ...set }, audit }) => {
    const before = await lockSite(tx, { organisationId: ctx.organisation.id, siteId });
    if (!before) throw notFound('site');
    if (version !== undefined && version !== '*' && version !== siteVersion(before)) {
      throw new AppError('stale', 'Somebody changed this site since you read it. Look at it again first.');
    }
    await orTaken('site_name', siteNameTaken, updateSite(tx, { organisationId: ctx.organisation.id, siteId }, set));
    audit({ entity: 'site', entityId: siteId, changed: set });
  },
});
