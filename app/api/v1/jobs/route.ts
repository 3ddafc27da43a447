import { route } from '@/lib/auth/route';
import { jobList } from '@/lib/openapi/answers/job';
import { browseJobs } from '@/lib/services/job/list';

export const GET = route(browseJobs, {
  scope: 'jobs:read',
  doc: { summary: 'List jobs', description: 'What waits, runs, failed within a month and was done within a day: mail, pictures and the nightly work. The newest first.', answers: jobList },
});
