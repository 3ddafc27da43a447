import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newId } from '@/lib/ids';
import { fileClaim, settleClaim } from '@/lib/services/claim/claim';
import { sendCore, settleCore } from '@/lib/services/claim/core';
import { listClaims } from '@/lib/services/claim/list';
import { makeWorkshop, openACase } from '@/tests/integration/cases/support';
import { makeClock } from '@/tests/support/clock';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makeTenant, type Tenant } from '@/tests/support/tenant';

const clock = makeClock();
let databases: TestDatabases;
let workshop: Tenant;
beforeAll(async () => {
  databases = await openTestDatabases();
  workshop = await makeWorkshop(databases, { now: clock.now });
});
afterAll(() => databases.close());

async function claimed(amount = '480,50') {
  const { ctx } = workshop;
  const [caseId, claimId] = [await openACase(workshop), newId()];
  const file = { id: claimId, caseId, toWhom: 'Warranty desk', theirReference: 'RMA 7', sentOn: '2026-02-20', amount };
  await fileClaim({ ctx, input: file });
  const settle = (more: Partial<Parameters<typeof settleClaim>[0]['input']>) => settleClaim({ ctx, input: { caseId, claimId, state: 'paid', settledOn: '2026-03-01', settledAmount: '', why: '', ...more } });
  const seen = async () => (await listClaims({ ctx, input: { caseId } })).claims[0];
  return { ctx, caseId, claimId, file, settle, seen };
}

describe('a claim', () => {
  it('is kept as it was sent, once', async () => {
    const { ctx, file, seen, caseId } = await claimed();
    await fileClaim({ ctx, input: file });
    expect(await seen()).toEqual({ id: file.id, toWhom: 'Warranty desk', theirReference: 'RMA 7', sentOn: '2026-02-20', amount: 480.5, state: 'sent', settledOn: null, settledAmount: null, why: null, createdBy: ctx.person.name });
    expect((await listClaims({ ctx, input: { caseId } })).claims).toHaveLength(1);
  });

  it('is paid, by what was claimed unless another amount is given', async () => {
    const { settle, seen } = await claimed();
    await settle({});
    expect(await seen()).toMatchObject({ state: 'paid', settledAmount: 480.5, settledOn: '2026-03-01', why: null });
    await settle({ settledAmount: '500' });
    expect(await seen()).toMatchObject({ settledAmount: 500 });
  });

  it('is denied or paid in part with why, and the last word holds', async () => {
    const { settle, seen } = await claimed();
    await expect(settle({ state: 'denied' })).rejects.toMatchObject({ fields: { why: expect.any(String) } });
    await expect(settle({ state: 'part-paid', why: 'Labour is not covered' })).rejects.toMatchObject({ fields: { settledAmount: expect.any(String) } });
    await settle({ state: 'denied', why: 'Out of warranty', settledAmount: '3' });
    expect(await seen()).toMatchObject({ state: 'denied', settledAmount: null, why: 'Out of warranty' });
    await settle({ state: 'part-paid', why: 'Goodwill', settledAmount: '100' });
    expect(await seen()).toMatchObject({ state: 'part-paid', settledAmount: 100, why: 'Goodwill' });
  });

  it('has sensible days and amounts', async () => {
    const { ctx, caseId, settle } = await claimed();
    const file = (more: object) => fileClaim({ ctx, input: { id: newId(), caseId, toWhom: 'Desk', theirReference: '', sentOn: '2026-03-01', amount: '', ...more } });
    await expect(file({ sentOn: '2026-03-20' })).rejects.toMatchObject({ fields: { sentOn: expect.any(String) } });
    await expect(file({ amount: 'much' })).rejects.toMatchObject({ fields: { amount: expect.any(String) } });
    await expect(file({ amount: '-3' })).rejects.toMatchObject({ fields: { amount: expect.any(String) } });
    await expect(settle({ settledOn: '2026-02-01' })).rejects.toMatchObject({ fields: { settledOn: expect.any(String) } });
  });

  it('is nobody’s of another organisation, nor of another case', async () => {
    const { caseId, claimId } = await claimed();
    const { ctx } = await makeTenant(databases, { now: clock.now });
    const elsewhere = await openACase(workshop);
    await expect(listClaims({ ctx, input: { caseId } })).rejects.toMatchObject({ code: 'not-found' });
    for (const by of [{ ctx, caseId }, { ctx: workshop.ctx, caseId: elsewhere }]) {
      await expect(settleClaim({ ctx: by.ctx, input: { caseId: by.caseId, claimId, state: 'paid', settledOn: '2026-03-01', settledAmount: '', why: '' } })).rejects.toMatchObject({ code: 'not-found' });
    }
    const trainer = await workshop.addPerson({ roles: ['trainer'] });
    await expect(listClaims({ ctx: trainer, input: { caseId } })).rejects.toMatchObject({ code: 'forbidden' });
  });
});

describe('a core', () => {
  it('goes back, and is credited or refused with why', async () => {
    const { ctx } = workshop;
    const [caseId, coreId] = [await openACase(workshop), newId()];
    await expect(sendCore({ ctx, input: { id: coreId, caseId, whichFit: newId(), toWhom: 'Rebuilder', sentOn: '2026-02-20', expectedAmount: '' } })).rejects.toMatchObject({ fields: { whichFit: expect.any(String) } });
    await sendCore({ ctx, input: { id: coreId, caseId, whichFit: '', toWhom: 'Rebuilder', sentOn: '2026-02-20', expectedAmount: '120' } });
    const settle = (more: object) => settleCore({ ctx, input: { caseId, coreId, state: 'credited', settledOn: '2026-03-01', creditedAmount: '', why: '', ...more } });
    const seen = async () => (await listClaims({ ctx, input: { caseId } })).cores[0];
    await expect(settle({ state: 'refused' })).rejects.toMatchObject({ fields: { why: expect.any(String) } });
    await settle({ state: 'refused', why: 'Cracked' });
    expect(await seen()).toMatchObject({ state: 'refused', creditedAmount: null, why: 'Cracked', fit: null });
    await settle({});
    expect(await seen()).toMatchObject({ state: 'credited', creditedAmount: 120, why: null });
  });
});
