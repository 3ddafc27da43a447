import { sql } from 'drizzle-orm';
import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { feature } from '../row';

const SEE = PERMITTED['job.see'];
const RETRY = PERMITTED['job.retry'];
const PAGE = '(signed-in)/settings/jobs';
const V1 = 'api/v1';

export const jobs = feature({
  async prepare({ tenant, as }) {
    const jobId = newId();
    const data = JSON.stringify({ organisationId: tenant.organisationId, photoId: newId() });
    await as('administrator').db.execute(sql`
      insert into pgboss.job (id, name, data, state, completed_on, output)
      values (${jobId}, 'make-thumbnail', ${data}, 'failed', now(), '{"message": "The object is gone"}')`);
    return { jobId };
  },
  rows: [
    { page: PAGE, roles: SEE, query: () => ({ kind: 'make-thumbnail', state: 'failed', page: '2' }) },
    { action: PAGE, name: 'tryAgain', roles: RETRY, form: ({ jobId }) => ({ jobId }) },
    { route: `${V1}/jobs`, method: 'GET', roles: SEE, query: () => ({ limit: '1', state: 'failed' }) },
    { route: `${V1}/jobs/[id]/retry`, method: 'POST', roles: RETRY, params: ({ jobId }) => ({ id: jobId }) },
  ],
});
