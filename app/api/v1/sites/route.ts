import { route } from '@/lib/auth/route';
import { siteList, siteWritten } from '@/lib/openapi/answers/record';
import { addSite } from '@/lib/services/site/add';
import { browseSites } from '@/lib/services/site/browse';

export const GET = route(browseSites, { scope: 'sites:read', doc: { summary: 'List sites', answers: siteList } });

export const POST = route(addSite, { scope: 'sites:write', status: 201, doc: { summary: 'Add a site', answers: siteWritten } });
