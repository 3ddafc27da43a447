import PgBoss from 'pg-boss';
import { connect } from '@/db/connect';
import { env } from '@/lib/env';
import { JOB_SCHEMA } from '@/lib/jobs';
import { log } from '@/lib/log';
import { createMailer } from '@/lib/mail';
import { storage } from '@/lib/storage/of-environment';
import { handlers } from './handlers';
import { startWork } from './start-work';

const { DATABASE_URL, SMTP_URL, MAIL_FROM, NEXTAUTH_URL, NEXTAUTH_SECRET } = env();
// A mail that is being sent keeps a connection to itself; two are sent at once.
const { db, close } = connect(DATABASE_URL, { max: 6 });
const mailer = createMailer(SMTP_URL, MAIL_FROM);
const boss = new PgBoss({
  connectionString: DATABASE_URL,
  schema: JOB_SCHEMA,
  migrate: false,
  max: 4,
  // Jobs of a worker that was killed come back when their time is up, which has to be noticed (drizzle/0018).
  maintenanceIntervalSeconds: 5,
  // Finished jobs are of no use for long. Those that failed wait for an administrator, except that one which may hold an
  // address that somebody typed is swept away the next night.
  archiveCompletedAfterSeconds: 3600,
  archiveFailedAfterSeconds: 30 * 86_400,
  deleteAfterDays: 1,
});
boss.on('error', (error) => log.error({ err: error }, 'job queue'));

await startWork(boss, handlers({ db, mailer, now: () => new Date(), baseUrl: NEXTAUTH_URL, secret: NEXTAUTH_SECRET, storage: storage() }));
log.info('worker ready');

let stopping = false;
async function stop() {
  if (stopping) return;
  stopping = true;
  // Jobs at hand are finished; others wait for the next worker.
  await boss.stop({ graceful: true, timeout: 5_000 });
  mailer.close();
  await close();
  process.exit(0);
}
process.on('SIGTERM', () => void stop());
process.on('SIGINT', () => void stop());
