import { sql } from 'drizzle-orm';
import PgBoss from 'pg-boss';
import { afterAll, afterEach, beforeAll, describe, expect, test, vi } from 'vitest';
import { asTenant } from '@/db/connect';
import { JOB_SCHEMA, jobs } from '@/lib/jobs';
import { createMailer, type Mailer } from '@/lib/mail';
import { listJobs } from '@/lib/services/job/list';
import { retryJob } from '@/lib/services/job/retry';
import type { SeenJobRow } from '@/lib/services/job/seen';
import { postMail } from '@/lib/services/mail/post';
import { sendMail, type Post } from '@/lib/services/mail/send';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { openTestStorage, type TestStorage } from '@/tests/support/storage';
import { makeTenant, type Tenant } from '@/tests/support/tenant';
import { handlers } from '@/worker/handlers';
import { startWork } from '@/worker/start-work';
import { PostOffice, type Manner } from './post-office';

// What a bad server brings about is part of the test, not news.
vi.hoisted(() => {
  process.env.LOG_LEVEL = 'silent';
});

const PATIENCE = { timeout: 25_000, interval: 50 };
let databases: TestDatabases;
let storage: TestStorage;
let office: PostOffice;
let mailer: Mailer;
let boss: PgBoss;
let post: Post;
let tenant: Tenant;

beforeAll(async () => {
  [databases, storage, office] = await Promise.all([openTestDatabases(), openTestStorage(), new PostOffice().open()]);
  tenant = await makeTenant(databases, { roles: ['administrator'] });
  mailer = createMailer(office.url, 'Carryover <carryover@carryover.test>', { connectionMs: 500, greetingMs: 500, totalMs: 1_000 });
  post = { db: databases.app, mailer, now: () => new Date(), baseUrl: 'https://carryover.test', secret: 'a secret for tests alone', storage: storage.storage };
  boss = new PgBoss({ connectionString: databases.appUrl, schema: JOB_SCHEMA, migrate: false, max: 2 });
  await startWork(boss, handlers(post));
});
afterAll(async () => {
  await boss.stop({ graceful: false, wait: true });
  mailer.close();
  await Promise.all([office.close(), storage.close()]);
  await databases.close();
});
afterEach(() => {
  office.manner = 'takes';
});

const someAddress = () => `${crypto.randomUUID()}@people.test`;

/** A mail in the outbox, its job with it unless the test sends it by hand. */
async function posted({ to = someAddress(), attachment, byHand = false }: { to?: string; attachment?: { key: string; name: string }; byHand?: boolean } = {}) {
  const { organisationId } = tenant;
  const mailId = await asTenant(databases.app, { organisationId }, (tx) =>
    postMail(tx, byHand ? { send: async () => undefined } : jobs, {
      organisationId, kind: 'notice', to, subject: 'A notice', text: 'What there is to say.', entity: 'organisation', entityId: organisationId, attachment, at: new Date(),
    }),
  );
  return { to, mailId, key: { organisationId, mailId }, messageId: `<${mailId}@carryover.test>` };
}

const rowOf = async (mailId: string) => {
  const { rows } = await tenant.asOwner((tx) => tx.execute(sql`select state, attempts, last_error as "lastError", sent_at is not null as "isSent" from mail where id = ${mailId}`));
  return rows[0] as { state: string; attempts: number; lastError: string | null; isSent: boolean };
};

/** As the administrator sees it, once it looks so. */
const shown = (to: string, looks: (job: SeenJobRow) => boolean) =>
  vi.waitUntil(async () => (await listJobs({ ctx: tenant.ctx, input: { kind: 'send-mail' } })).rows.find((job) => job.mail?.to === to && looks(job)), PATIENCE);

/** As if the time to the next try had passed. */
const timePasses = (mailId: string) => databases.app.execute(sql`update pgboss.job set start_after = now() where data->>'mailId' = ${mailId} and state = 'retry'`);

describe('a mail that the server does not take', () => {
  const troubles: [what: string, begin: () => unknown, end: () => unknown, error: RegExp, hadText: boolean][] = [
    ['because nothing listens', () => office.close(), () => office.open(), /can’t be reached/, false],
    ['because it greets too late', ...inManner('greets late'), /did not answer in time/, false],
    ['because it answers too late', ...inManner('answers late'), /did not answer in time/, true],
    ['because it puts it off', ...inManner('puts off'), /put it off: 451 4\.2\.0 Come again later/, false],
    ['because it closes after the text', ...inManner('closes after the text'), /closed the connection/, true],
  ];
  function inManner(manner: Manner): [() => unknown, () => unknown] {
    return [() => (office.manner = manner), () => (office.manner = 'takes')];
  }

  test.each(troubles)('%s is shown with its error, tried again with the same Message-ID, and goes out once', async (_what, begin, end, error, hadText) => {
    await begin();
    const { to, mailId, messageId } = await posted();
    for (const tries of [1, 2]) {
      await timePasses(mailId);
      const job = await shown(to, ({ attempts, state }) => attempts === tries && state === 'waiting');
      expect(job).toMatchObject({ name: 'Mail', error: expect.stringMatching(error), canRetry: false, mail: { state: 'waiting', subject: 'A notice', sentAt: null } });
      expect(Date.parse(job.nextTryAt ?? '')).toBeGreaterThan(Date.now());
    }
    await end();
    await timePasses(mailId);
    const done = await shown(to, ({ state }) => state === 'done');
    expect(done).toMatchObject({ attempts: 3, error: null, mail: { state: 'sent' } });
    expect(office.takenBy(to).map((letter) => letter.messageId)).toEqual([messageId]);
    expect(office.seenFor(to).map((letter) => letter.messageId)).toEqual(Array(hadText ? 3 : 1).fill(messageId));
  });

  test('for good is given up at once, in the server’s words; tried again by hand it goes out', async () => {
    const to = someAddress();
    office.towards.set(to, 'refuses the address');
    const { mailId } = await posted({ to });
    const job = await shown(to, ({ state }) => state === 'failed');
    expect(job).toMatchObject({ attempts: 1, error: 'The mail server refused it: 550 5.1.1 Nobody of this name', canRetry: true, mail: { state: 'given-up' } });
    expect(await rowOf(mailId)).toMatchObject({ state: 'given-up', attempts: 1 });

    office.towards.delete(to);
    const both = await Promise.all([1, 2].map(() => retryJob({ ctx: tenant.ctx, input: { jobId: job.id } })));
    expect(both.map(({ isRetried }) => isRetried).sort()).toEqual([false, true]);
    await shown(to, ({ state, mail }) => state === 'done' && mail?.state === 'sent');
    expect(office.takenBy(to)).toHaveLength(1);
    expect(await retryJob({ ctx: tenant.ctx, input: { jobId: job.id } })).toEqual({ id: job.id, isRetried: false, state: 'done' });
    const { rows } = await tenant.asOwner((tx) => tx.execute(sql`select changed from audit where action = 'retry.job' and entity_id = ${job.id}`));
    expect(rows).toEqual([{ changed: { job: 'Mail' } }]);
  });

  test('ever is given up after the last try, and has a whole round again when it is tried by hand', async () => {
    const to = someAddress();
    office.towards.set(to, 'puts off');
    const { mailId } = await posted({ to });
    const { id } = await shown(to, ({ attempts, state }) => attempts === 1 && state === 'waiting');
    await databases.app.execute(sql`update pgboss.job set retry_count = retry_limit - 1 where id = ${id}`);
    await timePasses(mailId);
    const job = await shown(to, ({ state }) => state === 'failed');
    expect(job).toMatchObject({ attempts: 2, canRetry: true, error: expect.stringContaining('451'), mail: { state: 'given-up' } });
    await retryJob({ ctx: tenant.ctx, input: { jobId: id } });
    await shown(to, ({ attempts, state, mail }) => attempts === 3 && state === 'waiting' && mail?.state === 'waiting');
    const { rows } = await databases.app.execute(sql`select retry_count, retry_limit from pgboss.job where id = ${id}`);
    expect(rows).toEqual([{ retry_count: 0, retry_limit: 14 }]);
  });
});

describe('a mail that is being sent', () => {
  test('is left alone by another worker', async () => {
    const { to, key } = await posted({ byHand: true });
    const send = () => sendMail(post, key, { isLast: false });
    const outcomes = await Promise.allSettled([send(), send(), send()]);
    expect(outcomes.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    for (const outcome of outcomes) if (outcome.status === 'rejected') expect(String(outcome.reason)).toContain('Another worker is sending this mail.');
    // And when it is done there is nothing left to do.
    await send();
    expect(office.takenBy(to)).toHaveLength(1);
    expect(await rowOf(key.mailId)).toEqual({ state: 'sent', attempts: 1, lastError: null, isSent: true });
  });

  test('to a server that takes its time holds up no other', async () => {
    const slow = someAddress();
    office.towards.set(slow, 'answers late');
    await posted({ to: slow });
    await vi.waitUntil(() => office.seenFor(slow).length > 0, PATIENCE);
    const { to } = await posted({ byHand: true }).then(async (other) => (await sendMail(post, other.key, { isLast: false }), other));
    expect(office.takenBy(to)).toHaveLength(1);
    expect(office.takenBy(slow)).toHaveLength(0);
  });

  test('is noted as sent although its connection to the database was lost meanwhile', async () => {
    const { to, mailId, key } = await posted({ byHand: true });
    const losing: Mailer = {
      ...mailer,
      async send(letter) {
        await mailer.send(letter);
        await databases.app.execute(sql`select pg_terminate_backend(pid) from pg_locks where locktype = 'advisory' and pid <> pg_backend_pid() and database = (select oid from pg_database where datname = current_database())`);
      },
    };
    await sendMail({ ...post, mailer: losing }, key, { isLast: false });
    expect(office.takenBy(to)).toHaveLength(1);
    expect(await rowOf(mailId)).toMatchObject({ state: 'sent', isSent: true });
  });
});

test('what is attached goes along, and a mail whose attachment is gone waits', async () => {
  await storage.storage.put('attached', Buffer.from('Measured and found good'), 'text/plain');
  const { to, key } = await posted({ byHand: true, attachment: { key: 'attached', name: 'dossier.txt' } });
  await sendMail(post, key, { isLast: false });
  expect(office.takenBy(to)[0]?.text).toContain('filename=dossier.txt');

  const gone = await posted({ byHand: true, attachment: { key: 'gone', name: 'dossier.txt' } });
  await expect(sendMail(post, gone.key, { isLast: false })).rejects.toThrow('gone');
  expect(await rowOf(gone.mailId)).toMatchObject({ state: 'waiting', attempts: 1, lastError: 'The mail could not be put together.' });
});

test('a transaction that fails posts nothing', async () => {
  const { organisationId } = tenant;
  const to = someAddress();
  const failing = asTenant(databases.app, { organisationId }, async (tx) => {
    await postMail(tx, jobs, { organisationId, kind: 'notice', to, subject: 'A notice', text: 'Words', entity: 'organisation', entityId: organisationId, at: new Date() });
    throw new Error('Something else failed');
  });
  await expect(failing).rejects.toThrow('Something else failed');
  const { rows } = await tenant.asOwner((tx) => tx.execute(sql`select 1 from mail where to_address = ${to} union all select 1 from pgboss.job where data->>'mailId' in (select id::text from mail where to_address = ${to})`));
  expect(rows).toEqual([]);
});
