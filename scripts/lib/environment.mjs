import { Problem } from './problem.mjs';

/** What points Carryover at real services; a production start needs every one of them. */
export const SERVICES = ['DATABASE_URL', 'DATABASE_OWNER_URL', 'SMTP_URL', 'MAIL_FROM', 'S3_ENDPOINT', 'S3_BUCKET', 'S3_ACCESS_KEY', 'S3_SECRET_KEY', 'NEXTAUTH_URL', 'NEXTAUTH_SECRET'];

/**
 * What is set from outside, and therefore what has to be started here.
 * @param {Record<string, string>} given the environment with `.env` under it
 */
export function readPlan(given) {
  const isProduction = given.CARRYOVER_ENV === 'production';
  if (given.CARRYOVER_ENV && !isProduction && given.CARRYOVER_ENV !== 'demo') {
    throw new Problem(`CARRYOVER_ENV is "${given.CARRYOVER_ENV}".`, 'Set it to production for real work, or leave it out for the demo.');
  }
  const missing = SERVICES.filter((name) => !given[name]);
  if (isProduction && missing.length > 0) {
    throw new Problem(`A production start needs real services, and these are not set: ${missing.join(', ')}.`, 'Set them in the environment or in .env; .env.example says what each is for.');
  }
  if (Boolean(given.DATABASE_URL) !== Boolean(given.DATABASE_OWNER_URL)) {
    const [set, unset] = given.DATABASE_URL ? ['DATABASE_URL', 'DATABASE_OWNER_URL'] : ['DATABASE_OWNER_URL', 'DATABASE_URL'];
    throw new Problem(`${set} is set and ${unset} isn't: the app and the migrations reach a database as different roles.`, 'Set both to use a database of your own, or neither to use the private one.');
  }
  return { anythingSet: missing.length < SERVICES.length, ownDatabase: !given.DATABASE_URL, ownMail: !given.SMTP_URL, ownStorage: !given.S3_ENDPOINT };
}

/**
 * The environment of web and worker. The owner's address is blanked: the app has no business with that role, and an
 * absent variable would be filled in from `.env` by Next.
 * @param {Record<string, string>} given
 * @param {{ mode: 'production' | 'development', port: number, nextauthSecret: string,
 *   appUrl?: string, smtpUrl?: string, storage?: Record<string, string> }} made
 * @returns {Record<string, string>}
 */
export const appEnvironment = (given, { mode, port, nextauthSecret, appUrl, smtpUrl, storage = {} }) => ({
  CARRYOVER_ENV: 'demo',
  MAIL_FROM: 'Carryover <carryover@localhost>',
  NEXTAUTH_URL: `http://127.0.0.1:${port}`,
  NEXTAUTH_SECRET: nextauthSecret,
  ...given,
  ...(appUrl ? { DATABASE_URL: appUrl } : {}),
  ...(smtpUrl ? { SMTP_URL: smtpUrl } : {}),
  ...storage,
  PORT: String(port),
  DATABASE_OWNER_URL: '',
  NODE_ENV: mode,
  NEXT_TELEMETRY_DISABLED: '1',
});
