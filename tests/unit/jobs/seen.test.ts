import { describe, expect, it } from 'vitest';
import type { JobRow } from '@/db/queries/job';
import { SEEN_JOB_NAMES } from '@/lib/schemas/job';
import { seenJob, seenKinds, UNSEEN_JOBS } from '@/lib/services/job/seen';

const row: JobRow = {
  id: 'j', kind: 'send-mail', state: 'failed', attempts: 3, createdAt: '2026-03-02T09:00:00.000001Z', startedAt: null, finishedAt: null, nextTryAt: null,
  output: { message: 'The mail server put it off: 451 Later' }, atHand: true,
  mailTo: 'a@people.test', mailSubject: 'Hello', mailState: 'waiting', mailAttempts: 5, mailError: 'The mail server put it off: 451 Later', mailSentAt: null,
};
const NO_MAIL = { mailTo: null, mailSubject: null, mailState: null, mailAttempts: null, mailError: null, mailSentAt: null };

describe('a job as an administrator sees it', () => {
  it('has the words, tries and state of its mail', () => {
    expect(seenJob(row)).toMatchObject({ name: 'Mail', attempts: 5, error: 'The mail server put it off: 451 Later', canRetry: true, mail: { to: 'a@people.test', subject: 'Hello' } });
  });

  it('does not say that a mail waits whose job has failed: its worker was stopped before it could say so', () => {
    expect(seenJob(row).mail?.state).toBe('given-up');
    expect(seenJob({ ...row, state: 'running' }).mail?.state).toBe('waiting');
  });

  it('says why a mail was not needed any more, although its job is done', () => {
    expect(seenJob({ ...row, state: 'done', output: null, mailState: 'given-up', mailError: 'It was not needed.' })).toMatchObject({ error: 'It was not needed.', canRetry: false });
  });

  it('has no error once it was done, and none of its own words when all see it', () => {
    expect(seenJob({ ...row, ...NO_MAIL, kind: 'make-thumbnail', state: 'done' }).error).toBeNull();
    expect(seenJob({ ...row, ...NO_MAIL, kind: 'sweep' }).error).not.toContain('451');
  });

  it('can be tried again while it is at hand, and only when it failed', () => {
    expect(seenJob({ ...row, atHand: false }).canRetry).toBe(false);
    expect(seenJob({ ...row, state: 'waiting' }).canRetry).toBe(false);
  });
});

it('shows no kind that is not to be seen', () => {
  const { own, shared } = seenKinds('organisation');
  expect([...own, ...shared].sort()).toEqual([...SEEN_JOB_NAMES].sort());
  for (const kind of Object.keys(UNSEEN_JOBS)) expect([...own, ...shared]).not.toContain(kind);
  expect(seenKinds('organisation', 'sweep')).toEqual({ organisationId: 'organisation', own: [], shared: ['sweep'] });
});
