import { sql } from 'drizzle-orm';
import PgBoss from 'pg-boss';
import { SMTPServer } from 'smtp-server';
import { afterAll, beforeAll, expect, test, vi } from 'vitest';
import { JOB_SCHEMA, jobs } from '@/lib/jobs';
import { createMailer, type Mailer } from '@/lib/mail';
import { requestPasswordReset } from '@/lib/services/password/request-reset';
import { resetPassword } from '@/lib/services/password/reset';
import { noStorage } from '@/lib/storage/none';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makeTenant, makeVisitor } from '@/tests/support/tenant';
import { handlers } from '@/worker/handlers';
import { startWork } from '@/worker/start-work';

// A refused mail is part of the test, not news.
vi.hoisted(() => {
  process.env.LOG_LEVEL = 'silent';
});

let databases: TestDatabases;
let boss: PgBoss;
let mailer: Mailer;
let server: SMTPServer;
const letters: string[] = [];
let refusals = 0;

beforeAll(async () => {
  databases = await openTestDatabases();
  server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onData(stream, _session, done) {
      let text = '';
      stream.on('data', (chunk: Buffer) => (text += chunk.toString()));
      stream.on('end', () => {
        if (refusals-- > 0) return done(new Error('Try again later'));
        letters.push(text.replace(/=\r?\n/g, ''));
        done();
      });
    },
  });
  const port = await new Promise<number>((resolve) => {
    const listening = server.listen(0, '127.0.0.1', () => resolve((listening.address() as { port: number }).port));
  });
  mailer = createMailer(`smtp://127.0.0.1:${port}`, 'Carryover <carryover@carryover.test>');
  // As the worker runs: under the application's role, which makes no tables.
  boss = new PgBoss({ connectionString: databases.appUrl, schema: JOB_SCHEMA, migrate: false, max: 2 });
  await startWork(boss, handlers({ db: databases.app, mailer, now: () => new Date(), baseUrl: 'https://carryover.test', secret: 'a secret for tests alone', storage: noStorage }));
});
afterAll(async () => {
  await boss.stop({ graceful: false, wait: true });
  mailer.close();
  await new Promise<void>((resolve) => server.close(() => resolve()));
  await databases.close();
});

const letterTo = (address: string) => vi.waitUntil(() => letters.find((letter) => letter.includes(`To: ${address}`)), { timeout: 20_000, interval: 50 });

test('from asking to a new password: queue, worker and mail server', async () => {
  const { ctx } = await makeTenant(databases, { password: 'the password of before' });
  const visitor = makeVisitor(databases);
  await requestPasswordReset({ visitor, input: { email: ctx.person.email } });
  const letter = await letterTo(ctx.person.email);
  const token = /reset-password\/([A-Za-z0-9_-]{43})/.exec(letter)?.[1] ?? '';
  await resetPassword({ visitor, input: { token, password: 'the password of after' } });
});

test('a mail that the server refuses is tried again later', async () => {
  refusals = 1;
  const { ctx } = await makeTenant(databases, { password: 'the password of before' });
  await requestPasswordReset({ visitor: makeVisitor(databases), input: { email: ctx.person.email } });
  const waiting = async () => {
    const { rows } = await databases.app.execute(sql`select state, retry_count from pgboss.job where data->>'email' = ${ctx.person.email}`);
    return rows[0] as { state: string } | undefined;
  };
  await vi.waitUntil(async () => (await waiting())?.state === 'retry', { timeout: 20_000, interval: 50 });
  await databases.app.execute(sql`update pgboss.job set start_after = now() where data->>'email' = ${ctx.person.email}`);
  await letterTo(ctx.person.email);
});

test('a job belongs to the transaction that sends it', async () => {
  const email = `${crypto.randomUUID()}@people.test`;
  await expect(
    databases.app.transaction(async (tx) => {
      await jobs.send(tx, 'mail-password-reset', { email });
      throw new Error('Something else failed');
    }),
  ).rejects.toThrow('Something else failed');
  const { rows } = await databases.app.execute(sql`select 1 from pgboss.job where data->>'email' = ${email}`);
  expect(rows).toEqual([]);
});

test('a job for a queue that nobody made is an error, not silence', async () => {
  await expect(jobs.send(databases.app, 'no-such-queue' as never, {} as never)).rejects.toThrow(/no-such-queue/);
});
