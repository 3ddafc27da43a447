import pino from 'pino';

const SECRET = ['password', 'passwordHash', 'password_hash', 'token', 'tokenHash', 'csrfToken', 'authorization', 'cookie', 'email', 'NEXTAUTH_SECRET'];

/**
 * The log of web and worker, one JSON line an event. What would let somebody in, and addresses of people, are struck
 * out wherever they stand on the first three levels.
 */
export const log = pino({
  base: null,
  level: process.env.LOG_LEVEL ?? 'info',
  redact: { paths: SECRET.flatMap((name) => [name, `*.${name}`, `*.*.${name}`]), censor: '[struck out]' },
});

export type Log = Pick<typeof log, 'error' | 'warn' | 'info'>;
