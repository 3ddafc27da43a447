import { describe, expect, test } from 'vitest';
import { jsonBody, limitedText, MalformedBody } from '@/lib/auth/body';
import { AppError } from '@/lib/errors';

const request = (body: BodyInit | undefined, headers: Record<string, string> = { 'content-type': 'application/json' }) =>
  new Request('http://carryover.test/', { method: 'POST', headers, ...(body !== undefined && { body, duplex: 'half' }) } as RequestInit);

describe('a body', () => {
  test('is read up to the limit, byte by byte of its text', async () => {
    expect(await limitedText(request('€€'), 6)).toBe('€€');
    await expect(limitedText(request('€€'), 5)).rejects.toMatchObject({ code: 'too-large' });
  });

  test('that never ends is not read to its end', async () => {
    let sent = 0;
    const endless = new ReadableStream({
      pull(controller) {
        sent += 1024;
        controller.enqueue(new Uint8Array(1024));
      },
    });
    await expect(limitedText(request(endless), 10_000)).rejects.toMatchObject({ code: 'too-large' });
    expect(sent).toBeLessThan(20_000);
  });

  test('is JSON, or nothing, which is an empty object', async () => {
    expect(await jsonBody(request('{"a":[1]}'))).toEqual({ a: [1] });
    expect(await jsonBody(request('{"a":1}', { 'content-type': 'application/merge-patch+json; charset=utf-8' }))).toEqual({ a: 1 });
    expect(await jsonBody(request(undefined, {}))).toEqual({});
  });

  test('that is no JSON is malformed; of another type it is refused unread', async () => {
    await expect(jsonBody(request('{"a":'))).rejects.toBeInstanceOf(MalformedBody);
    const refused = await jsonBody(request('{"a":1}', { 'content-type': 'text/plain' })).catch((error: unknown) => error);
    expect(refused).toBeInstanceOf(AppError);
    expect(refused).not.toBeInstanceOf(MalformedBody);
  });
});
