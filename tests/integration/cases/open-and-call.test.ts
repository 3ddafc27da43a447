import { and, eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { audit, cases } from '@/db/schema';
import { newId } from '@/lib/ids';
import { assignCase } from '@/lib/services/case/assign';
import { callCause } from '@/lib/services/case/call';
import { listCases } from '@/lib/services/case/list';
import { noteFinding } from '@/lib/services/case/note-finding';
import { openCase } from '@/lib/services/case/open';
import { readCase, readCaseState } from '@/lib/services/case/read';
import { reopenCase } from '@/lib/services/case/reopen';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import type { Tenant } from '@/tests/support/tenant';
import { give, makeWorkshop, openACase, yes } from './support';

describe('a case', () => {
  let databases: TestDatabases;
  let workshop: Tenant;
  let other: Tenant;
  beforeAll(async () => {
    databases = await openTestDatabases();
    workshop = await makeWorkshop(databases);
    other = await makeWorkshop(databases);
  });
  afterAll(() => databases.close());

  const newUnit = (fleetNumber: string, siteId = workshop.siteId) => ({ kind: 'new' as const, id: newId(), fleetNumber, siteId, vehicleKind: 'truck' as const });
  const opening = (fleetNumber: string) => ({ id: newId(), unit: newUnit(fleetNumber), complaints: ['complaint-oil'], complaintWords: 'oil everywhere' });

  it('opens on a unit made on the spot, with its complaints as findings, ranked at once', async () => {
    const input = { ...opening('A-100'), odometer: '410,000' };
    const opened = await openCase({ ctx: workshop.ctx, input });
    const view = await readCase({ ctx: workshop.ctx, input: { caseId: opened.id } });
    expect(view.head).toMatchObject({ unit: { fleetNumber: 'A-100' }, odometer: '410,000 mi', complaintWords: 'oil everywhere', editionNumber: 1 });
    expect(view.state.findings).toContainEqual(expect.objectContaining({ checkId: 'complaint-oil', answer: 'Yes', current: true }));
    expect(view.state.runId).not.toBeNull();
    expect(view.state.next.suggestions.length).toBeGreaterThan(0);
    const noted = await workshop.asOwner((tx) => tx.select().from(audit).where(and(eq(audit.entityId, opened.id), eq(audit.action, 'open.case'))));
    expect(noted).toHaveLength(1);
  });

  it('is opened once when the request comes twice, and has numbers without gaps', async () => {
    const input = opening('A-101');
    const first = await openCase({ ctx: workshop.ctx, input });
    expect(await openCase({ ctx: workshop.ctx, input })).toEqual(first);
    const next = await openCase({ ctx: workshop.ctx, input: opening('A-102') });
    expect(next.number).toBe(first.number + 1);
  });

  it('gives everybody another number when many open at once', async () => {
    const opened = await Promise.all(['B-1', 'B-2', 'B-3', 'B-4'].map((number) => openCase({ ctx: workshop.ctx, input: opening(number) })));
    expect(new Set(opened.map(({ number }) => number)).size).toBe(4);
  });

  it.each([
    ['an unknown complaint', () => ({ ...opening('C-1'), complaints: ['complaint-of-nothing'] }), 'complaints'],
    ['no complaint', () => ({ ...opening('C-2'), complaints: [] }), 'complaints'],
    ['no unit number', () => opening(' '), 'unit.fleetNumber'],
    ['an odometer that is none', () => ({ ...opening('C-3'), odometer: 'far' }), 'odometer'],
    ['a site of another organisation', () => ({ ...opening('C-4'), unit: newUnit('C-4', other.siteId) }), 'siteId'],
  ])('is refused with %s, beside the field, and nothing is left behind', async (_what, input, field) => {
    const given = input();
    await expect(openCase({ ctx: workshop.ctx, input: given })).rejects.toMatchObject({ code: 'invalid', fields: { [field]: expect.any(String) } });
    expect(await workshop.asOwner((tx) => tx.select().from(cases).where(eq(cases.id, given.id)))).toEqual([]);
  });

  it('is refused on a unit of another organisation, and for the wrong role', async () => {
    const foreign = await openCase({ ctx: other.ctx, input: { ...opening('X-1'), unit: newUnit('X-1', other.siteId) } });
    const { head } = await readCase({ ctx: other.ctx, input: { caseId: foreign.id } });
    await expect(openCase({ ctx: workshop.ctx, input: { ...opening(''), unit: { kind: 'known', unitId: head.unit.id } } })).rejects.toMatchObject({ code: 'not-found' });
    const trainer = await workshop.addPerson({ roles: ['trainer'] });
    await expect(openCase({ ctx: trainer, input: opening('D-1') })).rejects.toMatchObject({ code: 'forbidden' });
  });

  it('is called by its leading cause, or by another with a reason; and reopened', async () => {
    const caseId = await openACase(workshop);
    const { causes } = await readCaseState({ ctx: workshop.ctx, input: { caseId } });
    const [leader, second, third] = causes.map((cause) => cause.causeId);
    const call = { id: newId(), caseId, mainCause: second ?? '', contributingCauses: [third ?? ''], sureness: 'fairly-sure' as const };
    await expect(callCause({ ctx: workshop.ctx, input: call })).rejects.toMatchObject({ fields: { whyNotLeading: expect.any(String) } });
    await callCause({ ctx: workshop.ctx, input: { ...call, whyNotLeading: 'Seen with my own eyes.' } });
    await callCause({ ctx: workshop.ctx, input: { ...call, whyNotLeading: 'Seen with my own eyes.' } });
    let view = await readCase({ ctx: workshop.ctx, input: { caseId } });
    expect(view.state.status).toBe('called');
    expect(view.calls).toMatchObject([{ mainCause: second, contributingCauses: [third], standing: true, proof: 'none' }]);

    await reopenCase({ ctx: workshop.ctx, input: { id: newId(), caseId, reason: 'It came back.' } });
    await callCause({ ctx: workshop.ctx, input: { id: newId(), caseId, mainCause: leader ?? '', sureness: 'sure' } });
    view = await readCase({ ctx: workshop.ctx, input: { caseId } });
    expect(view.calls.map(({ standing }) => standing)).toEqual([false, true]);
    expect(view.events.map(({ kind }) => kind)).toEqual(['opened', 'called', 'reopened', 'called']);
  });

  it('asks what an unlisted cause was, and takes each contributing cause once', async () => {
    const caseId = await openACase(workshop);
    const call = { id: newId(), caseId, mainCause: 'something-else', sureness: 'sure' as const, whyNotLeading: 'None fits.' };
    await expect(callCause({ ctx: workshop.ctx, input: call })).rejects.toMatchObject({ fields: { unlistedCause: expect.any(String) } });
    await expect(callCause({ ctx: workshop.ctx, input: { ...call, unlistedCause: 'A rag in the hose', contributingCauses: ['rings-worn', 'rings-worn'] } })).rejects.toMatchObject({ fields: { contributingCauses: expect.any(String) } });
    await expect(callCause({ ctx: workshop.ctx, input: { ...call, mainCause: 'no-such-cause' } })).rejects.toMatchObject({ fields: { mainCause: expect.any(String) } });
  });

  it('can be shown as it was at any moment', async () => {
    const caseId = await openACase(workshop);
    const at = () => workshop.ctx.now().toISOString();
    const states = [{ at: at(), state: await readCaseState({ ctx: workshop.ctx, input: { caseId } }) }];
    for (const checkId of ['oil-at-purge', 'oil-in-wet-tank']) {
      await new Promise((resolve) => setTimeout(resolve, 5));
      const state = await give(workshop.ctx, { caseId, checkId, answer: yes });
      states.push({ at: at(), state });
    }
    for (const { at: moment, state } of states) {
      const then = await readCase({ ctx: workshop.ctx, input: { caseId, at: moment } });
      expect(then.state.causes.map(({ causeId, p }) => [causeId, p])).toEqual(state.causes.map(({ causeId, p }) => [causeId, p]));
      expect(then.state.findings).toHaveLength(state.findings.length);
      expect(then.state.runId).toBe(state.runId);
      expect(then.moments).toHaveLength(4);
    }
    await expect(readCase({ ctx: workshop.ctx, input: { caseId, at: '2001-01-01T00:00:00Z' } })).rejects.toMatchObject({ code: 'not-found' });
  });

  it('takes notes on findings, its own only', async () => {
    const caseId = await openACase(workshop);
    const state = await give(workshop.ctx, { caseId, checkId: 'oil-at-purge', answer: yes });
    const findingId = state.findings[0]?.id ?? '';
    await noteFinding({ ctx: workshop.ctx, input: { id: newId(), caseId, findingId, text: 'Black, thick.' } });
    const after = await readCaseState({ ctx: workshop.ctx, input: { caseId } });
    expect(after.findings[0]?.notes).toMatchObject([{ text: 'Black, thick.', person: workshop.ctx.person.name }]);
    const note = { id: newId(), caseId, findingId, text: 'x' };
    await expect(noteFinding({ ctx: other.ctx, input: note })).rejects.toMatchObject({ code: 'not-found' });
    await expect(noteFinding({ ctx: workshop.ctx, input: { ...note, caseId: await openACase(workshop) } })).rejects.toMatchObject({ code: 'not-found' });
    await expect(noteFinding({ ctx: workshop.ctx, input: { ...note, text: ' ' } })).rejects.toMatchObject({ fields: { text: expect.any(String) } });
  });

  it('is given to those who work on cases', async () => {
    const caseId = await openACase(workshop);
    const colleague = await workshop.addPerson({ roles: ['engineer'] });
    await assignCase({ ctx: workshop.ctx, input: { caseId, personId: colleague.person.id } });
    expect((await readCase({ ctx: workshop.ctx, input: { caseId } })).assignedTo).toBe(colleague.person.id);
    const trainer = await workshop.addPerson({ roles: ['trainer'] });
    for (const personId of [trainer.person.id, other.personId]) {
      await expect(assignCase({ ctx: workshop.ctx, input: { caseId, personId } })).rejects.toMatchObject({ fields: { personId: expect.any(String) } });
    }
  });

  it('is found in the list by unit, number, site, state and person; another organisation’s never', async () => {
    const mine = await makeWorkshop(databases);
    const opened = await openCase({ ctx: mine.ctx, input: { ...opening('Z-77'), unit: newUnit('Z-77', mine.siteId) } });
    await openACase(mine);
    const numbers = async (input: Parameters<typeof listCases>[0]['input'], ctx = mine.ctx) => (await listCases({ ctx, input })).cases.map(({ number }) => number);
    expect(await numbers({})).toHaveLength(2);
    expect(await numbers({ q: 'z-7' })).toEqual([opened.number]);
    expect(await numbers({ q: String(opened.number) })).toContain(opened.number);
    expect(await numbers({ q: '%' })).toEqual([]);
    expect(await numbers({ status: 'called' })).toEqual([]);
    expect(await numbers({ site: mine.siteId, whose: 'me', sort: 'number', direction: 'asc' })).toEqual([opened.number, opened.number + 1]);
    expect(await numbers({ q: 'z-7' }, workshop.ctx)).toEqual([]);
  });
});
