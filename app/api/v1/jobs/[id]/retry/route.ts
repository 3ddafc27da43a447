import { route } from '@/lib/auth/route';
import { retried } from '@/lib/openapi/answers/job';
import { retryJob } from '@/lib/services/job/retry';

export const POST = route(retryJob, { params: { id: 'jobId' }, scope: 'jobs:write', doc: { summary: 'Try a job again that failed', description: 'One that has not failed is left as it is.', answers: retried } });
