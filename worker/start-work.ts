import type PgBoss from 'pg-boss';
import type { JobData, JobName } from '@/lib/jobs';
import { log } from '@/lib/log';
import type { Handlers } from './handlers';

/** Jobs that come round by themselves, in universal time. */
const SCHEDULES: Partial<Record<JobName, string>> = { sweep: '17 3 * * *' };

async function work<Name extends JobName>(boss: PgBoss, name: Name, handler: (data: JobData[Name]) => Promise<void>): Promise<void> {
  await boss.work<JobData[Name]>(name, { pollingIntervalSeconds: 1 }, async (jobs) => {
    for (const job of jobs) {
      try {
        await handler(job.data);
        log.info({ job: name, id: job.id }, 'job done');
      } catch (error) {
        // pg-boss keeps the error and tries again by the queue's own plan.
        log.warn({ job: name, id: job.id, err: error }, 'job failed');
        throw error;
      }
    }
  });
}

/** Starts the queue and a worker for each kind of job. */
export async function startWork(boss: PgBoss, handlers: Handlers): Promise<void> {
  await boss.start();
  await work(boss, 'mail-invitation', handlers['mail-invitation']);
  await work(boss, 'mail-password-reset', handlers['mail-password-reset']);
  await work(boss, 'make-thumbnail', handlers['make-thumbnail']);
  await work(boss, 'remind-weighing', handlers['remind-weighing']);
  await work(boss, 'sweep', handlers.sweep);
  for (const [name, cron] of Object.entries(SCHEDULES)) await boss.schedule(name, cron);
}
