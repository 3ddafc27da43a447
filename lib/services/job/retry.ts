import { lockJob, retryFailedJob } from '@/db/queries/job';
import { reviveMail } from '@/db/queries/mail';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { SEEN_JOBS, isSeenJob, jobIdInput, type JobState } from '@/lib/schemas/job';
import { defineWrite } from '../define';
import { seenKinds } from './seen';

/** Gives a job that failed another round. One that hasn't failed is left alone, and its state says why. */
export const retryJob = defineWrite({
  name: 'retry.job',
  doing: 'try jobs again',
  roles: PERMITTED['job.retry'],
  input: jobIdInput,
  run: async ({ tx, ctx, input: { jobId }, audit, unchanged }) => {
    const organisationId = ctx.organisation.id;
    const which = { ...seenKinds(organisationId), jobId };
    const job = await lockJob(tx, which);
    if (!job || !isSeenJob(job.kind)) throw notFound('job');
    if (job.state !== 'failed') {
      unchanged();
      return { id: jobId, isRetried: false, state: job.state as JobState };
    }
    await retryFailedJob(tx, which);
    if (job.mailId !== null) await reviveMail(tx, { organisationId, mailId: job.mailId });
    audit({ entity: 'job', entityId: jobId, changed: { job: SEEN_JOBS[job.kind].name } });
    return { id: jobId, isRetried: true, state: 'waiting' as JobState };
  },
});
