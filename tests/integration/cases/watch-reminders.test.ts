import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, expect, it, vi } from 'vitest';
import { asTenant } from '@/db/connect';
import { lockCase } from '@/db/queries/case';
import { lockWatch } from '@/db/queries/watch';
import { newId } from '@/lib/ids';
import type { JobData } from '@/lib/jobs';
import { assignCase } from '@/lib/services/case/assign';
import { callCause } from '@/lib/services/case/call';
import type { Ctx } from '@/lib/services/context';
import { endMembership } from '@/lib/services/membership/end';
import { setNotices } from '@/lib/services/notice/choices';
import { browseNotices } from '@/lib/services/notice/list';
import { mailDailyNotices } from '@/lib/services/notice/mail-daily';
import { readByLink } from '@/lib/services/watch/by-link';
import { createWatchLink } from '@/lib/services/watch/links';
import { listWatches } from '@/lib/services/watch/list';
import { addWatchReading, takeBackWatchReading } from '@/lib/services/watch/readings';
import { remindOfWatch } from '@/lib/services/watch/remind';
import { startWatch } from '@/lib/services/watch/start';
import { makeClock, MINUTE_MS } from '@/tests/support/clock';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makePost } from '@/tests/support/post';
import { makeVisitor, type Tenant } from '@/tests/support/tenant';
import { makeWorkshop, openACase, readCautions } from './support';

// The site is in Chicago: six hours behind universal time in February, so that a quarter to six there is 11:45.
const BEGAN = new Date('2026-02-02T16:00:00Z');
const morning = (day: string) => `2026-02-${day}T11:45:00.000Z`;
const YES = { answer: 'yes' as const };

let databases: TestDatabases;
beforeAll(async () => {
  databases = await openTestDatabases();
});
afterAll(() => databases.close());

/** A watch of the oil: its amount is read weekly, what is caught every other week. */
async function watched() {
  const clock = makeClock(BEGAN);
  const workshop: Tenant = await makeWorkshop(databases, { now: clock.now });
  const { ctx } = workshop;
  const [caseId, watchId] = [await openACase(workshop), newId()];
  await callCause({ ctx, input: { id: newId(), caseId, mainCause: 'rings-worn', sureness: 'sure', whyNotLeading: 'Seen' } });
  await startWatch({ ctx, input: { id: watchId, caseId, begin: [YES, YES, YES, YES] } });
  const { post, letters, deliver } = makePost(databases, clock.now);

  /** What is queued, in its order, done or not. */
  const queued = async () => {
    const { rows } = await databases.owner.execute<{ data: JobData['remind-watch']; startAfter: string }>(sql`select data, start_after as "startAfter" from pgboss.job where name = 'remind-watch' and data->>'watchId' = ${watchId} order by created_on, start_after`);
    return rows.map(({ data, startAfter }) => ({ data, at: new Date(startAfter) }));
  };
  const lastPlanned = async () => (await queued()).at(-1)?.data.due;
  const reminded = async (by: Ctx) => (await browseNotices({ ctx: by, input: {} })).notices.filter(({ kind }) => kind === 'watch-due');
  const done = new Set<string>();
  /** Does what is queued as a worker would, until the clock stands at this time. */
  const until = async (iso: string) => {
    const end = new Date(iso);
    for (;;) {
      const next = (await queued()).find(({ data, at }) => at <= end && !done.has(data.due));
      if (!next) break;
      done.add(next.data.due);
      clock.forward(Math.max(0, next.at.getTime() - clock.now().getTime()));
      await remindOfWatch(post, next.data);
    }
    clock.forward(end.getTime() - clock.now().getTime());
  };
  const read = async (checkId = 'oil-amount', answer: { state?: string; value?: string } = { state: 'film' }) => {
    const id = newId();
    await readCautions(ctx, caseId, checkId);
    await addWatchReading({ ctx, input: { id, caseId, watchId, checkId, ...answer } });
    return id;
  };
  return { ...workshop, clock, caseId, watchId, post, letters, deliver, queued, lastPlanned, reminded, until, read };
}

it('is planned for the morning of the day on which the first reading is due, where the site is', async () => {
  const { queued } = await watched();
  expect(await queued()).toMatchObject([{ data: { due: morning('09') }, at: new Date(morning('09')) }]);
});

it('tells whoever has the case, and is in the mail of that day', async () => {
  const { ctx, caseId, addPerson, organisationId, clock, post, letters, deliver, reminded, until } = await watched();
  const colleague = await addPerson();
  await assignCase({ ctx, input: { caseId, personId: colleague.person.id } });
  await until(morning('09'));
  expect(await reminded(colleague)).toMatchObject([{ place: `/cases/${caseId}/watch`, sentence: expect.stringContaining('A reading is due') }]);
  expect(await reminded(ctx)).toEqual([]);

  const { rows } = await databases.owner.execute<{ at: string }>(sql`select start_after as at from pgboss.job where name = 'mail-daily-notices' and data->>'personId' = ${colleague.person.id}`);
  expect(rows.map(({ at }) => new Date(at).toISOString())).toEqual(['2026-02-09T12:00:00.000Z']);
  clock.forward(15 * MINUTE_MS);
  await mailDailyNotices(post, { organisationId, personId: colleague.person.id });
  await deliver(organisationId);
  expect(letters.filter(({ text }) => text.includes(`https://carryover.test/cases/${caseId}/watch`))).toMatchObject([{ to: colleague.person.email }]);
});

it('goes by mail at once to whoever has set so', async () => {
  const { ctx, organisationId, letters, deliver, until } = await watched();
  await setNotices({ ctx, input: { 'watch-due': 'at-once' } });
  await until(morning('09'));
  await deliver(organisationId);
  expect(letters).toMatchObject([{ to: ctx.person.email, subject: expect.stringMatching(/^A reading is due: case \d+/) }]);
});

it('tells who began the watch when whoever has the case has left', async () => {
  const { ctx, caseId, addPerson, reminded, until } = await watched();
  const [colleague, clerk] = [await addPerson(), await addPerson({ roles: ['administrator'] })];
  await assignCase({ ctx, input: { caseId, personId: colleague.person.id } });
  await endMembership({ ctx: clerk, input: { personId: colleague.person.id } });
  await until(morning('09'));
  expect(await reminded(ctx)).toHaveLength(1);
});

it('tells again every third day of what nobody reads', async () => {
  const { ctx, reminded, until } = await watched();
  const told: number[] = [];
  for (const day of ['08', '09', '10', '11', '12', '13', '14', '15']) {
    await until(`2026-02-${day}T23:00:00Z`);
    told.push((await reminded(ctx)).length);
  }
  expect(told).toEqual([0, 1, 1, 1, 2, 2, 2, 3]);
});

it('tells on its own day of what comes due while another is overdue', async () => {
  const { ctx, reminded, until, read } = await watched();
  await until('2026-02-03T16:00:00Z');
  // Due again on the 17th; the amount is due on the 9th, and told again on the 12th, the 15th and the 18th.
  await read('oil-caught', { value: '0.1 mL/h' });
  await until('2026-02-16T23:00:00Z');
  expect(await reminded(ctx)).toHaveLength(3);
  await until('2026-02-17T23:00:00Z');
  const [last, ...before] = await reminded(ctx);
  expect(before).toHaveLength(3);
  expect(last?.sentence).toContain('caught');
});

it('is put off by a reading, and due again the next morning when that is taken back', async () => {
  const { ctx, caseId, watchId, lastPlanned, reminded, until, read } = await watched();
  await until('2026-02-08T16:00:00Z');
  const readingId = await read();
  expect(await lastPlanned()).toBe(morning('15'));
  await until('2026-02-10T16:00:00Z');
  expect(await reminded(ctx)).toEqual([]);
  await takeBackWatchReading({ ctx, input: { caseId, watchId, readingId, whyTakenBack: 'The wrong unit' } });
  expect(await lastPlanned()).toBe(morning('11'));
  await until(morning('11'));
  expect(await reminded(ctx)).toHaveLength(1);
});

it('tells nothing of what somebody read by a link', async () => {
  const { ctx, caseId, watchId, clock, lastPlanned, reminded, until } = await watched();
  await createWatchLink({ ctx, input: { id: newId(), caseId, watchId, checkId: 'oil-amount', forWhom: 'The driver' } });
  const [watch] = (await listWatches({ ctx, input: { caseId } })).watches;
  const token = watch?.links[0]?.path?.replace('/watch/', '') ?? '';
  await until('2026-02-08T16:00:00Z');
  await readByLink({ visitor: makeVisitor(databases, { now: clock.now }), input: { token, id: newId(), name: 'Someone', hasReadCautions: true, state: 'film' } });
  await until('2026-02-14T23:00:00Z');
  expect(await reminded(ctx)).toEqual([]);
  expect(await lastPlanned()).toBe(morning('15'));
});

it('waits for whoever writes to the case, and neither is in the way of the other', async () => {
  const { ctx, caseId, watchId, organisationId, clock, post, queued, reminded } = await watched();
  const [first] = await queued();
  if (!first) throw new Error('nothing is planned');
  clock.forward(first.at.getTime() - clock.now().getTime());
  let job: Promise<void> | undefined;
  await asTenant(databases.app, { organisationId }, async (tx) => {
    await lockCase(tx, { organisationId, caseId });
    const { rows: [own] } = await tx.execute<{ pid: number }>(sql`select pg_backend_pid() as pid`);
    job = remindOfWatch(post, first.data);
    await vi.waitUntil(async () => (await databases.owner.execute(sql`select 1 from pg_locks where not granted and ${own?.pid ?? 0} = any(pg_blocking_pids(pid))`)).rows.length > 0, { timeout: 10_000, interval: 10 });
    await lockWatch(tx, { organisationId, watchId });
  });
  await job;
  expect(await reminded(ctx)).toHaveLength(1);
});
