import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { newId } from '@/lib/ids';
import { jobs } from '@/lib/jobs';
import { browseJobs, listJobs } from '@/lib/services/job/list';
import { retryJob } from '@/lib/services/job/retry';
import { sweep } from '@/lib/services/session/sweep';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { refusalOf } from '@/tests/support/refusal';
import { makeTenant, type Tenant } from '@/tests/support/tenant';

let databases: TestDatabases;
let ours: Tenant;
let theirs: Tenant;
beforeAll(async () => {
  databases = await openTestDatabases();
  [ours, theirs] = [await makeTenant(databases, { roles: ['administrator'] }), await makeTenant(databases, { roles: ['administrator'] })];
});
afterAll(() => databases.close());

type State = 'created' | 'retry' | 'active' | 'completed' | 'failed' | 'cancelled';

/** A job as pg-boss leaves it. */
async function job({ name = 'make-thumbnail', of, state = 'created', output, at = new Date(), isPutAway = false }: { name?: string; of?: Tenant; state?: State; output?: unknown; at?: Date; isPutAway?: boolean }): Promise<string> {
  const id = newId();
  const data = of ? { organisationId: of.organisationId, photoId: newId() } : {};
  const isOver = state === 'completed' || state === 'failed';
  await databases.app.execute(sql`
    insert into pgboss.job (id, name, data, state, created_on, started_on, completed_on, output)
    values (${id}, ${name}, ${JSON.stringify(data)}, ${state}, ${at.toISOString()}, ${state === 'created' ? null : at.toISOString()}, ${isOver ? at.toISOString() : null}, ${output === undefined ? null : JSON.stringify(output)})`);
  if (isPutAway) await databases.app.execute(sql`with gone as (delete from pgboss.job where id = ${id} returning *) insert into pgboss.archive select * from gone`);
  return id;
}

const idsOf = async (tenant: Tenant, input: Parameters<typeof listJobs>[0]['input'] = {}) => (await listJobs({ ctx: tenant.ctx, input })).rows.map(({ id }) => id);

describe('the jobs of an organisation', () => {
  test('are its own and the nightly work, the newest first, and never a request for a new password', async () => {
    const [older, newer, foreign, nightly] = [
      await job({ of: ours, at: new Date('2026-03-01T09:00:00Z') }),
      await job({ of: ours, at: new Date('2026-03-03T09:00:00Z') }),
      await job({ of: theirs }),
      await job({ name: 'sweep', state: 'failed', at: new Date('2026-03-02T03:17:00Z') }),
    ];
    await jobs.send(databases.app, 'mail-password-reset', { email: 'somebody@people.test' });
    await job({ name: 'mail-password-reset', of: ours });
    await job({ name: '__pgboss__send-it' });
    // What is said to be nobody's and names somebody else is somebody else's.
    await job({ name: 'sweep', of: theirs });
    expect(await idsOf(ours)).toEqual([newer, nightly, older]);
    expect(await idsOf(theirs)).toEqual([foreign, nightly]);
    expect(JSON.stringify(await listJobs({ ctx: ours.ctx, input: {} }))).not.toContain('somebody@people.test');
  });

  test('are found by kind and state; nonsense in the address is no filter', async () => {
    const tenant = await makeTenant(databases, { roles: ['administrator'] });
    const made: Partial<Record<State, string>> = {};
    for (const state of ['created', 'retry', 'active', 'completed', 'failed', 'cancelled'] as const) made[state] = await job({ of: tenant, state, at: new Date(1_780_000_000_000 + Object.keys(made).length * 1_000) });
    const archived = await job({ of: tenant, state: 'completed', isPutAway: true, at: new Date(1_770_000_000_000) });
    const kind = 'make-thumbnail';
    expect(await idsOf(tenant, { kind, state: 'waiting' })).toEqual([made.retry, made.created]);
    expect(await idsOf(tenant, { kind, state: 'running' })).toEqual([made.active]);
    expect(await idsOf(tenant, { kind, state: 'failed' })).toEqual([made.failed]);
    expect(await idsOf(tenant, { kind, state: 'done' })).toEqual([made.completed, archived]);
    expect(await idsOf(tenant, { kind })).toHaveLength(6);
    for (const nonsense of ['mail-password-reset', 'nonsense', "' or 1=1"]) expect(await idsOf(tenant, { kind: nonsense as never, state: 'failed' })).toContain(made.failed);
  });

  test('show their error in words, without a stack or a statement', async () => {
    const tenant = await makeTenant(databases, { roles: ['administrator'] });
    await job({ of: tenant, state: 'failed', at: new Date('2026-03-01T09:00:00Z'), output: { name: 'Error', message: 'The object of the photo is gone\n    at secret.ts:1', stack: 'at secret.ts:1' } });
    await job({ of: tenant, state: 'failed', at: new Date('2026-03-02T09:00:00Z'), output: { message: 'Failed query: select "email" from "person"\nparams: a@people.test', cause: { code: '57014' } } });
    const { rows } = await listJobs({ ctx: tenant.ctx, input: { kind: 'make-thumbnail' } });
    expect(rows.map(({ error }) => error)).toEqual(['Something went wrong inside Carryover. Its log says what.', 'The object of the photo is gone']);
    expect(JSON.stringify(rows)).not.toMatch(/secret|select|people\.test/);
  });

  test('come page by page as they come all at once, also while more are added', async () => {
    const tenant = await makeTenant(databases, { roles: ['administrator'] });
    // Some of the same instant, which one statement makes them.
    for (let i = 0; i < 7; i++) await job({ of: tenant, at: new Date(1_780_000_000_000 + Math.floor(i / 3)) });
    const page = (limit: number, cursor?: string) => browseJobs({ ctx: tenant.ctx, input: { kind: 'make-thumbnail', limit, cursor } });
    const whole = (await page(100)).jobs.map(({ id }) => id);
    expect(whole).toHaveLength(7);
    for (const limit of [1, 2, 6, 7]) {
      const walked: string[] = [];
      for (let cursor: string | undefined; ; ) {
        const { jobs: some, next } = await page(limit, cursor);
        walked.push(...some.map(({ id }) => id));
        if (next === null) break;
        cursor = next;
        if (limit === 2) await job({ of: tenant, at: new Date() });
      }
      expect(walked.slice(-7)).toEqual(limit === 2 ? whole : walked.slice(-7));
      expect(new Set(walked).size).toBe(walked.length);
    }
  });
});

describe('trying a job again', () => {
  test('gives one that failed a whole round, once, with a row in the audit', async () => {
    const jobId = await job({ of: ours, state: 'failed', output: { message: 'Once' } });
    const answers = await Promise.all([1, 2, 3].map(() => retryJob({ ctx: ours.ctx, input: { jobId } })));
    expect(answers.filter(({ isRetried }) => isRetried)).toHaveLength(1);
    expect(answers.map(({ state }) => state)).toEqual(['waiting', 'waiting', 'waiting']);
    const { rows } = await databases.app.execute(sql`select state::text, retry_count, retry_limit, started_on, completed_on from pgboss.job where id = ${jobId}`);
    expect(rows).toEqual([{ state: 'retry', retry_count: 0, retry_limit: 10, started_on: null, completed_on: null }]);
    const audited = await ours.asOwner((tx) => tx.execute(sql`select action, changed from audit where entity = 'job' and entity_id = ${jobId}`));
    expect(audited.rows).toEqual([{ action: 'retry.job', changed: { job: 'Small picture of a photo' } }]);
  });

  test('leaves alone what has not failed, and says what it is at', async () => {
    for (const [state, said] of [['created', 'waiting'], ['active', 'running'], ['completed', 'done']] as const) {
      const jobId = await job({ of: ours, state });
      expect(await retryJob({ ctx: ours.ctx, input: { jobId } })).toEqual({ id: jobId, isRetried: false, state: said });
    }
  });

  test('is not found for another organisation’s, for a request for a new password, or for what nobody made', async () => {
    const foreign = await job({ of: theirs, state: 'failed' });
    const reset = await job({ name: 'mail-password-reset', state: 'failed' });
    const resetOfOurs = await job({ name: 'mail-password-reset', of: ours, state: 'failed' });
    for (const jobId of [foreign, reset, resetOfOurs, newId()]) expect((await refusalOf(retryJob({ ctx: ours.ctx, input: { jobId } }))).code).toBe('not-found');
    const { rows } = await databases.app.execute(sql`select distinct state::text from pgboss.job where id in (${foreign}, ${reset}, ${resetOfOurs})`);
    expect(rows).toEqual([{ state: 'failed' }]);
  });

  test('is for administrators, as seeing them is', async () => {
    const manager = await ours.addPerson({ roles: ['manager', 'engineer', 'technician', 'trainer'] });
    const jobId = await job({ of: ours, state: 'failed' });
    expect((await refusalOf(retryJob({ ctx: manager, input: { jobId } }))).code).toBe('forbidden');
    expect((await refusalOf(listJobs({ ctx: manager, input: {} }))).code).toBe('forbidden');
    expect((await refusalOf(browseJobs({ ctx: manager, input: {} }))).code).toBe('forbidden');
  });
});

test('requests for a new password that failed are swept away the next night, other failed jobs stay', async () => {
  const DAYS_AGO = new Date(Date.now() - 48 * 3_600_000);
  const old = await job({ name: 'mail-password-reset', state: 'failed', at: DAYS_AGO });
  const fresh = await job({ name: 'mail-password-reset', state: 'failed' });
  const picture = await job({ of: ours, state: 'failed', at: DAYS_AGO });
  await sweep({ db: databases.app, now: () => new Date() });
  const { rows } = await databases.app.execute(sql`select id from pgboss.job where id in (${old}, ${fresh}, ${picture})`);
  expect(rows.map(({ id }) => id).sort()).toEqual([fresh, picture].sort());
});
