import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { signWatchToken, readWatchToken } from '@/lib/auth/watch-token';
import { newId } from '@/lib/ids';
import { openCase } from '@/lib/services/case/open';
import { callCause } from '@/lib/services/case/call';
import { readCase } from '@/lib/services/case/read';
import { reopenCase } from '@/lib/services/case/reopen';
import { readByLink, viewWatchLink } from '@/lib/services/watch/by-link';
import { endWatch } from '@/lib/services/watch/end';
import { createWatchLink, revokeWatchLink } from '@/lib/services/watch/links';
import { listWatches } from '@/lib/services/watch/list';
import { addWatchReading, takeBackWatchReading } from '@/lib/services/watch/readings';
import { remindOfWatch } from '@/lib/services/watch/remind';
import { startWatch } from '@/lib/services/watch/start';
import { listNotices } from '@/lib/services/notice/list';
import { chooseRepair } from '@/lib/services/repair/choose';
import { readRepairPlan } from '@/lib/services/repair/read-plan';
import { endRepair, markStep } from '@/lib/services/repair/work';
import { acknowledgeRepair } from '@/lib/services/repair/acknowledge';
import { DAY_MS, makeClock } from '@/tests/support/clock';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makePost } from '@/tests/support/post';
import { makeVisitor, TEST_SECRET, type Tenant } from '@/tests/support/tenant';
import { makeWorkshop, openACase, readCautions } from './support';

const CAUSE = 'rings-worn';
const clock = makeClock();
let databases: TestDatabases;
let workshop: Tenant;
beforeAll(async () => {
  databases = await openTestDatabases();
  workshop = await makeWorkshop(databases, { now: clock.now });
});
afterAll(() => databases.close());

const YES = { answer: 'yes' as const };

/** A case that was called, with so many repairs done. */
async function called(repairs = 0) {
  const { ctx } = workshop;
  const caseId = await openACase(workshop);
  const { remedies } = await readRepairPlan({ ctx, input: { caseId } });
  for (const { remedyId, cautions, steps } of remedies.slice(0, repairs)) {
    const repairId = newId();
    await chooseRepair({ ctx, input: { id: repairId, caseId, remedyId, whyBefore: 'Seen' } });
    if (cautions.length > 0) await acknowledgeRepair({ ctx, input: { caseId, remedyId, cautions: cautions.map(({ id }) => ({ id: newId(), cautionId: id })) } });
    for (const step of steps.keys()) await markStep({ ctx, input: { id: newId(), caseId, repairId, step, mark: 'done' } });
    await endRepair({ ctx, input: { caseId, repairId, outcome: 'done' } });
  }
  await callCause({ ctx, input: { id: newId(), caseId, mainCause: CAUSE, sureness: 'sure', whyNotLeading: 'Seen' } });
  return caseId;
}

/** One that is watched. */
async function watched({ repairs = 0, odometer }: { repairs?: number; odometer?: string } = {}) {
  const { ctx } = workshop;
  const caseId = await called(repairs);
  const watchId = newId();
  await startWatch({ ctx, input: { id: watchId, caseId, begin: [YES, YES, YES, YES], odometer } });
  const seen = async () => {
    const [watch] = (await listWatches({ ctx, input: { caseId } })).watches;
    if (!watch) throw new Error('not watched');
    return watch;
  };
  const read = async (checkId: string, answer: { state?: string; value?: string; odometer?: string }, id = newId()) => {
    await readCautions(ctx, caseId, checkId);
    // What is written in the same instant has no order on the unit's record.
    clock.forward(1000);
    return addWatchReading({ ctx, input: { id, caseId, watchId, checkId, ...answer } });
  };
  const end = (outcome: 'held' | 'comeback' | 'lost', why?: string, by = ctx) => endWatch({ ctx: by, input: { caseId, watchId, outcome, why } });
  const readAll = async () => {
    await read('oil-amount', { state: 'film' });
    await read('oil-caught', { value: '0.1 mL/h' });
  };
  return { ctx, caseId, watchId, seen, read, end, readAll };
}

describe('a watch', () => {
  it('begins when the case is called, with a reason for what isn’t true', async () => {
    const { ctx } = workshop;
    const open = await openACase(workshop);
    const begin = [YES, YES, YES, YES];
    await expect(startWatch({ ctx, input: { id: newId(), caseId: open, begin } })).rejects.toMatchObject({ code: 'conflict' });
    const caseId = await called();
    await expect(startWatch({ ctx, input: { id: newId(), caseId, begin: [YES, { answer: 'no' }, YES] } })).rejects.toMatchObject({ fields: { 'begin.1.why': expect.any(String), 'begin.3.answer': expect.any(String) } });
    const id = newId();
    const input = { id, caseId, begin: [YES, { answer: 'no' as const, why: 'No time' }, YES, YES], odometer: '100,000 mi' };
    await startWatch({ ctx, input });
    await startWatch({ ctx, input });
    await expect(startWatch({ ctx, input: { ...input, id: newId() } })).rejects.toMatchObject({ code: 'conflict' });
    const { watches } = await listWatches({ ctx, input: { caseId } });
    expect(watches).toMatchObject([{ id, plan: 'Oil at the dryer', begin: expect.arrayContaining([expect.objectContaining({ answer: 'no', why: 'No time' })]) }]);
  });

  it('takes readings like answers of the case, says whether they are in order, and takes them back', async () => {
    const { ctx, caseId, watchId, read, seen } = await watched({ odometer: '100,000 mi' });
    await expect(addWatchReading({ ctx, input: { id: newId(), caseId, watchId, checkId: 'noise', state: 'ordinary' } })).rejects.toMatchObject({ fields: { checkId: expect.any(String) } });
    await expect(read('oil-amount', { state: 'no-such' })).rejects.toMatchObject({ fields: { state: expect.any(String) } });
    await expect(read('oil-amount', { state: 'film', odometer: '90,000 mi' })).rejects.toMatchObject({ fields: { odometer: expect.any(String) } });
    await expect(read('oil-caught', {})).rejects.toMatchObject({ fields: { value: expect.any(String) } });
    const id = newId();
    await read('oil-amount', { state: 'heavy', odometer: '100,400 mi' }, id);
    await read('oil-amount', { state: 'heavy' }, id);
    clock.forward(1000);
    await read('oil-caught', { value: '0.1 mL/h' });
    expect((await seen()).readings).toMatchObject([{ checkId: 'oil-amount', isInOrder: false }, { checkId: 'oil-caught', isInOrder: true }]);
    await takeBackWatchReading({ ctx, input: { caseId, watchId, readingId: id, whyTakenBack: 'The wrong unit' } });
    expect((await seen()).readings[0]).toMatchObject({ takenBack: { by: ctx.person.name, why: 'The wrong unit' } });
    expect((await seen()).due[0]).toMatchObject({ checkId: 'oil-amount', state: 'waits' });
  });

  it('writes the odometer to the unit’s record too', async () => {
    const { caseId, read } = await watched({ odometer: '100,000 mi' });
    clock.forward(DAY_MS);
    await read('oil-amount', { state: 'film', odometer: '100,400 mi' });
    const { rows } = await workshop.asOwner((tx) => tx.execute(sql`select round(odometer_m / 1609.344)::int as miles from unit_reading where unit_id = (select unit_id from watch where case_id = ${caseId}) order by odometer_m`));
    expect(rows).toEqual([{ miles: 100_000 }, { miles: 100_400 }]);
  });

  it('strikes the odometer out of the unit’s record with the reading that is taken back', async () => {
    const { ctx, caseId, watchId, read } = await watched({ odometer: '100,000 mi' });
    const id = newId();
    await read('oil-amount', { state: 'film', odometer: '300,000 mi' }, id);
    await expect(read('oil-amount', { state: 'film', odometer: '100,400 mi' })).rejects.toMatchObject({ fields: { odometer: expect.stringContaining('300,000') } });
    for (let i = 0; i < 2; i++) await takeBackWatchReading({ ctx, input: { caseId, watchId, readingId: id, whyTakenBack: 'The wrong unit' } });
    await read('oil-amount', { state: 'film', odometer: '100,400 mi' });
  });

  it.each([[0, 'none'], [1, 'isolated'], [2, 'held-with-others']])('is held when all was read at its end, and after %s repairs proves: %s', async (repairs, proof) => {
    const { ctx, caseId, end, readAll, seen } = await watched({ repairs });
    await expect(end('held')).rejects.toMatchObject({ code: 'conflict', message: expect.stringContaining('was not read') });
    clock.forward(27 * DAY_MS);
    await readAll();
    await expect(end('held')).rejects.toMatchObject({ message: expect.stringContaining('It is watched until') });
    clock.forward(DAY_MS);
    await end('held');
    await end('held');
    await expect(end('lost', 'No')).rejects.toMatchObject({ code: 'conflict' });
    expect(await seen()).toMatchObject({ outcome: 'held', proof });
    const { calls, state, events } = await readCase({ ctx, input: { caseId } });
    expect(state.status).toBe('closed');
    expect(calls).toMatchObject([{ proof: 'none', standing: false }, { mainCause: CAUSE, proof, standing: true }]);
    expect(events.at(-1)).toMatchObject({ kind: 'closed', reason: 'It held.' });
    await reopenCase({ ctx, input: { id: newId(), caseId, reason: 'Another look' } });
    expect((await readCase({ ctx, input: { caseId } })).state.status).toBe('open');
  });

  it('is held before its time only by an engineer or a manager, with why', async () => {
    const { end, seen } = await watched();
    const engineer = await workshop.addPerson({ roles: ['engineer'] });
    await expect(end('held', 'I know')).rejects.toMatchObject({ code: 'conflict' });
    await expect(end('held', undefined, engineer)).rejects.toMatchObject({ fields: { why: expect.any(String) } });
    await end('held', 'Sold, and dry when it went', engineer);
    expect(await seen()).toMatchObject({ outcome: 'held', why: 'Sold, and dry when it went' });
  });

  it('ends as a comeback with a case of its own, and puts the call in doubt', async () => {
    const { ctx, caseId, end, seen } = await watched({ repairs: 1 });
    await expect(end('comeback')).rejects.toMatchObject({ fields: { why: expect.any(String) } });
    const { comebackCaseId } = await end('comeback', 'Oil at the purge again');
    const [before, after] = [await readCase({ ctx, input: { caseId } }), await readCase({ ctx, input: { caseId: comebackCaseId ?? '' } })];
    expect(before.events.map(({ kind }) => kind)).toEqual(expect.arrayContaining(['doubted', 'closed']));
    expect(before.calls.at(-1)).toMatchObject({ proof: 'none', standing: true });
    expect(after.head.unit).toEqual(before.head.unit);
    expect(after.state.status).toBe('open');
    const { rows } = await workshop.asOwner((tx) => tx.execute(sql`select comeback_of from "case" where id = ${comebackCaseId}`));
    expect(rows).toEqual([{ comeback_of: caseId }]);
    expect(await seen()).toMatchObject({ outcome: 'comeback', comeback: { caseId: comebackCaseId } });
  });

  it('is lost with why, and is not left by reopening', async () => {
    const { ctx, caseId, end, read, seen } = await watched();
    await expect(reopenCase({ ctx, input: { id: newId(), caseId, reason: 'Look' } })).rejects.toMatchObject({ message: expect.stringContaining('watched') });
    await expect(end('lost')).rejects.toMatchObject({ fields: { why: expect.any(String) } });
    await end('lost', 'Sold');
    expect(await seen()).toMatchObject({ outcome: 'lost', why: 'Sold', proof: 'none' });
    await expect(read('oil-amount', { state: 'film' })).rejects.toMatchObject({ code: 'conflict' });
  });
});

describe('a case that was opened on the unit meanwhile', () => {
  const openAnother = async (unitId: string) => {
    const id = newId();
    await openCase({ ctx: workshop.ctx, input: { id, unit: { kind: 'known', unitId }, complaints: ['complaint-oil'], complaintWords: '', odometerReplaced: false } });
    return id;
  };

  it('says that a repair of its unit is watched, and can be what came back', async () => {
    const { ctx, caseId, watchId, seen } = await watched();
    clock.forward(DAY_MS);
    const { head } = await readCase({ ctx, input: { caseId } });
    const later = await openAnother(head.unit.id);
    expect((await readCase({ ctx, input: { caseId: later } })).watching).toMatchObject({ own: null, others: [{ caseId, number: head.number }], cameBackFrom: null });
    expect((await seen()).mayGoOnIn).toEqual([expect.objectContaining({ caseId: later })]);
    await expect(endWatch({ ctx, input: { caseId, watchId, outcome: 'comeback', why: 'Oil again', goesOnIn: caseId } })).rejects.toMatchObject({ fields: { goesOnIn: expect.any(String) } });
    expect(await endWatch({ ctx, input: { caseId, watchId, outcome: 'comeback', why: 'Oil again', goesOnIn: later } })).toMatchObject({ comebackCaseId: later });
    expect((await readCase({ ctx, input: { caseId: later } })).watching).toEqual({ own: null, others: [], cameBackFrom: { caseId, number: head.number } });
    expect(await seen()).toMatchObject({ outcome: 'comeback', comeback: { caseId: later } });
  });

  it('was opened before it was watched: that is not asked', async () => {
    const { ctx } = workshop;
    const caseId = await called();
    const { head } = await readCase({ ctx, input: { caseId } });
    const earlier = await openAnother(head.unit.id);
    clock.forward(DAY_MS);
    await startWatch({ ctx, input: { id: newId(), caseId, begin: [YES, YES, YES, YES] } });
    expect((await readCase({ ctx, input: { caseId: earlier } })).watching.others).toEqual([]);
    expect((await readCase({ ctx, input: { caseId } })).watching.own).toMatchObject({ next: { check: 'Amount of oil', state: 'waits' } });
  });
});

describe('reminders', () => {
  /** What is queued for a watch, the earliest first. */
  const queued = async (watchId: string) => {
    const { rows } = await databases.owner.execute(sql`select data from pgboss.job where name = 'remind-watch' and data->>'watchId' = ${watchId} order by start_after`);
    return rows.map(({ data }) => data as { organisationId: string; watchId: string; due: string });
  };
  const work = (data: { organisationId: string; watchId: string; due: string }) => remindOfWatch({ db: databases.app, now: clock.now }, data);
  const told = async (caseId: string) => (await listNotices({ ctx: workshop.ctx, input: {} })).rows.filter((notice) => notice.place === `/cases/${caseId}/watch`);
  const forwardTo = (due: string) => clock.forward(Date.parse(due) - clock.now().getTime());

  it('say on the morning of the day what is due, once, and again three days later while it is', async () => {
    const { caseId, watchId } = await watched();
    const [first] = await queued(watchId);
    if (!first) throw new Error('nothing is planned');
    forwardTo(first.due);
    await work(first);
    // The same job again, as after a worker that was killed behind its commit: nothing more.
    await work(first);
    expect(await told(caseId)).toEqual([expect.objectContaining({ kind: 'watch-due', sentence: expect.stringContaining('Amount of oil') })]);
    const again = (await queued(watchId)).slice(1);
    expect(again.map(({ due }) => Date.parse(due) - Date.parse(first.due))).toEqual([3 * DAY_MS]);
    for (const job of again) {
      forwardTo(job.due);
      await work(job);
    }
    expect(await told(caseId)).toHaveLength(2);
  });

  it('are put off by what is read, and stop with the watch', async () => {
    const { caseId, watchId, readAll, end } = await watched();
    const [first] = await queued(watchId);
    if (!first) throw new Error('nothing is planned');
    clock.forward(2 * DAY_MS);
    await readAll();
    await work(first);
    expect(await told(caseId)).toEqual([]);
    const next = (await queued(watchId)).at(-1);
    if (!next) throw new Error('nothing is planned');
    expect(Date.parse(next.due)).toBeGreaterThan(Date.parse(first.due));
    await end('lost', 'Sold');
    forwardTo(next.due);
    await work(next);
    expect(await told(caseId)).toEqual([]);
  });
});

describe('a mailed link', () => {
  it('leads from the letter to its one reading', async () => {
    const { ctx, caseId, watchId, seen } = await watched();
    await createWatchLink({ ctx, input: { id: newId(), caseId, watchId, checkId: 'oil-amount', forWhom: 'The driver', mailTo: 'driver@people.test' } });
    const { post, letters, deliver } = makePost(databases, clock.now);
    await deliver(workshop.organisationId);
    const letter = letters.find(({ to }) => to === 'driver@people.test');
    expect(letter?.text).toContain('Hello The driver');
    const token = /https:\/\/carryover\.test\/watch\/(\S+)/.exec(letter?.text ?? '')?.[1] ?? '';
    const visitor = { ...makeVisitor(databases, { now: clock.now }), signingSecret: post.secret };
    expect(await viewWatchLink({ visitor, input: { token } })).toMatchObject({ name: 'Amount of oil' });
    await readByLink({ visitor, input: { token, id: newId(), name: 'Sam', hasReadCautions: 'on', state: 'film' } });
    expect((await seen()).readings).toMatchObject([{ by: 'Sam', byLink: true, isInOrder: true }]);
    await expect(readByLink({ visitor, input: { token, id: newId(), name: 'Sam', hasReadCautions: 'on', state: 'film' } })).rejects.toMatchObject({ code: 'not-found' });
  });
});

describe('a link', () => {
  /** One that is good, as its token. */
  async function linked() {
    const watch = await watched();
    const { ctx, caseId, watchId } = watch;
    const linkId = newId();
    await createWatchLink({ ctx, input: { id: linkId, caseId, watchId, checkId: 'oil-amount', forWhom: 'The driver', days: '7' } });
    const token = (await watch.seen()).links[0]?.path?.replace('/watch/', '') ?? '';
    const visitor = makeVisitor(databases, { now: clock.now });
    const use = (over: Partial<{ token: string; hasReadCautions: boolean; state: string }> = {}) => readByLink({ visitor, input: { token, id: newId(), name: 'Someone', hasReadCautions: true, state: 'film', ...over } });
    const view = (given = token) => viewWatchLink({ visitor, input: { token: given } });
    return { ...watch, linkId, token, visitor, use, view };
  }

  it('shows what to read and takes one reading under the name typed', async () => {
    const { use, view, seen } = await linked();
    const shown = await view();
    expect(Object.keys(shown).sort()).toEqual(['cautions', 'fleetNumber', 'name', 'organisationName', 'prompt', 'states', 'steps', 'unit', 'units']);
    await expect(use({ hasReadCautions: false })).rejects.toMatchObject({ fields: { hasReadCautions: expect.any(String) } });
    await expect(use({ state: '' })).rejects.toMatchObject({ fields: { state: expect.any(String) } });
    expect(await use()).toEqual({ verdict: 'in-order' });
    expect((await seen()).readings).toMatchObject([{ by: 'Someone', byLink: true, isInOrder: true }]);
    expect((await seen()).links).toMatchObject([{ state: 'used', path: null }]);
  });

  type Linked = Awaited<ReturnType<typeof linked>>;
  const SECRET = TEST_SECRET;
  const resigned = async ({ token }: Linked, change: Partial<ReturnType<typeof contentsOf>>) => signWatchToken(SECRET, { ...contentsOf(token), ...change });
  const contentsOf = (token: string) => {
    const contents = readWatchToken(SECRET, token);
    if (!contents) throw new Error('not ours');
    return contents;
  };

  const REFUSED: [string, (given: Linked) => Promise<string | void>][] = [
    ['expired', () => Promise.resolve(clock.forward(8 * DAY_MS))],
    ['altered', ({ token }) => Promise.resolve(`${token[0] === 'e' ? 'f' : 'e'}${token.slice(1)}`)],
    ['altered in its last letter', ({ token }) => Promise.resolve(token.slice(0, -1) + (token.endsWith('A') ? 'B' : 'A'))],
    ['signed with another secret', ({ token }) => Promise.resolve(signWatchToken('another', contentsOf(token)))],
    ['of nothing at all', () => Promise.resolve('nonsense')],
    ['given a longer life', (given) => resigned(given, { expiresAt: contentsOf(given.token).expiresAt + DAY_MS })],
    ['of another case', async (given) => resigned(given, { caseId: (await watched()).caseId })],
    ['of another organisation', async (given) => resigned(given, { organisationId: (await makeWorkshop(databases)).organisationId })],
    ['revoked', async ({ ctx, caseId, watchId, linkId }) => void (await revokeWatchLink({ ctx, input: { caseId, watchId, linkId } }))],
    ['of a watch that has ended', async ({ end }) => void (await end('lost', 'Sold'))],
    ['used', async ({ use }) => void (await use())],
  ];

  it.each(REFUSED)('that is %s is refused with one sentence, and nothing is written', async (_what, spoil) => {
    const given = await linked();
    const token = (await spoil(given)) ?? given.token;
    const before = (await given.seen()).readings.length;
    for (const attempt of [() => given.view(token), () => given.use({ token })]) {
      await expect(attempt()).rejects.toMatchObject({ code: 'not-found', fields: {}, message: expect.stringMatching(/^[A-Z][^.]*\.$/) });
    }
    expect((await given.seen()).readings).toHaveLength(before);
  });

  it('adds one reading when it is used twice at once', async () => {
    const { use, seen } = await linked();
    const came = await Promise.allSettled([use(), use(), use()]);
    expect(came.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    expect((await seen()).readings).toHaveLength(1);
  });
});
