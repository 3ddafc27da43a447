import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { audit, finding, run } from '@/db/schema';
import { compileRulebook, rank } from '@/lib/diagnose';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import { callCause } from '@/lib/services/case/call';
import { readCaseState } from '@/lib/services/case/read';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import type { Tenant } from '@/tests/support/tenant';
import { give, giveUnread, makeWorkshop, no, openACase, yes } from './support';

describe('answering a check', () => {
  let databases: TestDatabases;
  let workshop: Tenant;
  let caseId: string;
  beforeAll(async () => {
    databases = await openTestDatabases();
    workshop = await makeWorkshop(databases);
  });
  afterAll(() => databases.close());
  const freshCase = async () => (caseId = await openACase(workshop));
  const current = (state: Awaited<ReturnType<typeof give>>, checkId: string) => state.findings.find((f) => f.current && f.checkId === checkId);
  const p = (state: { causes: { causeId: string; p: number }[] }, causeId: string) => state.causes.find((cause) => cause.causeId === causeId)?.p ?? NaN;

  it('saves it, ranks anew and says what moved', async () => {
    await freshCase();
    const { ctx } = workshop;
    const before = await readCaseState({ ctx, input: { caseId } });
    const state = await give(ctx, { caseId, checkId: 'oil-at-purge', answer: yes });
    expect(current(state, 'oil-at-purge')?.answer).toBe('Yes');
    expect(state.because).toContain('Oil at the purge');
    expect(state.version).toBeGreaterThan(before.version);
    const leader = state.causes[0];
    expect(leader?.change).toBeCloseTo((leader?.p ?? 0) - p(before, leader?.causeId ?? ''), 12);
    expect(state.causes.reduce((sum, cause) => sum + cause.p, 0)).toBeCloseTo(1, 12);
    expect(Object.values(state.suspicion).reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 12);
    expect(state.differs).toBe(false);
  });

  it('keeps the run so that it can be made again, bit for bit', async () => {
    await freshCase();
    const state = await give(workshop.ctx, { caseId, checkId: 'coolant-in-wet-tank', answer: yes });
    const [kept] = await workshop.asOwner((tx) => tx.select().from(run).where(eq(run.id, state.runId ?? '')));
    const again = rank(compileRulebook(defaultRulebook), kept?.inputs.findings ?? [], { facts: kept?.inputs.recordFacts });
    expect(again.causes.map(({ causeId, p: chance, scoreNats }) => ({ causeId, p: chance, scoreNats }))).toEqual(kept?.result.causes);
    expect(kept).toMatchObject({ agreed: true, editionId: workshop.editionId, rankerVersion: again.rankerVersion });
    expect(kept?.inputs).toMatchObject({ beta: 1 });
  });

  it('writes once when the same request comes twice', async () => {
    await freshCase();
    const given = { id: newId(), caseId, checkId: 'oil-at-purge', answer: yes };
    const first = await give(workshop.ctx, given);
    const second = await give(workshop.ctx, given);
    expect(second.causes).toEqual(first.causes);
    expect(await workshop.asOwner((tx) => tx.select().from(finding).where(eq(finding.id, given.id)))).toHaveLength(1);
    expect(await workshop.asOwner((tx) => tx.select().from(audit).where(eq(audit.entityId, given.id)))).toHaveLength(1);
  });

  it('refuses an id that belongs to another finding', async () => {
    await freshCase();
    const id = newId();
    await give(workshop.ctx, { id, caseId, checkId: 'oil-at-purge', answer: yes });
    await expect(giveUnread(workshop.ctx, { id, caseId, checkId: 'noise', answer: { kind: 'skip' } })).rejects.toMatchObject({ code: 'conflict' });
  });

  it('counts "think so" for less than sure', async () => {
    await freshCase();
    const sure = await give(workshop.ctx, { caseId, checkId: 'coolant-in-wet-tank', answer: yes });
    const thinkSo = await give(workshop.ctx, { caseId, checkId: 'coolant-in-wet-tank', answer: { kind: 'state', state: 'yes', sureness: 'think-so' } });
    expect(p(thinkSo, 'head-gasket-failed')).toBeLessThan(p(sure, 'head-gasket-failed'));
    expect(current(thinkSo, 'coolant-in-wet-tank')).toMatchObject({ thinkSo: true });
  });

  it.each(['cannot-tell', 'skip', 'undo'] as const)('ranks after "%s" as if nothing had been answered', async (kind) => {
    await freshCase();
    const before = await readCaseState({ ctx: workshop.ctx, input: { caseId } });
    await give(workshop.ctx, { caseId, checkId: 'coolant-in-wet-tank', answer: yes });
    const after = await give(workshop.ctx, { caseId, checkId: 'coolant-in-wet-tank', answer: { kind } });
    expect(after.causes.map(({ causeId, p: chance }) => [causeId, chance])).toEqual(before.causes.map(({ causeId, p: chance }) => [causeId, chance]));
    expect(after.findings.filter((f) => f.checkId === 'coolant-in-wet-tank')).toHaveLength(2);
  });

  it('keeps a late answer under a newer one without letting it count', async () => {
    await freshCase();
    const now = workshop.ctx.now();
    const newer = await give(workshop.ctx, { caseId, checkId: 'oil-at-purge', answer: yes, deviceAt: now });
    const late = await give(workshop.ctx, { caseId, checkId: 'oil-at-purge', answer: no, deviceAt: new Date(now.getTime() - 1_000) });
    expect(current(late, 'oil-at-purge')?.answer).toBe('Yes');
    expect(late.findings.find((f) => f.late)).toMatchObject({ answer: 'No', current: false });
    expect(late.causes.map((cause) => cause.p)).toEqual(newer.causes.map((cause) => cause.p));
  });

  it('decides by device time corrected for its clock', async () => {
    await freshCase();
    const now = workshop.ctx.now();
    // A clock a day ahead, with the offset that says so, is older than an answer of this second. Seconds, so that it is the same day, of which cautions are read, but at midnight.
    const fast = { deviceAt: new Date(now.getTime() + 86_400_000 - 1_000), clockOffsetMs: -86_400_000 };
    await give(workshop.ctx, { caseId, checkId: 'oil-at-purge', answer: yes, deviceAt: now });
    const state = await give(workshop.ctx, { caseId, checkId: 'oil-at-purge', answer: no, ...fast });
    expect(current(state, 'oil-at-purge')?.answer).toBe('Yes');
  });

  describe('that is measured', () => {
    const measure = (value: string, error?: string) =>
      give(workshop.ctx, { caseId, checkId: 'build-up-time', answer: { kind: 'measured', value, error, sureness: 'sure' } });

    it('keeps what was typed, stores SI, and spreads over bands that the error straddles', async () => {
      await freshCase();
      const state = await measure('48 s', '1');
      expect(current(state, 'build-up-time')?.answer).toBe('48 s ± 1 s');
      const [row] = await workshop.asOwner((tx) => tx.select().from(finding).where(eq(finding.id, current(state, 'build-up-time')?.id ?? '')));
      expect(row).toMatchObject({ valueTyped: '48 s', errorTyped: '1', valueSi: 48, errorSi: 1, unit: 's' });
      const edge = defaultRulebook.checks.find(({ id }) => id === 'build-up-time')?.states.find(({ low }) => low !== undefined)?.low ?? NaN;
      const split = await measure(`${edge} s`, '2 s');
      expect(current(split, 'build-up-time')?.shares.map(({ share }) => share)).toEqual([0.5, 0.5]);
    });

    it.each([
      ['soon', 'value'],
      ['48 psi', 'value'],
      ['-5 s', 'value'],
      ['100000 s', 'value'],
    ])('refuses %j beside its field and keeps nothing', async (value, field) => {
      await freshCase();
      await expect(measure(value)).rejects.toMatchObject({ code: 'invalid', fields: { [field]: expect.stringMatching(/\S/) } });
      const state = await readCaseState({ ctx: workshop.ctx, input: { caseId } });
      expect(state.findings.some((f) => f.checkId === 'build-up-time')).toBe(false);
    });

    it('refuses an error that is no error', async () => {
      await freshCase();
      await expect(measure('48 s', 'some')).rejects.toMatchObject({ code: 'invalid', fields: { error: expect.stringMatching(/\S/) } });
    });
  });

  it('refuses an unknown check and an unknown answer, in words', async () => {
    await freshCase();
    await expect(giveUnread(workshop.ctx, { caseId, checkId: 'no-such-check', answer: yes })).rejects.toMatchObject({ code: 'invalid', fields: { checkId: expect.any(String) } });
    await expect(give(workshop.ctx, { caseId, checkId: 'oil-at-purge', answer: { kind: 'state', state: 'purple', sureness: 'sure' } })).rejects.toMatchObject({ code: 'invalid', fields: { state: expect.any(String) } });
  });

  it('refuses answers to a case that was called', async () => {
    await freshCase();
    const { causes } = await readCaseState({ ctx: workshop.ctx, input: { caseId } });
    await callCause({ ctx: workshop.ctx, input: { id: newId(), caseId, mainCause: causes[0]?.causeId ?? '', sureness: 'guess' } });
    await expect(give(workshop.ctx, { caseId, checkId: 'oil-at-purge', answer: yes })).rejects.toMatchObject({ code: 'conflict' });
  });

  it('is for those who work on cases, in their own organisation', async () => {
    await freshCase();
    const trainer = await workshop.addPerson({ roles: ['trainer', 'administrator'] });
    await expect(giveUnread(trainer, { caseId, checkId: 'oil-at-purge', answer: yes })).rejects.toMatchObject({ code: 'forbidden' });
    const other = await makeWorkshop(databases);
    await expect(giveUnread(other.ctx, { caseId, checkId: 'oil-at-purge', answer: yes })).rejects.toMatchObject({ code: 'not-found' });
    await expect(readCaseState({ ctx: other.ctx, input: { caseId } })).rejects.toMatchObject({ code: 'not-found' });
  });

  it('takes answers of two people at once, one after the other', async () => {
    await freshCase();
    const colleague = await workshop.addPerson({ roles: ['technician'] });
    const checks = ['oil-at-purge', 'oil-in-wet-tank', 'oil-at-dryer-inlet', 'oil-at-valves'];
    await Promise.all(checks.map((checkId, i) => give(i % 2 ? colleague : workshop.ctx, { caseId, checkId, answer: yes })));
    const state = await readCaseState({ ctx: workshop.ctx, input: { caseId } });
    expect(checks.every((checkId) => current(state, checkId))).toBe(true);
    expect(state.differs).toBe(false);
  });
});
