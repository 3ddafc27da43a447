import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { finding, membership, unitHold } from '@/db/schema';
import { newId } from '@/lib/ids';
import type { AnswerInput } from '@/lib/schemas/case';
import { readCaseKit } from '@/lib/services/case/kit';
import { readCase } from '@/lib/services/case/read';
import { createModel } from '@/lib/services/compressor-model/create';
import type { Ctx } from '@/lib/services/context';
import { createFit } from '@/lib/services/fit/create';
import { adoptLimit } from '@/lib/services/limit/adopt';
import { browseLimits, readLimitForm } from '@/lib/services/limit/list';
import { withdrawLimit } from '@/lib/services/limit/withdraw';
import { createUnit } from '@/lib/services/unit/create';
import { readUnit } from '@/lib/services/unit/read';
import { liftHold } from '@/lib/services/unit-hold/lift';
import { openCase } from '@/lib/services/case/open';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import type { Tenant } from '@/tests/support/tenant';
import { give, makeWorkshop, no, yes } from '../cases/support';

const measured = (value: string, error?: string): AnswerInput => ({ kind: 'measured', value, error, sureness: 'sure' });
const LEAK = 'leak-down-released';
const CUT_IN = 'cut-in-pressure';

let databases: TestDatabases;
let workshop: Tenant;
let engineer: Ctx;
beforeAll(async () => {
  databases = await openTestDatabases();
});
afterAll(() => databases.close());
beforeEach(async () => {
  workshop = await makeWorkshop(databases);
  engineer = await workshop.addPerson({ roles: ['engineer'], mayRelease: true });
});

async function newUnit(more: Partial<Parameters<typeof createUnit>[0]['input']> = {}) {
  const id = newId();
  await createUnit({ ctx: workshop.ctx, input: { id, fleetNumber: id, siteId: workshop.siteId, vehicleKind: 'truck', ...more } });
  return id;
}
async function caseOn(unitId: string) {
  const id = newId();
  await openCase({ ctx: workshop.ctx, input: { id, unit: { kind: 'known', unitId }, complaints: ['complaint-oil'] } });
  return id;
}
const adopt = (input: Partial<Parameters<typeof adoptLimit>[0]['input']>) => adoptLimit({ ctx: engineer, input: { id: newId(), checkId: LEAK, source: 'Our own figure', ...input } });
const answer = (caseId: string, checkId: string, value: AnswerInput) => give(workshop.ctx, { caseId, checkId, answer: value });
const judgementOn = async (caseId: string, checkId: string, value: string, error?: string) =>
  (await answer(caseId, checkId, measured(value, error))).findings.find((one) => one.current && one.checkId === checkId)?.judgement ?? null;
const holdsOf = async (unitId: string) => (await readUnit({ ctx: workshop.ctx, input: { unitId } })).holds;

describe('a limit that the organisation adopted', () => {
  it('judges what is measured from then on, says which it is, and is kept with the finding', async () => {
    const caseId = await caseOn(await newUnit());
    expect(await judgementOn(caseId, LEAK, '2.5 psi/min')).toBeNull();
    expect((await readCase({ ctx: workshop.ctx, input: { caseId } })).state.releaseHolds).toEqual([LEAK]);

    const { id } = await adopt({ most: '3 psi/min', below: true, source: 'Handbook of combinations' });
    const within = await judgementOn(caseId, LEAK, '2.5 psi/min', '0.1');
    expect(within).toEqual({ verdict: 'within', text: 'Within the limit your organisation adopted, less than 3 psi/min (Handbook of combinations)' });
    const { state, limits } = await readCase({ ctx: workshop.ctx, input: { caseId } });
    expect(state.releaseHolds).toEqual([]);
    expect(limits[LEAK]).toEqual({ text: 'less than 3 psi/min', source: 'Handbook of combinations' });
    expect((await readCaseKit({ ctx: workshop.ctx, input: { caseId } })).limits?.[LEAK]).toMatchObject({ id, below: true });

    await withdrawLimit({ ctx: engineer, input: { limitId: id, reason: 'Single vehicles only' } });
    const rows = await workshop.asOwner((tx) => tx.select().from(finding).where(eq(finding.caseId, caseId)));
    expect(rows.find(({ judgement }) => judgement)?.judgement).toMatchObject({ verdict: 'within', limit: { id, source: 'Handbook of combinations' } });
    expect((await readCase({ ctx: workshop.ctx, input: { caseId } })).limits).toEqual({});
    expect(await judgementOn(caseId, LEAK, '2.5 psi/min')).toBeNull();
  });

  it('is out at the very value where it says “less than”, and says when the reading could be on either side', async () => {
    const caseId = await caseOn(await newUnit());
    await adopt({ most: '2 psi/min', below: true });
    expect((await judgementOn(caseId, LEAK, '2 psi/min', '0'))?.verdict).toBe('out');
    expect((await judgementOn(caseId, LEAK, '1.9 psi/min', '0.5'))?.text).toMatch(/^Within .*; by the error of the reading it could be on either side$/);
  });

  it('is that of the narrowest that fits: country, truck or bus, build date, model', async () => {
    const modelId = newId();
    await createModel({ ctx: engineer, input: { id: modelId, name: 'Brindle 30' } });
    await adopt({ checkId: CUT_IN, least: '80 psi', source: 'any' });
    await adopt({ checkId: CUT_IN, least: '85 psi', source: 'buses', vehicleKind: 'bus' });
    await adopt({ checkId: CUT_IN, least: '100 psi', source: 'newer trucks', vehicleKind: 'truck', builtFrom: '1997-03-01' });
    await adopt({ checkId: CUT_IN, least: '7 bar', source: 'Portugal', country: 'PT' });
    await adopt({ checkId: CUT_IN, least: '95 psi', source: 'its maker', modelId });
    const sourceFor = async (unitId: string) => (await readCase({ ctx: workshop.ctx, input: { caseId: await caseOn(unitId) } })).limits[CUT_IN]?.source;

    expect(await sourceFor(await newUnit({ vehicleKind: 'bus' }))).toBe('buses');
    expect(await sourceFor(await newUnit({ builtOn: '1997-03-01' }))).toBe('newer trucks');
    expect(await sourceFor(await newUnit({ builtOn: '1997-02-28' }))).toBe('any');
    expect(await sourceFor(await newUnit())).toBe('any');
    expect(await sourceFor(await newUnit({ vehicleKind: 'bus', country: 'PT' }))).toBe('Portugal');
    const fitted = await newUnit({ builtOn: '2015-01-01' });
    await createFit({ ctx: workshop.ctx, input: { id: newId(), unitId: fitted, modelId, condition: 'new', installedOn: '2024-02-01' } });
    expect(await sourceFor(fitted)).toBe('its maker');
  });

  it('is refused without a source, without a figure, the wrong way round, in another quantity, for what is not measured', async () => {
    const refused = (input: Parameters<typeof adopt>[0]) => adopt(input).then(() => null, (error: { fields: Record<string, string> }) => Object.keys(error.fields));
    expect(await refused({ most: '2 psi/min', source: ' ' })).toEqual(['source']);
    expect(await refused({})).toEqual(['most']);
    expect(await refused({ checkId: CUT_IN, least: '100 psi', most: '90 psi' })).toEqual(['most']);
    expect(await refused({ most: '20 mm' })).toEqual(['most']);
    expect(await refused({ checkId: 'oil-in-service-tanks', most: '2' })).toEqual(['checkId']);
    expect(await refused({ most: '2 psi/min', modelId: newId() })).toEqual(['modelId']);
    expect(await refused({ most: '2 psi/min', builtFrom: '2000-01-01', builtBefore: '1999-01-01' })).toEqual(['builtBefore']);
  });

  it('is another organisation’s own affair', async () => {
    const { id } = await adopt({ most: '2 psi/min' });
    const stranger = await makeWorkshop(databases);
    const theirs = await stranger.addPerson({ roles: ['engineer'] });
    expect((await browseLimits({ ctx: theirs, input: {} })).limits).toEqual([]);
    await expect(withdrawLimit({ ctx: theirs, input: { limitId: id, reason: 'Ours now' } })).rejects.toMatchObject({ code: 'not-found' });
    await expect(adoptLimit({ ctx: workshop.ctx, input: { id: newId(), checkId: LEAK, most: '2', source: 'Mine' } })).rejects.toMatchObject({ code: 'forbidden' });
  });

  it('begins from a published figure with its source', async () => {
    const { figures, values } = await readLimitForm({ ctx: engineer, input: { check: CUT_IN, from: 'us-cut-in-truck' } });
    expect(figures.map(({ id }) => id)).toContain('us-cut-in-bus');
    // 49 CFR 571.121 S5.1.1.1
    expect(values).toMatchObject({ least: '100', most: '', country: 'US', vehicleKind: 'truck', builtFrom: '1997-03-01' });
    expect(values.source).toContain('49 CFR 571.121');
  });
});

describe('“do not release” on a unit', () => {
  it('outlives the case, passes by a later case, and is lifted by the right alone, on a measurement within the limit', async () => {
    await adopt({ most: '2 psi/min', below: true, source: 'Handbook' });
    const unitId = await newUnit();
    const first = await caseOn(unitId);
    await answer(first, LEAK, measured('4 psi/min'));
    const [hold] = await holdsOf(unitId);
    expect(hold).toMatchObject({ caseId: first, check: 'Leak-down, brakes released', passedAt: null });
    const lift = (ctx: Ctx, found: string) => liftHold({ ctx, input: { unitId, holdId: hold?.id ?? '', found } });

    const second = await caseOn(unitId);
    expect((await readCase({ ctx: workshop.ctx, input: { caseId: second } })).otherHolds).toMatchObject([{ caseId: first, checks: ['Leak-down, brakes released'], passed: [] }]);
    await answer(second, LEAK, measured('1 psi/min'));
    expect((await holdsOf(unitId))[0]?.passedAt).toBeInstanceOf(Date);
    await answer(second, LEAK, measured('3 psi/min'));
    expect(await holdsOf(unitId)).toMatchObject([{ passedAt: null }]);

    await expect(lift(workshop.ctx, '1 psi/min')).rejects.toMatchObject({ code: 'forbidden' });
    await expect(lift(engineer, '2.5 psi/min')).rejects.toMatchObject({ code: 'invalid', fields: { found: expect.stringContaining('Handbook') } });
    await expect(lift(engineer, 'fine now')).rejects.toMatchObject({ code: 'invalid', fields: { found: expect.any(String) } });
    await workshop.asOwner((tx) => tx.update(membership).set({ releaseBasis: 'Brake inspector' }).where(eq(membership.personId, engineer.person.id)));
    await lift(engineer, '1.2 psi/min');
    expect(await holdsOf(unitId)).toEqual([]);
    expect((await readUnit({ ctx: workshop.ctx, input: { unitId } })).lifted).toMatchObject([
      { check: 'Leak-down, brakes released', found: '1.2 psi/min', by: engineer.person.name, basis: 'Brake inspector', limitSource: 'Handbook' },
    ]);
    await lift(engineer, '1.2 psi/min');
    expect((await workshop.asOwner((tx) => tx.select().from(unitHold).where(eq(unitHold.unitId, unitId)))).map(({ ended }) => ended)).toEqual(['lifted']);
  });

  it('goes with the answer that is taken back', async () => {
    const unitId = await newUnit();
    const caseId = await caseOn(unitId);
    await answer(caseId, 'oil-in-service-tanks', yes);
    expect(await holdsOf(unitId)).toHaveLength(1);
    await answer(caseId, 'oil-in-service-tanks', { kind: 'undo' });
    expect(await holdsOf(unitId)).toEqual([]);
  });

  it('of something seen is lifted only after it has passed as an answer', async () => {
    const unitId = await newUnit();
    const caseId = await caseOn(unitId);
    await answer(caseId, 'oil-in-service-tanks', yes);
    const [hold] = await holdsOf(unitId);
    const lift = () => liftHold({ ctx: engineer, input: { unitId, holdId: hold?.id ?? '', found: 'Dry after a week' } });
    await expect(lift()).rejects.toMatchObject({ code: 'conflict' });
    await answer(caseId, 'oil-in-service-tanks', no);
    await lift();
    expect(await holdsOf(unitId)).toEqual([]);
  });

  it('of another organisation is not found', async () => {
    const unitId = await newUnit();
    await answer(await caseOn(unitId), 'oil-in-service-tanks', yes);
    const [hold] = await holdsOf(unitId);
    const stranger = await makeWorkshop(databases);
    const theirs = await stranger.addPerson({ roles: ['engineer'], mayRelease: true });
    await expect(liftHold({ ctx: theirs, input: { unitId, holdId: hold?.id ?? '', found: 'x' } })).rejects.toMatchObject({ code: 'not-found' });
  });
});
