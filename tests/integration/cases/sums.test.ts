import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { cases, finding } from '@/db/schema';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import type { AnswerInput } from '@/lib/schemas/case';
import { readSumTarget } from '@/lib/services/bench/target';
import { workOutSum } from '@/lib/services/bench/work-out';
import { readCaseKit } from '@/lib/services/case/kit';
import { changeUnit } from '@/lib/services/unit/change';
import { readUnitForm } from '@/lib/services/unit/read';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makeTenant, type Tenant } from '@/tests/support/tenant';
import { give, makeWorkshop, openACase, readCautions } from './support';

const CHECK = 'build-up-time';
const bands = defaultRulebook.checks.find(({ id }) => id === CHECK)?.states ?? [];

/** 30 s with tanks as large as required is 30 s; "slow" is 26 to 46 s. */
const timed = (time: string, more: Record<string, { value?: string; error?: string }> = {}): AnswerInput => ({
  kind: 'sum',
  inputs: { time: { value: time }, actualVolume: { value: '5568 in3' }, requiredVolume: { value: '5568 in3' }, ...more },
  sureness: 'sure',
});

describe('a sum that answers a check', () => {
  let databases: TestDatabases;
  let workshop: Tenant;
  beforeAll(async () => {
    databases = await openTestDatabases();
    workshop = await makeWorkshop(databases);
  });
  afterAll(() => databases.close());

  const rowOf = async (id: string) => (await workshop.asOwner((tx) => tx.select().from(finding).where(eq(finding.id, id))))[0];
  const current = (state: Awaited<ReturnType<typeof give>>) => state.findings.find((one) => one.current && one.checkId === CHECK);

  it('is kept with everything that went in, from which it can be made again', async () => {
    const caseId = await openACase(workshop);
    const id = newId();
    const state = await give(workshop.ctx, { id, caseId, checkId: CHECK, answer: timed('0:30', { actualVolume: { value: '7200 in3', error: '100 in3' } }) });
    const row = await rowOf(id);
    // 49 CFR 571.121 S5.1.1: the time grows with the tanks, so that 30 s with 7200 of 5568 in3 count as 23.2 s.
    expect(row?.valueSi).toBeCloseTo((30 * 5568) / 7200, 9);
    expect(row?.source).toBe('sum');
    expect(row?.sum).toMatchObject({ id: 'measured-build-up', output: 'corrected' });
    const kept = Object.fromEntries(row?.sum?.inputs.map((input) => [input.id, input]) ?? []);
    expect(kept.time).toMatchObject({ typed: '0:30', si: 30 });
    expect(kept.actualVolume).toMatchObject({ typed: '7200 in3', errorTyped: '100 in3', unit: 'in3' });
    expect(kept.fromPressure).toMatchObject({ typed: null });
    const shown = current(state);
    expect(shown?.sum).toMatchObject({ id: 'measured-build-up', search: { time: '30 s', actualVolume: '7200 in³', 'actualVolume.error': '100 in³' } });
    const again = await workOutSum({ ctx: workshop.ctx, input: { sum: 'measured-build-up', inputs: { time: { value: shown?.sum?.search.time }, actualVolume: { value: shown?.sum?.search.actualVolume, error: '100 in3' }, requiredVolume: { value: shown?.sum?.search.requiredVolume } } } });
    expect(again.outputs.find((output) => output.id === 'corrected')?.si).toBeCloseTo(row?.valueSi ?? NaN, 9);
    expect(again.band?.low).toBeCloseTo(row?.sum?.low ?? NaN, 9);
  });

  it('is spread over the bands that its interval straddles', async () => {
    const caseId = await openACase(workshop);
    const edge = bands.find(({ id }) => id === 'slow')?.low ?? NaN;
    const state = await give(workshop.ctx, { caseId, checkId: CHECK, answer: timed(`${edge} s`) });
    const shares = current(state)?.shares ?? [];
    expect(shares.map(({ state: band }) => band)).toEqual(['quick', 'slow']);
    expect(shares.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 12);
    const surely = await give(workshop.ctx, { caseId, checkId: CHECK, answer: timed(`${edge + 10} s`) });
    expect(current(surely)?.shares).toEqual([{ state: 'slow', share: 1 }]);
  });

  it('that is changed at the bench later stands under the new one, and both are there', async () => {
    const caseId = await openACase(workshop);
    const [first, second] = [newId(), newId()];
    await give(workshop.ctx, { id: first, caseId, checkId: CHECK, answer: timed('60 s'), deviceAt: new Date(workshop.ctx.now().getTime() - 60_000) });
    const before = await rowOf(first);
    const state = await give(workshop.ctx, { id: second, caseId, checkId: CHECK, answer: timed('20 s') });
    expect(await rowOf(first)).toEqual(before);
    expect((await rowOf(second))?.supersedes).toBe(first);
    expect(state.findings.filter(({ checkId }) => checkId === CHECK).map(({ id, current: stands }) => [id, stands])).toEqual([[second, true], [first, false]]);
  });

  it('holds the release like a reading, and gives way like one', async () => {
    const caseId = await openACase(workshop);
    expect((await give(workshop.ctx, { caseId, checkId: CHECK, answer: timed('120 s') })).releaseHolds).toEqual([CHECK]);
    expect((await give(workshop.ctx, { caseId, checkId: CHECK, answer: timed('20 s') })).releaseHolds).toEqual([]);
  });

  it.each([
    ['what is missing', { time: { value: '' } }, { time: expect.stringContaining('Give') as string }],
    ['what is no quantity', { time: { value: 'soon' } }, { time: expect.stringContaining('soon') as string }],
    ['what is out of range', { actualVolume: { value: '0.1 in3' } }, { actualVolume: expect.stringContaining('must be from') as string }],
    ['an error that is none', { time: { value: '30', error: '2 psi' } }, { 'time.error': expect.any(String) as string }],
    ['pressures that do not rise', { fromPressure: { value: '100' }, toPressure: { value: '90' } }, { toPressure: expect.stringContaining('must be') as string }],
  ])('refuses %s beside its field', async (_, inputs, fields) => {
    const caseId = await openACase(workshop);
    await expect(give(workshop.ctx, { caseId, checkId: CHECK, answer: timed('30 s', inputs) })).rejects.toMatchObject({ code: 'invalid', fields });
  });

  it('refuses a sum for a check that has none', async () => {
    const caseId = await openACase(workshop);
    await expect(give(workshop.ctx, { caseId, checkId: 'line-bore', answer: timed('30 s') })).rejects.toMatchObject({ code: 'invalid' });
  });

  it('goes to a device with its inputs, for work without a connection', async () => {
    const caseId = await openACase(workshop);
    await give(workshop.ctx, { caseId, checkId: CHECK, answer: timed('30 s') });
    const { rows } = await readCaseKit({ ctx: workshop.ctx, input: { caseId } });
    expect(rows.find(({ checkId }) => checkId === CHECK)?.sum?.inputs).toHaveLength(6);
  });

  it('begins with what the records know, and says what it would replace', async () => {
    const caseId = await openACase(workshop);
    const { ctx } = workshop;
    const before = await readSumTarget({ ctx, input: { caseId, checkId: CHECK, sumId: 'measured-build-up' } });
    expect(before).toMatchObject({ known: {}, target: { standing: null, open: true, output: 'corrected' } });
    const [row] = await workshop.asOwner((tx) => tx.select({ unitId: cases.unitId }).from(cases).where(eq(cases.id, caseId)));
    const unitId = row?.unitId ?? '';
    const { version, values } = await readUnitForm({ ctx, input: { unitId } });
    await changeUnit({ ctx, input: { ...values, unitId, version, vehicleKind: 'truck', vocation: null, reservoirs: '7200 in3', requiredReservoirs: '5568 in3' } });
    await readCautions(ctx, caseId, CHECK);
    await give(ctx, { caseId, checkId: CHECK, answer: timed('30 s') });
    const { known, target } = await readSumTarget({ ctx, input: { caseId, checkId: CHECK, sumId: 'measured-build-up' } });
    expect(known.actualVolume?.si).toBeCloseTo(7200 * 0.0254 ** 3, 12);
    expect(known.actualVolume?.from).toContain('unit');
    expect(target.standing).toMatch(/^30 s/);
  });

  it('is found by nobody from another organisation', async () => {
    const caseId = await openACase(workshop);
    const other = await makeTenant(databases, { rulebook: defaultRulebook });
    await expect(readSumTarget({ ctx: other.ctx, input: { caseId, checkId: CHECK, sumId: 'measured-build-up' } })).rejects.toMatchObject({ code: 'not-found' });
  });
});
