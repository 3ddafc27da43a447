import { describe, expect, it } from 'vitest';
import { jobErrorWords } from '@/lib/jobs/error-words';

const NEUTRAL = 'Something went wrong inside Carryover. Its log says what.';

describe('the error of a job, in words', () => {
  it.each([
    ['none', null, null],
    ['the first line of a message', { name: 'Error', message: 'The object is gone\n    at secret (/srv/x.ts:1)', stack: 'Error: The object is gone\n at x' }, 'The object is gone'],
    ['a worker that was stopped', { value: { message: 'job failed by timeout in active state' } }, 'Its worker was stopped while it ran.'],
    ['one that took too long', { message: 'handler execution exceeded 45000ms' }, 'It took longer than it may.'],
    ['a statement', { message: 'Failed query: select "email" from "person"\nparams: a@people.test' }, NEUTRAL],
    ['the database', { message: 'duplicate key value violates unique constraint', code: '23505' }, NEUTRAL],
    ['the database, further down', { message: 'Something of ours', cause: { code: '42P01' } }, NEUTRAL],
    ['a connection', { message: 'connect ECONNREFUSED 127.0.0.1:9000', code: 'ECONNREFUSED' }, 'connect ECONNREFUSED 127.0.0.1:9000'],
    ['words without a message', { value: 'pg-boss shut down while active' }, NEUTRAL],
    ['an empty message', { message: '' }, NEUTRAL],
  ])('of %s', (_what, output, expected) => expect(jobErrorWords(output)).toBe(expected));

  it('is neutral where every organisation reads it, because it could be about one of them', () => {
    expect(jobErrorWords({ message: 'Fleet 7 has no site' }, { isShared: true })).toBe(NEUTRAL);
    expect(jobErrorWords({ value: { message: 'job failed by timeout in active state' } }, { isShared: true })).toBe('Its worker was stopped while it ran.');
  });

  it('keeps to a length', () => expect(jobErrorWords({ message: 'x'.repeat(5_000) })).toHaveLength(200));
});
