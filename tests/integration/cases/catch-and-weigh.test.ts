import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newId } from '@/lib/ids';
import { assignCase } from '@/lib/services/case/assign';
import { callCause } from '@/lib/services/case/call';
import { readCase, readCaseState } from '@/lib/services/case/read';
import { endCatch, remindOfCatch } from '@/lib/services/oil-catch/end';
import { listCatches } from '@/lib/services/oil-catch/list';
import { remindOfWeighing } from '@/lib/services/oil-catch/remind';
import { startCatch } from '@/lib/services/oil-catch/start';
import { takeBackWeighing } from '@/lib/services/oil-catch/take-back';
import { weigh } from '@/lib/services/oil-catch/weigh';
import { DAY_MS, makeClock } from '@/tests/support/clock';
import { makePost } from '@/tests/support/post';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makeTenant, type Tenant } from '@/tests/support/tenant';
import { give, makeWorkshop, openACase, readCautions } from './support';

const CHECK = 'oil-caught';
const ML_PER_H = 1e-6 / 3600;

let databases: TestDatabases;
const clock = makeClock();
let workshop: Tenant;
beforeAll(async () => {
  databases = await openTestDatabases();
  workshop = await makeWorkshop(databases, { now: clock.now });
});
afterAll(() => databases.close());

/** A case on whose unit a bottle hangs since the hour meter stood at 4,100 h. */
async function hang(more: { engineHours?: string; remindEveryDays?: string } = {}) {
  const { ctx } = workshop;
  const caseId = await openACase(workshop);
  const catchId = newId();
  await readCautions(ctx, caseId, CHECK);
  await startCatch({ ctx, input: { id: catchId, caseId, checkId: CHECK, engineHours: '4,100 h', place: 'left of the purge', ...more } });
  // Nobody does two things in one moment.
  const weighs = (oil: string, hours: { engineHours?: string; hoursRun?: string }, id = newId()) => {
    clock.forward(1000);
    return weigh({ ctx, input: { id, caseId, catchId, oil, ...hours } });
  };
  const answer = async () => (await readCaseState({ ctx, input: { caseId } })).findings.filter(({ checkId }) => checkId === CHECK);
  const seen = async () => (await listCatches({ ctx, input: { caseId } })).catches[0];
  return { ctx, caseId, catchId, weighs, answer, seen };
}

describe('oil that is caught and weighed over days', () => {
  it('answers the check from the first weighing on, and gets surer with a second like it', async () => {
    const { ctx, caseId, weighs, answer, seen } = await hang();
    await weighs('17.4 g', { engineHours: '4,120' });
    const [first] = await answer();
    // 17.4 g of 0.87 g/mL are 20 mL in 20 h.
    expect(first).toMatchObject({ source: 'sum', kind: 'measured', current: true, sum: { id: 'carry-over-by-weight', search: { weight: '17.4 g', readings: '1', time: '20 h' } } });
    expect((await seen())?.perHour?.si).toBeCloseTo(ML_PER_H, 12);

    clock.forward(2 * DAY_MS);
    await readCautions(ctx, caseId, CHECK);
    await weighs('17.4 g', { engineHours: '4,140 h' });
    const [second, before] = await answer();
    expect(second).toMatchObject({ current: true, sum: { search: { weight: '34.8 g', readings: '2', time: '40 h' } } });
    expect(before).toMatchObject({ id: first?.id, current: false, answer: first?.answer });
    const { weighings, perHour } = (await seen()) ?? {};
    expect(weighings?.map(({ perHour: own }) => (own?.si ?? NaN) / ML_PER_H)).toEqual([expect.closeTo(1, 9), expect.closeTo(1, 9)]);
    const width = (rate: { low: number | null; high: number | null } | null | undefined) => (rate?.high ?? NaN) - (rate?.low ?? NaN);
    expect(width(perHour)).toBeLessThan(width(weighings?.[0]?.perHour));
  });

  it('is zero when the bottle is dry: a repair that holds begins so', async () => {
    const { weighs, answer } = await hang();
    await weighs('0', { engineHours: '4,110' });
    expect((await answer())[0]).toMatchObject({ shares: [{ state: 'very-little', share: 1 }] });
  });

  it('takes ounces, the error of the scale, and hours where no meter tells', async () => {
    const { ctx, caseId, catchId, seen, weighs } = await hang({ engineHours: '' });
    await expect(weighs('1 oz', { engineHours: '4,120' })).rejects.toMatchObject({ fields: { hoursRun: expect.stringContaining('not read before') } });
    await weigh({ ctx, input: { id: newId(), caseId, catchId, oil: '1', oilError: '± 0.1', engineHours: '4,120', hoursRun: '10' } });
    // 1 oz = 28.349523125 g by definition (international avoirdupois pound, 1959).
    expect((await seen())?.weighings[0]).toMatchObject({ massKg: expect.closeTo(0.028349523125, 12), massErrorKg: expect.closeTo(0.0028349523125, 12), asTyped: { massKg: '1 oz', massErrorKg: '0.1 oz' }, ranS: 36_000, engineS: 4120 * 3600 });
    // From then on the meter is known.
    await weighs('3 g', { engineHours: '4,125' });
    expect((await seen())?.weighings[1]?.ranS).toBe(18_000);
  });

  it('refuses beside the field what can’t be', async () => {
    const { weighs, answer } = await hang();
    const at = { engineHours: '4,120' };
    await expect(weighs('', at)).rejects.toMatchObject({ fields: { oil: expect.stringContaining('weighed') } });
    await expect(weighs('-3 g', at)).rejects.toMatchObject({ fields: { oil: expect.any(String) } });
    await expect(weighs('21 kg', at)).rejects.toMatchObject({ fields: { oil: expect.any(String) } });
    await expect(weighs('12 psi', at)).rejects.toMatchObject({ fields: { oil: expect.any(String) } });
    await expect(weighs('12 g', {})).rejects.toMatchObject({ fields: { engineHours: expect.any(String) } });
    await expect(weighs('12 g', { engineHours: '4,099' })).rejects.toMatchObject({ fields: { engineHours: expect.stringContaining('4,100 h') } });
    expect(await answer()).toEqual([]);
  });

  it('writes a weighing once when it comes twice, and never under another catch', async () => {
    const { weighs, seen, answer } = await hang();
    const id = newId();
    await weighs('12 g', { engineHours: '4,120' }, id);
    await weighs('12 g', { engineHours: '4,120' }, id);
    expect((await seen())?.weighings).toHaveLength(1);
    expect(await answer()).toHaveLength(1);
    const other = await hang();
    await expect(other.weighs('12 g', { engineHours: '4,120' }, id)).rejects.toMatchObject({ code: 'conflict' });
    expect(await other.answer()).toEqual([]);
  });

  it('hangs once for a check, and asks for its cautions first', async () => {
    const { ctx, caseId, catchId } = await hang();
    const again = (id: string) => startCatch({ ctx, input: { id, caseId, checkId: CHECK, engineHours: '4,100' } });
    await expect(again(newId())).rejects.toMatchObject({ code: 'conflict' });
    await again(catchId);
    const unread = await openACase(workshop);
    await expect(startCatch({ ctx, input: { id: newId(), caseId: unread, checkId: CHECK } })).rejects.toMatchObject({ fields: { cautions: expect.stringContaining('vehicle-rolls') } });
    await expect(startCatch({ ctx, input: { id: newId(), caseId: unread, checkId: 'build-up-time' } })).rejects.toMatchObject({ fields: { checkId: expect.any(String) } });
    // Read two days ago is not read today.
    clock.forward(2 * DAY_MS);
    await expect(weigh({ ctx, input: { id: newId(), caseId, catchId, oil: '1 g', engineHours: '4,120' } })).rejects.toMatchObject({ fields: { cautions: expect.any(String) } });
  });

  it('takes the last weighing back, and leaves an answer alone that was given otherwise since', async () => {
    const { ctx, caseId, catchId, weighs, answer, seen } = await hang();
    const [one, two] = [newId(), newId()];
    await weighs('17.4 g', { engineHours: '4,120' }, one);
    await weighs('174 g', { engineHours: '4,130' }, two);
    const back = (weighingId: string) => takeBackWeighing({ ctx, input: { caseId, catchId, weighingId, whyTakenBack: 'Mistyped' } });
    await expect(back(one)).rejects.toMatchObject({ code: 'conflict' });
    // At the desk, days later, with nothing read today.
    clock.forward(3 * DAY_MS);
    await back(two);
    await back(two);
    expect((await answer())[0]).toMatchObject({ current: true, sum: { search: { weight: '17.4 g', time: '20 h' } } });
    expect((await seen())?.weighings[1]?.takenBack).toMatchObject({ why: 'Mistyped', by: ctx.person.name });
    await give(ctx, { caseId, checkId: CHECK, answer: { kind: 'measured', value: '3 mL/h', sureness: 'sure' } });
    await back(one);
    expect((await answer())[0]).toMatchObject({ current: true, source: 'asked' });
  });

  it('opens the check again when the only weighing is taken back', async () => {
    const { ctx, caseId, catchId, weighs, answer } = await hang();
    const id = newId();
    await weighs('17.4 g', { engineHours: '4,120' }, id);
    clock.forward(1000);
    await takeBackWeighing({ ctx, input: { caseId, catchId, weighingId: id, whyTakenBack: 'Water' } });
    expect((await answer()).filter(({ current }) => current)).toEqual([]);
  });

  it('stands on the page of the case until the bottle is down', async () => {
    const { ctx, caseId, catchId, weighs } = await hang({ remindEveryDays: '2' });
    const catching = async () => (await readCase({ ctx, input: { caseId } })).catching;
    expect(await catching()).toEqual([{ checkId: CHECK, since: clock.now().toISOString(), remindAt: new Date(clock.now().getTime() + 2 * DAY_MS).toISOString() }]);
    await endCatch({ ctx, input: { caseId, catchId } });
    await endCatch({ ctx, input: { caseId, catchId } });
    expect(await catching()).toEqual([]);
    await expect(weighs('1 g', { engineHours: '4,120' })).rejects.toMatchObject({ code: 'conflict' });
  });

  it('takes no weighing into a case that was called', async () => {
    const { ctx, caseId, weighs } = await hang();
    const { causes } = await readCaseState({ ctx, input: { caseId } });
    await callCause({ ctx, input: { id: newId(), caseId, mainCause: causes[0]?.causeId ?? '', sureness: 'guess' } });
    await expect(weighs('1 g', { engineHours: '4,120' })).rejects.toMatchObject({ code: 'conflict', message: expect.stringContaining('called') });
  });

  it('is seen and touched by nobody from another organisation', async () => {
    const { caseId, catchId } = await hang();
    const { ctx } = await makeTenant(databases);
    const tries = [
      () => listCatches({ ctx, input: { caseId } }),
      () => weigh({ ctx, input: { id: newId(), caseId, catchId, oil: '1 g', hoursRun: '2' } }),
      () => endCatch({ ctx, input: { caseId, catchId } }),
    ];
    for (const attempt of tries) await expect(attempt()).rejects.toMatchObject({ code: 'not-found' });
  });
});

describe('reminders to weigh', () => {
  /** The queued mails of a catch: for when, and what the job is given. */
  const queued = async (catchId: string) => {
    const { rows } = await databases.owner.execute(sql`select data, start_after as "startAfter" from pgboss.job where name = 'remind-weighing' and data->>'catchId' = ${catchId} order by start_after`);
    return rows as { data: { organisationId: string; catchId: string; due: string }; startAfter: Date }[];
  };
  const mail = () => makePost(databases, clock.now);

  it('are queued for their day, go to whoever has the case, and plan the next', async () => {
    const { ctx, caseId, catchId } = await hang({ remindEveryDays: '2' });
    const colleague = await workshop.addPerson();
    await assignCase({ ctx, input: { caseId, personId: colleague.person.id } });
    const [first] = await queued(catchId);
    expect(first?.data.due).toBe(new Date(clock.now().getTime() + 2 * DAY_MS).toISOString());
    expect(new Date(first?.startAfter ?? 0).toISOString()).toBe(first?.data.due);

    clock.forward(2 * DAY_MS);
    const { post, letters, deliver } = mail();
    if (first) await remindOfWeighing(post, first.data);
    // The same job again, as after a worker that was killed behind its commit: nothing more.
    if (first) await remindOfWeighing(post, first.data);
    await deliver(workshop.organisationId);
    // The colleague also heard of being given the case.
    const reminders = letters.filter(({ subject }) => subject.startsWith('Weigh'));
    expect(reminders).toEqual([expect.objectContaining({ to: colleague.person.email, text: expect.stringContaining(`https://carryover.test/cases/${caseId}/catch`) })]);
    expect(reminders[0]?.text).toContain('left of the purge');
    expect((await queued(catchId)).map(({ data }) => data.due)).toEqual([first?.data.due, new Date(clock.now().getTime() + 2 * DAY_MS).toISOString()]);
  });

  it('are put off by a weighing, and stop with the plan, the bottle or the call', async () => {
    const { ctx, caseId, catchId, weighs } = await hang({ remindEveryDays: '2' });
    clock.forward(DAY_MS);
    await readCautions(ctx, caseId, CHECK);
    await weighs('5 g', { engineHours: '4,110' });
    const { post, letters, deliver } = mail();
    const [early, late] = await queued(catchId);
    if (early) await remindOfWeighing(post, early.data);
    await remindOfCatch({ ctx, input: { caseId, catchId, remindEveryDays: '' } });
    if (late) await remindOfWeighing(post, late.data);
    await remindOfCatch({ ctx, input: { caseId, catchId, remindEveryDays: '1' } });
    await endCatch({ ctx, input: { caseId, catchId } });
    for (const { data } of await queued(catchId)) await remindOfWeighing(post, data);
    await deliver(workshop.organisationId);
    expect(letters).toEqual([]);
  });
});
