import type PgBoss from 'pg-boss';
import { JOB_SCHEMA, type JobData, type JobName } from '@/lib/jobs';
import { NoUseTrying } from '@/lib/jobs/attempt';
import { log } from '@/lib/log';
import type { Handlers } from './handlers';

/** Jobs that come round by themselves, in universal time. */
const SCHEDULES: Partial<Record<JobName, string>> = { sweep: '17 3 * * *' };

async function work<Name extends JobName>(boss: PgBoss, name: Name, handler: Handlers[Name]): Promise<void> {
  await boss.work<JobData[Name]>(name, { pollingIntervalSeconds: 1, includeMetadata: true }, async (jobs) => {
    for (const job of jobs) {
      try {
        await handler(job.data, { jobId: job.id, isLast: job.retryCount >= job.retryLimit });
        log.info({ job: name, id: job.id }, 'job done');
      } catch (error) {
        // pg-boss keeps the error and tries again by the queue's own plan.
        log.warn({ job: name, id: job.id, err: error }, 'job failed');
        if (error instanceof NoUseTrying) await failForGood(boss, name, job.id);
        throw error;
      }
    }
  });
}

/** pg-boss knows no such thing: a job without tries left fails when it fails. Another round is given to it by hand. */
const failForGood = (boss: PgBoss, name: JobName, jobId: string) =>
  boss.getDb().executeSql(`update ${JOB_SCHEMA}.job set retry_limit = retry_count where name = $1 and id = $2`, [name, jobId]);

/** Starts the queue and a worker for each kind of job. */
export async function startWork(boss: PgBoss, handlers: Handlers): Promise<void> {
  await boss.start();
  // Two of them, because one mail at a server that takes its time must not hold up the next.
  for (let i = 0; i < 2; i++) await work(boss, 'send-mail', handlers['send-mail']);
  await work(boss, 'mail-password-reset', handlers['mail-password-reset']);
  await work(boss, 'make-thumbnail', handlers['make-thumbnail']);
  await work(boss, 'make-dossier', handlers['make-dossier']);
  await work(boss, 'remind-weighing', handlers['remind-weighing']);
  await work(boss, 'remind-watch', handlers['remind-watch']);
  await work(boss, 'mail-daily-notices', handlers['mail-daily-notices']);
  await work(boss, 'sweep', handlers.sweep);
  for (const [name, cron] of Object.entries(SCHEDULES)) await boss.schedule(name, cron);
}
