import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newId } from '@/lib/ids';
import { acknowledgeRepair } from '@/lib/services/repair/acknowledge';
import { chooseRepair } from '@/lib/services/repair/choose';
import { listRepairs } from '@/lib/services/repair/list';
import { readRepairPlan } from '@/lib/services/repair/read-plan';
import { endRepair, markStep, planRepair } from '@/lib/services/repair/work';
import { DAY_MS, makeClock } from '@/tests/support/clock';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makeTenant, type Tenant } from '@/tests/support/tenant';
import { makeWorkshop, openACase } from './support';

const clock = makeClock();
let databases: TestDatabases;
let workshop: Tenant;
beforeAll(async () => {
  databases = await openTestDatabases();
  workshop = await makeWorkshop(databases, { now: clock.now });
});
afterAll(() => databases.close());

/** A case whose first repair is chosen. */
async function chosen() {
  const { ctx } = workshop;
  const caseId = await openACase(workshop);
  const { remedies } = await readRepairPlan({ ctx, input: { caseId } });
  const [first, second] = remedies;
  if (!first || !second) throw new Error('too little to repair');
  const repairId = newId();
  await chooseRepair({ ctx, input: { id: repairId, caseId, remedyId: first.remedyId } });
  const seen = async () => (await listRepairs({ ctx, input: { caseId } })).repairs.find(({ id }) => id === repairId);
  const readCautions = async () => {
    const cautions = ((await seen())?.toRead ?? []).map((cautionId) => ({ id: newId(), cautionId }));
    if (cautions.length > 0) await acknowledgeRepair({ ctx, input: { caseId, remedyId: first.remedyId, cautions } });
  };
  const say = (step: number, mark: 'done' | 'not-done' | 'not-applicable', more: { value?: string; note?: string; id?: string } = {}) => markStep({ ctx, input: { id: newId(), caseId, repairId, step, mark, ...more } });
  const end = (outcome: 'done' | 'dropped', whyDropped?: string) => endRepair({ ctx, input: { caseId, repairId, outcome, whyDropped } });
  return { ctx, caseId, repairId, first, second, seen, readCautions, say, end };
}

describe('a repair that is chosen', () => {
  it('needs no reason when it is first, and one when it goes before the first', async () => {
    const { ctx } = workshop;
    const caseId = await openACase(workshop);
    const [, second] = (await readRepairPlan({ ctx, input: { caseId } })).remedies;
    const input = { id: newId(), caseId, remedyId: second?.remedyId ?? '' };
    await expect(chooseRepair({ ctx, input })).rejects.toMatchObject({ fields: { whyBefore: expect.stringContaining('another first') } });
    await chooseRepair({ ctx, input: { ...input, whyBefore: 'The line is kinked' } });
    expect((await listRepairs({ ctx, input: { caseId } })).repairs).toEqual([expect.objectContaining({ remedyId: input.remedyId, whyBefore: 'The line is kinked', chosenBy: ctx.person.name })]);
  });

  it('is chosen once, and the next one is then first', async () => {
    const { ctx, caseId, repairId, first, second } = await chosen();
    await chooseRepair({ ctx, input: { id: repairId, caseId, remedyId: first.remedyId } });
    await expect(chooseRepair({ ctx, input: { id: newId(), caseId, remedyId: first.remedyId, whyBefore: 'Again' } })).rejects.toMatchObject({ code: 'conflict' });
    await expect(chooseRepair({ ctx, input: { id: repairId, caseId, remedyId: second.remedyId, whyBefore: 'Again' } })).rejects.toMatchObject({ code: 'conflict' });
    await chooseRepair({ ctx, input: { id: newId(), caseId, remedyId: second.remedyId } });
    expect((await listRepairs({ ctx, input: { caseId } })).repairs.map(({ whyBefore }) => whyBefore)).toEqual([null, null]);
  });

  it('is planned for a day and a person of the organisation who works on cases', async () => {
    const { ctx, caseId, repairId, seen } = await chosen();
    const colleague = await workshop.addPerson();
    const trainer = await workshop.addPerson({ roles: ['trainer'] });
    const stranger = await makeTenant(databases);
    await planRepair({ ctx, input: { caseId, repairId, plannedOn: '2026-03-09', assignedTo: colleague.person.id } });
    expect(await seen()).toMatchObject({ plannedOn: '2026-03-09', assignedToName: colleague.person.name });
    for (const { person } of [trainer, stranger.ctx]) {
      await expect(planRepair({ ctx, input: { caseId, repairId, plannedOn: '', assignedTo: person.id } })).rejects.toMatchObject({ fields: { assignedTo: expect.any(String) } });
    }
  });

  it('takes no word on a step before its cautions were read that day', async () => {
    const { say, readCautions } = await chosen();
    await expect(say(0, 'done')).rejects.toMatchObject({ code: 'conflict', fields: { cautions: expect.any(String) } });
    await readCautions();
    await say(0, 'done');
    clock.forward(DAY_MS);
    await expect(say(1, 'done')).rejects.toMatchObject({ fields: { cautions: expect.any(String) } });
  });

  it('keeps the last word on each step, with the value as the workshop entered it', async () => {
    const { say, readCautions, seen, first } = await chosen();
    await readCautions();
    const id = newId();
    await say(1, 'not-done', { id, note: 'No gasket yet' });
    await say(1, 'not-done', { id, note: 'No gasket yet' });
    clock.forward(1000);
    await say(1, 'done', { value: '30 lb·ft' });
    expect((await seen())?.steps[1]).toEqual({ text: first.steps[1], mark: { mark: 'done', value: '30 lb·ft', note: null, by: workshop.ctx.person.name, at: clock.now().toISOString() } });
    expect((await seen())?.steps[0]?.mark).toBeNull();
    await expect(say(first.steps.length, 'done')).rejects.toMatchObject({ fields: { step: expect.any(String) } });
  });

  it('is done when every step was done or doesn’t apply, and says which are not', async () => {
    const { say, readCautions, seen, end, first } = await chosen();
    await readCautions();
    for (const [i] of first.steps.entries()) await say(i, i === 2 ? 'not-done' : i === 1 ? 'not-applicable' : 'done');
    await expect(end('done')).rejects.toMatchObject({ code: 'conflict', message: expect.stringContaining('step 3 is not done') });
    clock.forward(1000);
    await say(2, 'done');
    await end('done');
    await end('done');
    expect(await seen()).toMatchObject({ outcome: 'done', endedBy: workshop.ctx.person.name });
    await expect(say(0, 'not-done')).rejects.toMatchObject({ code: 'conflict' });
  });

  it('is dropped with why, and can be chosen again', async () => {
    const { ctx, caseId, end, first, seen } = await chosen();
    await expect(end('dropped')).rejects.toMatchObject({ fields: { whyDropped: expect.any(String) } });
    await end('dropped', 'The line is clean');
    expect(await seen()).toMatchObject({ outcome: 'dropped', whyDropped: 'The line is clean' });
    await chooseRepair({ ctx, input: { id: newId(), caseId, remedyId: first.remedyId } });
  });

  it('is touched by nobody from another organisation, nor through another case', async () => {
    const { caseId, repairId } = await chosen();
    const { ctx } = await makeTenant(databases);
    const elsewhere = await openACase(workshop);
    for (const by of [{ ctx, caseId }, { ctx: workshop.ctx, caseId: elsewhere }]) {
      const of = { caseId: by.caseId, repairId };
      const tries = [
        () => planRepair({ ctx: by.ctx, input: { ...of, plannedOn: '', assignedTo: '' } }),
        () => markStep({ ctx: by.ctx, input: { id: newId(), ...of, step: 0, mark: 'done' } }),
        () => endRepair({ ctx: by.ctx, input: { ...of, outcome: 'dropped', whyDropped: 'x' } }),
      ];
      for (const attempt of tries) await expect(attempt()).rejects.toMatchObject({ code: 'not-found' });
    }
  });
});
