import { Writable } from 'node:stream';
import pino from 'pino';
import { expect, test } from 'vitest';
import { redact } from '@/lib/log';

test('the log strikes out what would let somebody in, and addresses of people', () => {
  let written = '';
  const stream = new Writable({ write: (chunk: Buffer, _encoding, done) => ((written += chunk.toString()), done()) });
  const secret = 'not to be read';
  pino({ redact }, stream).info({ password: secret, input: { email: secret, token: secret }, request: { headers: { cookie: secret, authorization: secret } }, kept: 'kept' });
  expect(written).not.toContain(secret);
  expect(written).toContain('kept');
});
