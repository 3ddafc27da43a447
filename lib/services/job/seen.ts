import type { JobRow } from '@/db/queries/job';
import type { JobName } from '@/lib/jobs';
import { jobErrorWords } from '@/lib/jobs/error-words';
import { SEEN_JOB_NAMES, SEEN_JOBS, isSeenJob, type JobState, type SeenJob } from '@/lib/schemas/job';

/** Kinds that nobody is shown, and why. A new kind stands either here or in SEEN_JOBS. */
export const UNSEEN_JOBS = {
  'mail-password-reset': 'It holds an address that somebody typed, and who asks for a new password is nobody’s business.',
} as const satisfies Record<Exclude<JobName, SeenJob>, string>;

/** The kinds that an organisation sees, all or one of them, as queries take them. */
export function seenKinds(organisationId: string, kind?: SeenJob) {
  const names = kind ? [kind] : SEEN_JOB_NAMES;
  const of = (whose: 'organisation' | 'everybody') => names.filter((name) => SEEN_JOBS[name].whose === whose);
  return { organisationId, own: of('organisation'), shared: of('everybody') };
}

export interface SeenJobRow {
  id: string;
  kind: string;
  name: string;
  state: JobState;
  attempts: number;
  createdAt: string;
  startedAt: string | null;
  finishedAt: string | null;
  nextTryAt: string | null;
  /** Why the last try came to nothing, in words. */
  error: string | null;
  canRetry: boolean;
  /** What it sends. */
  mail: { to: string | null; subject: string; state: 'waiting' | 'sent' | 'given-up'; sentAt: string | null } | null;
}

/** A job as an administrator sees it. */
export function seenJob({ output, atHand, mailTo, mailSubject, mailState, mailAttempts, mailError, mailSentAt, ...row }: JobRow): SeenJobRow {
  const known = isSeenJob(row.kind) ? SEEN_JOBS[row.kind] : undefined;
  const state = row.state as JobState;
  const isMail = mailState !== null && mailSubject !== null;
  // A mail's own words say more; those of a job that was done are not its errors.
  const words = state === 'done' ? null : jobErrorWords(output, { isShared: known?.whose !== 'organisation' });
  return {
    ...row,
    name: known?.name ?? row.kind,
    state,
    attempts: mailAttempts ?? row.attempts,
    error: (isMail ? mailError : null) ?? words,
    canRetry: state === 'failed' && atHand,
    // A worker that was stopped at the last try could not say so any more.
    mail: isMail ? { to: mailTo, subject: mailSubject, state: state === 'failed' && mailState === 'waiting' ? 'given-up' : (mailState as 'waiting' | 'sent' | 'given-up'), sentAt: mailSentAt } : null,
  };
}
