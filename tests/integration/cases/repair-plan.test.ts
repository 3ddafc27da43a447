import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newId } from '@/lib/ids';
import { callCause } from '@/lib/services/case/call';
import { readCaseState } from '@/lib/services/case/read';
import { acknowledgeRepair } from '@/lib/services/repair/acknowledge';
import { readRepairPlan } from '@/lib/services/repair/read-plan';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makeTenant, type Tenant } from '@/tests/support/tenant';
import { give, makeWorkshop, openACase } from './support';

describe('the repair plan of a case', () => {
  let databases: TestDatabases;
  let workshop: Tenant;
  beforeAll(async () => {
    databases = await openTestDatabases();
    workshop = await makeWorkshop(databases);
  });
  afterAll(() => databases.close());

  const plan = (caseId: string) => readRepairPlan({ ctx: workshop.ctx, input: { caseId } });

  it('is the order that the case shows, and moves with its answers', async () => {
    const { ctx } = workshop;
    const caseId = await openACase(workshop);
    const before = await plan(caseId);
    expect(before.remedies.map(({ remedyId }) => remedyId)).toEqual((await readCaseState({ ctx, input: { caseId } })).repairs.map(({ remedyId }) => remedyId));
    await give(ctx, { caseId, checkId: 'sealant-at-gasket', answer: { kind: 'state', state: 'heavy-bead', sureness: 'sure' } });
    const after = await plan(caseId);
    expect(after.remedies.map(({ remedyId }) => remedyId)).toEqual((await readCaseState({ ctx, input: { caseId } })).repairs.map(({ remedyId }) => remedyId));
    expect(after.expectedCost).not.toBe(before.expectedCost);
  });

  it('marks what was called, and counts at the labour rate that the organisation set', async () => {
    const { ctx } = workshop;
    const caseId = await openACase(workshop);
    const [first] = (await plan(caseId)).remedies;
    await callCause({ ctx, input: { id: newId(), caseId, mainCause: first?.causeIds[0] ?? '', sureness: 'guess', whyNotLeading: 'Seen' } });
    expect((await plan(caseId)).remedies.find(({ remedyId }) => remedyId === first?.remedyId)?.called).toBe(true);
    expect((await plan(caseId)).rateFrom).toBe('organisation');
  });

  it('opens the steps of a repair to whoever read its cautions today, and to nobody else', async () => {
    const { ctx } = workshop;
    const caseId = await openACase(workshop);
    const [first] = (await plan(caseId)).remedies;
    if (!first) throw new Error('nothing to repair');
    expect(first.toRead.length).toBeGreaterThan(0);
    const read = () => acknowledgeRepair({ ctx, input: { caseId, remedyId: first.remedyId, cautions: first.toRead.map((cautionId) => ({ id: newId(), cautionId })) } });
    await read();
    expect((await plan(caseId)).remedies[0]?.toRead).toEqual([]);
    const colleague = await workshop.addPerson();
    expect((await readRepairPlan({ ctx: colleague, input: { caseId } })).remedies[0]?.toRead).toEqual(first.toRead);
    await expect(
      acknowledgeRepair({ ctx, input: { caseId, remedyId: first.remedyId, cautions: [{ id: newId(), cautionId: 'no-such-caution' }] } }),
    ).rejects.toMatchObject({ fields: { cautions: expect.any(String) } });
  });

  it('is seen by nobody from another organisation', async () => {
    const caseId = await openACase(workshop);
    const { ctx } = await makeTenant(databases);
    await expect(readRepairPlan({ ctx, input: { caseId } })).rejects.toMatchObject({ code: 'not-found' });
    await expect(acknowledgeRepair({ ctx, input: { caseId, remedyId: 'replace-discharge-line', cautions: [{ id: newId(), cautionId: 'stored-air' }] } })).rejects.toMatchObject({ code: 'not-found' });
  });
});
