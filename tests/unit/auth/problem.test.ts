import { describe, expect, test, vi } from 'vitest';
import { MalformedBody } from '@/lib/auth/body';
import { problemResponse, refuseForeignOrigin } from '@/lib/auth/problem';
import { AppError, conflict, forbidden, invalid, notFound, notSignedIn, tooMany } from '@/lib/errors';
import { log } from '@/lib/log';

log.level = 'silent';
const problemOf = async (error: unknown) => {
  const response = problemResponse(error, 'open.case');
  return { status: response.status, type: response.headers.get('content-type'), problem: (await response.json()) as Record<string, unknown> };
};

describe('an error as RFC 9457 has it', () => {
  test.each([
    [notSignedIn(), 401],
    [forbidden('open cases'), 403],
    [notFound('case'), 404],
    [conflict('Taken.'), 409],
    [new AppError('too-large', 'Too large.'), 413],
    [invalid({ name: 'Enter a name.' }), 422],
    [tooMany('Wait.'), 429],
    [new MalformedBody(new SyntaxError('x')), 400],
  ])('%s has the status %i and its own words', async (error, status) => {
    const { problem, ...answer } = await problemOf(error);
    expect(answer).toEqual({ status, type: 'application/problem+json' });
    expect(problem).toMatchObject({ status, type: expect.stringMatching(/^urn:carryover:problem:/), title: expect.any(String), detail: error.message });
  });

  test('names the fields by their path', async () => {
    expect((await problemOf(invalid({ 'reservoirs.0.volume': 'Enter a volume.' }))).problem.errors).toEqual({ 'reservoirs.0.volume': 'Enter a volume.' });
  });

  test('of ours gives away nothing but a reference, under which the log has the rest', async () => {
    const written = vi.spyOn(log, 'error').mockImplementation(() => undefined);
    const { status, problem } = await problemOf(new Error('relation "secret" does not exist'));
    expect(status).toBe(500);
    expect(JSON.stringify(problem)).not.toContain('secret');
    expect(written.mock.calls[0]?.[0]).toMatchObject({ reference: problem.reference, err: expect.any(Error) });
    written.mockRestore();
  });
});

describe('a write with a cookie', () => {
  const from = (headers: Record<string, string>) => () => refuseForeignOrigin(new Request('http://internal:3000/', { method: 'POST', headers }));

  test('comes from a page of ours, also behind a proxy', () => {
    expect(from({ host: 'carryover.test', origin: 'https://carryover.test' })).not.toThrow();
    expect(from({ host: 'internal:3000', 'x-forwarded-host': 'carryover.test', origin: 'https://carryover.test' })).not.toThrow();
  });

  test.each(['https://elsewhere.test', 'https://carryover.test.elsewhere.test', 'http://carryover.test:81', 'null', 'nonsense'])('does not come from %s', (origin) => {
    expect(from({ host: 'carryover.test', origin })).toThrow(/did not come from a page/);
  });

  test('says where it comes from', () => {
    expect(from({ host: 'carryover.test' })).toThrow(/did not come from a page/);
  });
});
