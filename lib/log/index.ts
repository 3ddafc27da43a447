import pino from 'pino';

const SECRET = ['password', 'passwordHash', 'password_hash', 'token', 'tokenHash', 'csrfToken', 'authorization', 'cookie', 'email', 'NEXTAUTH_SECRET'];

/** What would let somebody in, and addresses of people, wherever they stand on the first three levels. */
export const redact = { paths: SECRET.flatMap((name) => [name, `*.${name}`, `*.*.${name}`]), censor: '[struck out]' };

/** The log of web and worker, one JSON line an event. */
export const log = pino({ base: null, level: process.env.LOG_LEVEL ?? 'info', redact });
