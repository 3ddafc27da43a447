import { sql } from 'drizzle-orm';
import PgBoss from 'pg-boss';
import { afterAll, beforeAll, describe, expect, test, vi } from 'vitest';
import { JOB_SCHEMA, type JobName } from '@/lib/jobs';
import { openTestDatabases } from '@/tests/support/context';
import { seededRandom } from '@/tests/support/random';
import { openTestStorage } from '@/tests/support/storage';
import { KINDS, type Ground, type Task } from './kinds-to-kill';
import { PostOffice } from '@/tests/integration/mail/post-office';
import { openVictims, type Victims } from './victims';

/** How often a worker is killed over each kind of job. */
const POINTS = 50;
/** How often it is left to do its work, to count its steps. */
const UNHURT = 3;
/** More than it ever counts. */
const NEVER = Number.MAX_SAFE_INTEGER;
const MINUTES = 60_000;

let victims: Victims;
beforeAll(async () => {
  victims = await openVictims({ ready: 3 });
}, 2 * MINUTES);
afterAll(() => victims.close(), MINUTES);

const environment = ({ databases, storage, office }: Ground): Record<string, string> => ({
  DATABASE_URL: databases.appUrl,
  NEXTAUTH_URL: 'http://carryover.test',
  NEXTAUTH_SECRET: 'a secret for tests alone, of no use anywhere',
  SMTP_URL: office.url,
  MAIL_FROM: 'Carryover <carryover@carryover.test>',
  S3_ENDPOINT: storage.settings.endpoint,
  S3_BUCKET: storage.settings.bucket,
  S3_ACCESS_KEY: storage.settings.accessKey,
  S3_SECRET_KEY: storage.settings.secretKey,
  LOG_LEVEL: 'silent',
});

/** Until the database has done whatever the dead had asked of it. */
const untilGone = ({ databases }: Ground, name: string) =>
  vi.waitUntil(async () => {
    const { rows } = await databases.owner.execute(sql`select 1 from pg_stat_activity where application_name = ${name}`);
    return rows.length === 0;
  }, { timeout: MINUTES, interval: 10 });

const stateOf = async ({ databases }: Ground, { marker }: Task) => {
  const { rows } = await databases.app.execute<{ state: string }>(sql`select state::text from pgboss.job where data::text like ${`%${marker}%`} order by start_after limit 1`);
  return rows[0]?.state;
};

/** As if what a job has for its work had passed: it is for whoever looks next. */
async function timePasses({ databases }: Ground, kind: JobName) {
  await databases.app.execute(sql`update pgboss.job set started_on = started_on - interval '1 minute' where state = 'active' and name = ${kind}`);
}

describe.concurrent.each(Object.keys(KINDS) as JobName[])('a worker that is killed over %s', (kind) => {
  test(`at ${POINTS} points of it leaves what is done once by the next`, async () => {
    const [databases, storage, office] = await Promise.all([openTestDatabases(), openTestStorage(), new PostOffice().open()]);
    const ground: Ground = { databases, storage, office };
    const another = new PgBoss({ connectionString: databases.appUrl, schema: JOB_SCHEMA, migrate: false, supervise: false, schedule: false, max: 1 });
    await another.start();
    const ask = await KINDS[kind](ground);
    const random = seededRandom(50);

    // Those that nobody kills say how many steps there are: what else a worker says on its wires meanwhile only adds to them.
    const counted: number[] = [];
    for (let i = 0; i < UNHURT; i += 1) {
      const whole = await ask();
      const unhurt = await victims.take();
      unhurt.go({ env: environment(ground), marker: whole.marker, point: NEVER });
      await vi.waitUntil(async () => (await stateOf(ground, whole)) === 'completed', { timeout: MINUTES, interval: 10 });
      counted.push(await unhurt.steps());
      unhurt.child.kill('SIGKILL');
      await unhurt.ended;
    }
    const total = Math.min(...counted);

    const killed: { task: Task; point: number; wasActive: boolean; mayBeTwice: boolean }[] = [];
    for (const slot of random.shuffle(Array.from({ length: POINTS }, (_, i) => i))) {
      const point = 1 + Math.floor((total * (slot + random.unit())) / POINTS);
      const task = await ask();
      const victim = await victims.take();
      const name = `victim ${killed.length}`;
      const env = environment(ground);
      victim.go({ env: { ...env, DATABASE_URL: `${env.DATABASE_URL}?application_name=${encodeURIComponent(name)}` }, marker: task.marker, point });
      expect(await victim.ended).toBe('SIGKILL');
      await Promise.all([untilGone(ground, name), office.untilEmpty()]);
      const wasTaken = task.address !== undefined && office.takenBy(task.address).length > 0;
      killed.push({ task, point, wasActive: (await stateOf(ground, task)) === 'active', mayBeTwice: wasTaken && !(await task.isNoted()) });
      // One night's work at a time: the next can only begin when the dead one's time is up.
      if (kind === 'sweep') {
        await timePasses(ground, kind);
        await another.maintain();
      }
    }

    await timePasses(ground, kind);
    const workers = [1, 2].map(() => victims.startAsEver(environment(ground)));
    const leftOver = async () => {
      // What waits for its next try waits no longer.
      await databases.app.execute(sql`update pgboss.job set start_after = now() where state = 'retry' and start_after > now()`);
      // One that came back between these two statements still waits; one that is planned for another day doesn't count.
      const { rows } = await databases.app.execute(sql`select 1 from pgboss.job where name = ${kind} and state <> 'completed' and (state = 'retry' or start_after <= now())`);
      return rows.length;
    };
    await vi.waitUntil(async () => (await leftOver()) === 0, { timeout: 4 * MINUTES, interval: 200 });
    await Promise.all(workers.map((worker) => new Promise((resolve) => worker.once('exit', resolve).kill('SIGTERM'))));

    for (const { task, point, mayBeTwice } of killed) {
      const letters = task.address === undefined ? [] : office.takenBy(task.address);
      if (task.address !== undefined) expect([point, letters.length]).toEqual([point, mayBeTwice ? 2 : 1]);
      expect([point, await task.problems(letters)]).toEqual([point, []]);
    }
    // The points lie in the work, and where there is a gap that a second copy comes from, they hit it and its sides.
    expect(killed.filter(({ wasActive }) => wasActive).length).toBeGreaterThan(POINTS / 2);
    if (killed[0]?.task.address !== undefined) {
      const twice = killed.filter(({ mayBeTwice }) => mayBeTwice).length;
      expect(twice).toBeGreaterThan(0);
      expect(twice).toBeLessThan(POINTS / 2);
    }
    await another.stop({ graceful: false, wait: true });
    await Promise.all([office.close(), storage.close()]);
    await databases.close();
  }, 15 * MINUTES);
});

test('what a killed worker was at comes back within a minute', async () => {
  const databases = await openTestDatabases();
  const LOOKS_EVERY_S = 5;
  const { rows } = await databases.app.execute(sql`select name, expire_seconds + ${LOOKS_EVERY_S} + 2 * retry_delay as "atMostS", retry_limit > 0 as "isTriedAgain" from pgboss.queue where name not like '\\_\\_%' order by name`);
  await databases.close();
  expect(rows.map(({ name }) => name)).toEqual(Object.keys(KINDS).sort());
  for (const row of rows) expect(row).toEqual({ name: row.name, atMostS: expect.any(Number), isTriedAgain: true });
  for (const { name, atMostS } of rows) expect([name, Number(atMostS) <= 60]).toEqual([name, true]);
});
