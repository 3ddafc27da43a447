import { route } from '@/lib/auth/route';
import { nothing, siteAnswer } from '@/lib/openapi/answers/record';
import { changeSite } from '@/lib/services/site/change';
import { siteVersion } from '@/lib/services/site/version';
import { viewSite } from '@/lib/services/site/view';

const params = { id: 'siteId' };

export const GET = route(viewSite, { params, scope: 'sites:read', version: siteVersion, doc: { summary: 'Read a site', answers: siteAnswer } });

export const PUT = route(changeSite, {
  params,
  scope: 'sites:write',
  ifMatch: 'needed',
  shape: () => ({}),
  doc: { summary: 'Change a site', answers: nothing },
});
