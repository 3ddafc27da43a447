import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { audit, baselineFigure, baselineSet, finding, removal } from '@/db/schema';
import { buildState } from '@/lib/case/build-state';
import { provisionalParts } from '@/lib/case/provisional';
import { compileTrusted } from '@/lib/diagnose/compile';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import { hideBaseline } from '@/lib/services/baseline/hide';
import { readBaseline } from '@/lib/services/baseline/read';
import { recordBaseline } from '@/lib/services/baseline/record';
import { readCaseKit } from '@/lib/services/case/kit';
import { openCase } from '@/lib/services/case/open';
import { readCase, readCaseState } from '@/lib/services/case/read';
import { createModel } from '@/lib/services/compressor-model/create';
import type { Ctx } from '@/lib/services/context';
import { createFit } from '@/lib/services/fit/create';
import { createUnit } from '@/lib/services/unit/create';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import type { Tenant } from '@/tests/support/tenant';
import { give, makeWorkshop } from '../cases/support';

const NOW = new Date('2026-06-15T15:00:00Z');
const now = () => NOW;
const plain = (text: string | undefined | null) => text?.replaceAll('\u00a0', ' ');

let databases: TestDatabases;
let workshop: Tenant;
beforeAll(async () => {
  databases = await openTestDatabases();
  workshop = await makeWorkshop(databases, { now });
});
afterAll(() => databases.close());

async function makeModel({ addPerson }: Tenant = workshop, id = newId()): Promise<string> {
  await createModel({ ctx: await addPerson({ roles: ['engineer'] }), input: { id, name: `Model ${id}` } });
  return id;
}

/** A unit with a compressor of the model on it since 2 January 2026, unless told otherwise. */
async function makeUnit(modelId: string | null, { tenant = workshop, installedOn = '2026-01-02' } = {}): Promise<string> {
  const { ctx, siteId } = tenant;
  const unitId = newId();
  await createUnit({ ctx, input: { id: unitId, fleetNumber: unitId, siteId, vehicleKind: 'truck' } });
  if (modelId) await createFit({ ctx, input: { id: newId(), unitId, modelId, condition: 'new', installedOn } });
  return unitId;
}

type Figures = Partial<Record<'buildUp' | 'buildUpError' | 'headTemperature' | 'leakDown' | 'shareLoaded' | 'oilCarried' | 'ambient' | 'engineSpeed' | 'loadedFor', string>>;
async function measure(unitId: string, figures: Figures, { ctx = workshop.ctx, id = newId(), measuredOn = '2026-05-12' }: { ctx?: Ctx; id?: string; measuredOn?: string } = {}): Promise<string> {
  await recordBaseline({ ctx, input: { id, unitId, occasion: 'service', measuredOn, ...figures } });
  return id;
}

const counting = async (unitId: string, ctx = workshop.ctx) => {
  const { figures } = await readBaseline({ ctx, input: { unitId } });
  return Object.fromEntries(figures.map(({ figure, counts }) => [figure, counts]));
};
const buildUpOf = async (unitId: string) => (await counting(unitId))['build-up-time'];

describe('a set', () => {
  test('is kept in SI, as typed, with its error and its conditions, and the compressor that was on', async () => {
    const modelId = await makeModel();
    const unitId = await makeUnit(modelId);
    const id = await measure(unitId, { buildUp: '0:24', headTemperature: '295', ambient: '20 °C', engineSpeed: '1,600 rpm', loadedFor: '10', shareLoaded: '18', oilCarried: '0.2' });
    const [row] = await workshop.asOwner((tx) => tx.select().from(baselineSet).where(eq(baselineSet.id, id)));
    expect(row).toMatchObject({ unitId, modelId, occasion: 'service', measuredOn: '2026-05-12', asTyped: { ambientK: '20 °C', loadedS: '10 min' } });
    expect(row?.conditions.ambientK).toBeCloseTo(293.15, 9);
    expect(row?.conditions.loadedS).toBe(600);
    const figures = await workshop.asOwner((tx) => tx.select().from(baselineFigure).where(eq(baselineFigure.setId, id)));
    const byId = Object.fromEntries(figures.map((figure) => [figure.figure, figure]));
    expect(byId['build-up-time']).toMatchObject({ valueSi: 24, errorSi: 1, valueTyped: '0:24', errorTyped: null });
    // 295 °F = (295 - 32) / 1.8 °C = 146.11 °C
    expect(byId['head-temperature']?.valueSi).toBeCloseTo(273.15 + 146.1111, 3);
    expect(byId['head-temperature']?.unit).toBe('degF');
    expect(byId['share-loaded']?.valueSi).toBeCloseTo(0.18, 9);
    expect(byId['leak-down-released']).toBeUndefined();
    const [noted] = await workshop.asOwner((tx) => tx.select().from(audit).where(eq(audit.entityId, id)));
    expect(noted).toMatchObject({ action: 'record.baseline-set', changed: { unitId, 'build-up-time': '0:24' } });
  });

  test('is written once, however often it is sent', async () => {
    const unitId = await makeUnit(null);
    const id = newId();
    await measure(unitId, { buildUp: '24' }, { id });
    await measure(unitId, { buildUp: '24' }, { id });
    expect((await readBaseline({ ctx: workshop.ctx, input: { unitId } })).sets).toHaveLength(1);
    const other = await makeUnit(null);
    await expect(measure(other, { buildUp: '24' }, { id })).rejects.toMatchObject({ code: 'conflict' });
  });

  test.each<[string, Figures, Record<string, unknown>]>([
    ['with nothing measured', {}, { buildUp: expect.stringContaining('at least one') }],
    ['of what is no quantity', { leakDown: 'soon' }, { leakDown: expect.stringContaining('soon') }],
    ['of what can’t be', { shareLoaded: '120 %' }, { shareLoaded: expect.stringContaining('can’t be right') }],
    ['with an error that is none', { buildUp: '24', buildUpError: '2 psi' }, { buildUpError: expect.any(String) }],
    ['of a head temperature without its conditions', { headTemperature: '295', ambient: '70' }, { engineSpeed: expect.stringContaining('compared'), loadedFor: expect.any(String) }],
  ])('%s is refused beside its field', async (_, figures, fields) => {
    const unitId = await makeUnit(null);
    await expect(measure(unitId, figures)).rejects.toMatchObject({ code: 'invalid', fields });
    expect((await readBaseline({ ctx: workshop.ctx, input: { unitId } })).sets).toEqual([]);
  });

  test('of a day that is yet to come is refused', async () => {
    const unitId = await makeUnit(null);
    await expect(measure(unitId, { buildUp: '24' }, { measuredOn: '2026-06-16' })).rejects.toMatchObject({ fields: { measuredOn: expect.any(String) as string } });
  });

  test('is measured and hidden by who works on cases, and read by all of the organisation', async () => {
    const unitId = await makeUnit(null);
    const trainer = await workshop.addPerson({ roles: ['trainer'] });
    await expect(measure(unitId, { buildUp: '24' }, { ctx: trainer })).rejects.toMatchObject({ code: 'forbidden' });
    const setId = await measure(unitId, { buildUp: '24' });
    await expect(hideBaseline({ ctx: trainer, input: { unitId, setId, whyHidden: 'Wrong' } })).rejects.toMatchObject({ code: 'forbidden' });
    expect((await counting(unitId, trainer))['build-up-time']).toMatchObject({ from: 'own' });
  });

  test('that was hidden counts no more, and says who hid it and why', async () => {
    const unitId = await makeUnit(null);
    const setId = await measure(unitId, { buildUp: '24' });
    await hideBaseline({ ctx: workshop.ctx, input: { unitId, setId, whyHidden: 'The gauge stuck' } });
    expect(await buildUpOf(unitId)).toBeNull();
    expect((await readBaseline({ ctx: workshop.ctx, input: { unitId } })).sets).toEqual([]);
    const [row] = await workshop.asOwner((tx) => tx.select().from(removal).where(eq(removal.entityId, setId)));
    expect(row).toMatchObject({ entity: 'baseline-set', reason: 'The gauge stuck', personId: workshop.ctx.person.id });
    await expect(hideBaseline({ ctx: workshop.ctx, input: { unitId, setId, whyHidden: 'Again' } })).rejects.toMatchObject({ code: 'not-found' });
  });
});

describe('what counts for a unit', () => {
  test('is its model’s pool of three units, and its own set as soon as it has one', async () => {
    const modelId = await makeModel();
    const unitId = await makeUnit(modelId);
    const others = [await makeUnit(modelId), await makeUnit(modelId), await makeUnit(modelId)];
    await measure(others[0] ?? '', { buildUp: '20' });
    await measure(others[1] ?? '', { buildUp: '22' });
    // One unit twice is still one unit.
    await measure(others[1] ?? '', { buildUp: '23' }, { measuredOn: '2026-05-20' });
    expect(await buildUpOf(unitId)).toBeNull();
    const { figures } = await readBaseline({ ctx: workshop.ctx, input: { unitId } });
    expect(figures[0]).toMatchObject({ figure: 'build-up-time', pooled: { units: 2, sets: 3 } });

    const third = await measure(others[2] ?? '', { buildUp: '30' });
    expect(await buildUpOf(unitId)).toMatchObject({ from: 'model', median: 23, units: 3, sets: 4 });
    await measure(unitId, { buildUp: '26' });
    expect(await buildUpOf(unitId)).toMatchObject({ from: 'own', si: 26 });

    await hideBaseline({ ctx: workshop.ctx, input: { unitId: others[2] ?? '', setId: third, whyHidden: 'Wrong unit' } });
    expect((await readBaseline({ ctx: workshop.ctx, input: { unitId } })).figures[0]?.pooled).toMatchObject({ units: 3, median: 23 });
  });

  test('is nothing that was measured on the compressor before', async () => {
    const modelId = await makeModel();
    const unitId = await makeUnit(modelId);
    await measure(unitId, { buildUp: '24' }, { measuredOn: '2026-02-01' });
    expect(await buildUpOf(unitId)).toMatchObject({ from: 'own' });
    await createFit({ ctx: workshop.ctx, input: { id: newId(), unitId, modelId: await makeModel(), condition: 'new', installedOn: '2026-03-01', previousWhyOut: 'precaution' } });
    expect(await buildUpOf(unitId)).toBeNull();
    const { sets, since } = await readBaseline({ ctx: workshop.ctx, input: { unitId } });
    expect([sets.length, since]).toEqual([1, '2026-03-01']);
  });

  test('is never of another organisation', async () => {
    const modelId = await makeModel();
    const unitId = await makeUnit(modelId);
    const elsewhere = await makeWorkshop(databases, { now });
    // The same id, as a device that makes ids might have it.
    const theirModel = await makeModel(elsewhere, modelId);
    for (let i = 0; i < 3; i += 1) await measure(await makeUnit(theirModel, { tenant: elsewhere }), { buildUp: '20' }, { ctx: elsewhere.ctx });
    expect(await buildUpOf(unitId)).toBeNull();
    await expect(readBaseline({ ctx: elsewhere.ctx, input: { unitId } })).rejects.toMatchObject({ code: 'not-found' });
    await expect(measure(unitId, { buildUp: '20' }, { ctx: elsewhere.ctx })).rejects.toMatchObject({ code: 'not-found' });
    const setId = await measure(unitId, { buildUp: '24' });
    await expect(hideBaseline({ ctx: elsewhere.ctx, input: { unitId, setId, whyHidden: 'Mine now' } })).rejects.toMatchObject({ code: 'not-found' });
  });
});

describe('a case', () => {
  async function caseOn(unitId: string): Promise<string> {
    const id = newId();
    await openCase({ ctx: workshop.ctx, input: { id, unit: { kind: 'known', unitId }, complaints: ['complaint-oil'] } });
    return id;
  }
  const baselineOf = async (findingId: string) => (await workshop.asOwner((tx) => tx.select({ baseline: finding.baseline }).from(finding).where(eq(finding.id, findingId))))[0]?.baseline;
  const shown = async (caseId: string, findingId: string) => (await readCaseState({ ctx: workshop.ctx, input: { caseId } })).findings.find(({ id }) => id === findingId)?.compared;

  test('shows what is usual at the checks that compare, and nothing where nothing counts', async () => {
    const unitId = await makeUnit(null);
    await measure(unitId, { headTemperature: '146 °C', ambient: '20 °C', engineSpeed: '1600 rpm', loadedFor: '10 min' });
    const caseId = await caseOn(unitId);
    const { usual } = await readCase({ ctx: workshop.ctx, input: { caseId } });
    expect(Object.keys(usual)).toEqual(['head-temperature']);
    expect(plain(usual['head-temperature'])).toBe('Usual for this unit: 295 °F, own set of 12 May 2026 (68 °F outside, 1,600 rpm, 10 min loaded)');
    expect((await readCase({ ctx: workshop.ctx, input: { caseId, at: NOW.toISOString() } })).usual).toEqual({});
  });

  test('keeps what an answer was compared with, whatever is measured later', async () => {
    const unitId = await makeUnit(null);
    const setId = await measure(unitId, { buildUp: '24' });
    const caseId = await caseOn(unitId);
    const id = newId();
    const state = await give(workshop.ctx, { id, caseId, checkId: 'build-up-time', answer: { kind: 'measured', value: '31', sureness: 'sure' } });
    expect(plain(state.findings.find((one) => one.id === id)?.compared)).toBe('7 s above this unit’s own 24 s of 12 May 2026');
    expect(await baselineOf(id)).toMatchObject({ from: 'own', figure: 'build-up-time', si: 24, setId });

    await measure(unitId, { buildUp: '30' }, { measuredOn: '2026-06-01' });
    await hideBaseline({ ctx: workshop.ctx, input: { unitId, setId, whyHidden: 'Wrong' } });
    expect(await baselineOf(id)).toMatchObject({ si: 24, setId });
    expect(plain(await shown(caseId, id))).toBe('7 s above this unit’s own 24 s of 12 May 2026');
  });

  test('keeps it with a sum, and with a check that asks for the difference', async () => {
    const unitId = await makeUnit(null);
    await measure(unitId, { buildUp: '24', headTemperature: '146 °C', ambient: '20 °C', engineSpeed: '1600 rpm', loadedFor: '10 min' });
    const caseId = await caseOn(unitId);
    const [sum, difference] = [newId(), newId()];
    await give(workshop.ctx, { id: sum, caseId, checkId: 'build-up-time', answer: { kind: 'sum', inputs: { time: { value: '24 s' }, actualVolume: { value: '5568 in3' }, requiredVolume: { value: '5568 in3' } }, sureness: 'sure' } });
    expect(plain(await shown(caseId, sum))).toBe('the same as this unit’s own 24 s of 12 May 2026');
    await give(workshop.ctx, { id: difference, caseId, checkId: 'head-temperature', answer: { kind: 'measured', value: '38 °C', sureness: 'sure' } });
    // 146 °C and 38 K are 184 °C, 363.2 °F; 38 K are 68.4 °F.
    expect(plain(await shown(caseId, difference))).toBe('363 °F: 68.4 °F above this unit’s own 295 °F of 12 May 2026');
  });

  test('compares nothing that wasn’t measured, and nothing where nothing counts', async () => {
    const unitId = await makeUnit(null);
    await measure(unitId, { buildUp: '24' });
    const caseId = await caseOn(unitId);
    const [unsaid, other] = [newId(), newId()];
    await give(workshop.ctx, { id: unsaid, caseId, checkId: 'build-up-time', answer: { kind: 'cannot-tell' } });
    await give(workshop.ctx, { id: other, caseId, checkId: 'share-loaded', answer: { kind: 'measured', value: '30', sureness: 'sure' } });
    expect([await baselineOf(unsaid), await baselineOf(other)]).toEqual([null, null]);
  });

  test('is ranked the same with a baseline as without', async () => {
    const [withOne, without] = [await makeUnit(null), await makeUnit(null)];
    await measure(withOne, { buildUp: '24' });
    const states = await Promise.all(
      [withOne, without].map(async (unitId) => give(workshop.ctx, { caseId: await caseOn(unitId), checkId: 'build-up-time', answer: { kind: 'measured', value: '60', sureness: 'sure' } })),
    );
    expect(states[0]?.causes).toEqual(states[1]?.causes);
  });

  test('compares on a device without a connection as the server does', async () => {
    const unitId = await makeUnit(null);
    await measure(unitId, { buildUp: '24' });
    const caseId = await caseOn(unitId);
    const kit = JSON.parse(JSON.stringify(await readCaseKit({ ctx: workshop.ctx, input: { caseId } }))) as Awaited<ReturnType<typeof readCaseKit>>;
    const [id, checkId] = [newId(), 'build-up-time'];
    const common = { personId: kit.personId, organisationId: kit.organisationId, caseId, refusal: null };
    const body = { id, checkId, answer: { kind: 'measured' as const, value: '31', sureness: 'sure' as const }, deviceAt: NOW.toISOString(), clockOffsetMs: 0 };
    const here = buildState(provisionalParts({ compiled: compileTrusted(defaultRulebook), kit, waiting: [{ ...common, kind: 'finding', id, body }], now: NOW }));
    const there = await give(workshop.ctx, { id, caseId, checkId, answer: body.answer });
    const compared = (state: typeof here) => state.findings.find((one) => one.id === id)?.compared;
    expect(plain(compared(here))).toBe('7 s above this unit’s own 24 s of 12 May 2026');
    expect(compared(there)).toBe(compared(here));
  });
});
