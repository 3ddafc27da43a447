import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { sql } from 'drizzle-orm';
import { newId } from '@/lib/ids';
import type { SearchGroup } from '@/lib/schemas/search-result';
import type { Segment } from '@/lib/search/mark';
import { callCause } from '@/lib/services/case/call';
import { noteFinding } from '@/lib/services/case/note-finding';
import { openCase } from '@/lib/services/case/open';
import { reopenCase } from '@/lib/services/case/reopen';
import { createModel } from '@/lib/services/compressor-model/create';
import { createFit } from '@/lib/services/fit/create';
import { hideFit } from '@/lib/services/fit/hide';
import { searchEverywhere } from '@/lib/services/search/everywhere';
import { readRulebookEntry } from '@/lib/services/search/read-entry';
import { changeUnit } from '@/lib/services/unit/change';
import { createUnit } from '@/lib/services/unit/create';
import { hideUnit, showUnit } from '@/lib/services/unit/hide';
import { readUnitForm } from '@/lib/services/unit/read';
import type { Ctx } from '@/lib/services/context';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import type { Tenant } from '@/tests/support/tenant';
import { give, makeWorkshop } from '../cases/support';

let databases: TestDatabases;
let workshop: Tenant;
let ctx: Ctx;
let engineer: Ctx;
const made: Record<'caseId' | 'number' | 'findingId' | 'fitId' | 'unitId', string> = { caseId: newId(), number: '', findingId: newId(), fitId: newId(), unitId: newId() };

const addUnit = async (fleetNumber: string, note?: string, who = workshop) => {
  const id = newId();
  await createUnit({ ctx: who.ctx, input: { id, fleetNumber, siteId: who.siteId, vehicleKind: 'truck', note } });
  return id;
};

const plain = (segments: readonly Segment[] | null) => (segments ?? []).map(({ text }) => text).join('');
const marked = (segments: readonly Segment[] | null) => (segments ?? []).filter(({ hit }) => hit).map(({ text }) => text);

async function found(q: string, kind: SearchGroup['kind'], who = ctx): Promise<SearchGroup> {
  const { groups } = await searchEverywhere({ ctx: who, input: { q } });
  const group = groups.find((one) => one.kind === kind);
  if (!group) throw new Error(`no ${kind} among ${groups.map((one) => one.kind).join()}`);
  return group;
}
const titles = async (q: string, kind: SearchGroup['kind'], who = ctx) => (await found(q, kind, who)).hits.map(({ title }) => plain(title));

beforeAll(async () => {
  databases = await openTestDatabases();
  workshop = await makeWorkshop(databases);
  ({ ctx } = workshop);
  engineer = await workshop.addPerson({ roles: ['engineer'] });
  const { caseId, findingId, fitId, unitId } = made;
  await createUnit({ ctx, input: { id: unitId, fleetNumber: 'T-104', siteId: workshop.siteId, vehicleKind: 'truck', engineFamily: 'Meridian 12', note: 'Parks beside the quarry' } });
  for (const number of ['TR 0104', 'B-77', 'B-770', '7']) await addUnit(number);
  const { number } = await openCase({
    ctx,
    input: { id: caseId, unit: { kind: 'known', unitId }, complaints: ['complaint-oil'], complaintWords: 'Señor says it spits oil at the quick-release valve' },
  });
  made.number = String(number);
  await give(ctx, { id: findingId, caseId, checkId: 'onset', answer: { kind: 'cannot-tell' } });
  await noteFinding({ ctx, input: { id: newId(), caseId, findingId, text: 'Gasket squeezed out, 1/8" of sealant; no chafing' } });
  const modelId = newId();
  await createModel({ ctx: engineer, input: { id: modelId, name: 'Any' } });
  await createFit({ ctx, input: { id: fitId, unitId, modelId, condition: 'rebuilt', installedOn: '2025-02-03', note: 'Came with a dented flange' } });
  await callCause({ ctx, input: { id: newId(), caseId, mainCause: 'something-else', whyNotLeading: 'Thermostat stuck', unlistedCause: 'A mouse nest in the snorkel', sureness: 'sure' } });
  await reopenCase({ ctx, input: { id: newId(), caseId, reason: 'Wept again at Easter' } });
});
afterAll(() => databases.close());

describe('finds', () => {
  it('a unit by its number, its engine family and its note, with what was found marked', async () => {
    const [byNumber] = (await found('t-104', 'units')).hits;
    expect(byNumber).toMatchObject({ kind: 'unit', id: made.unitId, href: `/units/${made.unitId}`, about: 'Truck, Yard', words: null, nearly: false });
    expect(marked(byNumber?.title ?? [])).toEqual(['T-104']);
    const [byFamily] = (await found('meridian', 'units')).hits;
    expect(byFamily?.id).toBe(made.unitId);
    expect(marked(byFamily?.words ?? [])).toEqual(['Meridian']);
    expect(await titles('quarry', 'units')).toEqual(['T-104']);
  });

  it.each(['NUMBER', '#NUMBER', 'case NUMBER', ' Case  #NUMBER '])('a case by “%s”, before anything else', async (text) => {
    const { hits } = await found(text.replace('NUMBER', made.number), 'cases');
    expect(hits[0]).toMatchObject({ kind: 'case', id: made.caseId, href: `/cases/${made.caseId}` });
    expect(marked(hits[0]?.title ?? [])).toEqual([made.number]);
  });

  it('a case by the number of its unit, and by the words of its complaint, with and without accents', async () => {
    for (const text of ['T104', 'spits', 'senor', 'SEÑOR quick-rel']) expect((await found(text, 'cases')).hits.map(({ id }) => id), text).toEqual([made.caseId]);
    expect((await found('spits', 'cases')).hits[0]?.about).toMatch(/^T-104, Yard: .+\. Open since \d/);
    expect(marked((await found('senor', 'cases')).hits[0]?.words ?? [])).toEqual(['Señor']);
  });

  it('what was written beside a finding, at a call, at a reopening and at a fit', async () => {
    const [note] = (await found('gasket', 'notes')).hits;
    expect(note).toMatchObject({ kind: 'note', href: `/cases/${made.caseId}`, about: expect.stringMatching(new RegExp(`^Case ${made.number}, T-104, \\d`)) });
    expect(marked(note?.words ?? [])).toEqual(['Gasket']);
    for (const text of ['thermostat', 'mouse nest', 'easter']) expect((await found(text, 'notes')).hits.map(({ href }) => href), text).toEqual([`/cases/${made.caseId}`]);
    expect((await found('dented', 'notes')).hits).toMatchObject([{ id: made.fitId, href: `/units/${made.unitId}/fits/${made.fitId}` }]);
  });

  it('remedies, checks and causes of the rulebook in force, which can be read', async () => {
    const { hits, total } = await found('drain', 'rulebook');
    expect(total).toBeGreaterThan(hits.length);
    expect(new Set((await searchEverywhere({ ctx, input: { q: 'drain', limit: 25 } })).groups.at(-1)?.hits.map(({ kind }) => kind))).toEqual(new Set(['remedy', 'check', 'cause']));
    for (const { kind, id, title } of hits) {
      if (kind === 'unit' || kind === 'case' || kind === 'note') throw new Error(kind);
      expect(await readRulebookEntry({ ctx, input: { kind, id } })).toMatchObject({ kind, name: plain(title) });
    }
    await expect(readRulebookEntry({ ctx, input: { kind: 'remedy', id: 'no-such' } })).rejects.toMatchObject({ code: 'not-found' });
  });

  it('words while they are being typed, in any order, and only where all of them stand', async () => {
    for (const text of ['g', 'gas', 'sealant gas', 'squeez out gask', '1/8']) expect((await found(text, 'notes')).hits[0]?.href, text).toBe(`/cases/${made.caseId}`);
    expect((await found('gasket thermostat', 'notes')).total).toBe(0);
    // No word is too small to count.
    expect((await found('no chafing', 'notes')).total).toBe(1);
    expect((await found('the chafing', 'notes')).total).toBe(0);
  });
});

describe('a fleet number', () => {
  it.each(['T104', 't 104', 'T00104', 'T104 ', 'T.104'])('is found as “%s”, and one with other letters after it', async (text) => {
    const { hits } = await found(text, 'units');
    expect(hits.map(({ title, nearly }) => [plain(title), nearly])).toEqual([['T-104', false], ['TR 0104', true]]);
  });

  it.each([
    ['T-1O4', 'T-104'],
    ['T-140', 'T-104'],
    ['F-104', 'T-104'],
    ['T-1044', 'T-104'],
    ['TR 1004', 'TR 0104'],
    ['RT-104', 'TR 0104'],
    ['TB 104', 'TR 0104'],
  ])('is found when it is mistyped as “%s”: %s', async (typed, number) => {
    const { hits } = await found(typed, 'units');
    expect(hits.filter(({ nearly }) => nearly).map(({ title }) => plain(title))).toContain(number);
  });

  it('is not taken for one that is somebody else’s', async () => expect(await titles('B-77', 'units')).toEqual(['B-77', 'B-770']));

  it('leads by how well it matches: the very one, then those that begin so, then those that hold it', async () => {
    expect((await titles('B-77', 'units')).slice(0, 2)).toEqual(['B-77', 'B-770']);
    expect((await titles('7', 'units'))[0]).toBe('7');
    expect(await titles('104', 'units')).toEqual(expect.arrayContaining(['T-104', 'TR 0104']));
  });

  it('follows a change of it', async () => {
    const id = await addUnit('Q-1');
    const { version } = await readUnitForm({ ctx, input: { unitId: id } });
    await changeUnit({ ctx, input: { unitId: id, version, fleetNumber: 'Z-9', siteId: workshop.siteId, vehicleKind: 'bus', note: 'Painted' } });
    expect(await titles('Q-1', 'units')).not.toContain('Q-1');
    expect(await titles('painted', 'units')).toEqual(['Z-9']);
  });
});

describe('is not found', () => {
  it('what belongs to another organisation, by its words, its number or its unit', async () => {
    const theirs = await makeWorkshop(databases);
    const unitId = newId();
    const { number } = await openCase({
      ctx: theirs.ctx,
      input: { id: newId(), unit: { kind: 'new', id: unitId, fleetNumber: 'X-55', siteId: theirs.siteId, vehicleKind: 'truck' }, complaints: ['complaint-oil'], complaintWords: 'Zebra' },
    });
    expect((await found('zebra', 'cases', theirs.ctx)).total).toBe(1);
    for (const text of ['zebra', 'X-55', 'X55', String(number)]) {
      const { groups } = await searchEverywhere({ ctx, input: { q: text, limit: 25 } });
      const hits = groups.flatMap((group) => group.hits);
      expect(hits.filter(({ id, about }) => id === unitId || about.includes('X-55')), text).toEqual([]);
    }
    // The second wall: even the owner's functions give nothing for an organisation that the transaction hasn't set.
    const asked = sql`select * from search_entries(${theirs.organisationId}, array['case'], '''zebra''', 10)`;
    expect((await workshop.asOwner((tx) => tx.execute(asked))).rows).toEqual([]);
    expect((await theirs.asOwner((tx) => tx.execute(asked))).rows).toHaveLength(1);
    expect((await databases.app.execute(asked)).rows).toEqual([]);
    expect((await databases.app.execute(sql`select * from search_fleet_numbers(${theirs.organisationId}, 'x55', true, 10)`)).rows).toEqual([]);
  });

  it('a unit that is hidden, until it is shown again; its case stays', async () => {
    const unitId = await addUnit('H-31', 'Hideaway');
    const caseId = newId();
    await openCase({ ctx, input: { id: caseId, unit: { kind: 'known', unitId }, complaints: ['complaint-oil'], complaintWords: 'Whistles' } });
    await hideUnit({ ctx, input: { unitId, reason: 'Sold' } });
    expect(await titles('H-31', 'units')).not.toContain('H-31');
    expect((await found('hideaway', 'units')).total).toBe(0);
    expect((await found('whistles', 'cases')).hits.map(({ id }) => id)).toEqual([caseId]);
    await showUnit({ ctx, input: { unitId, reason: 'Back' } });
    expect(await titles('hideaway', 'units')).toEqual(['H-31']);
  });

  it('the note of a fit that was struck out', async () => {
    const [unitId, modelId, fitId] = [await addUnit('S-8'), newId(), newId()];
    await createModel({ ctx: engineer, input: { id: modelId, name: 'Other' } });
    await createFit({ ctx, input: { id: fitId, unitId, modelId, condition: 'new', installedOn: '2025-02-03', note: 'Lopsided' } });
    expect((await found('lopsided', 'notes')).total).toBe(1);
    await hideFit({ ctx, input: { fitId, reason: 'Wrong unit' } });
    expect((await found('lopsided', 'notes')).total).toBe(0);
  });
});

describe('by role', () => {
  it.each(['trainer', 'administrator'] as const)('%s finds units and what stands at fits, and nothing of cases', async (role) => {
    const other = await workshop.addPerson({ roles: [role] });
    const { groups } = await searchEverywhere({ ctx: other, input: { q: 'T-104' } });
    expect(groups.map(({ kind, total }) => [kind, total > 0])).toEqual([['units', true], ['notes', false]]);
    expect((await found('gasket', 'notes', other)).total).toBe(0);
    expect((await found('dented', 'notes', other)).total).toBe(1);
    await expect(readRulebookEntry({ ctx: other, input: { kind: 'check', id: 'onset' } })).rejects.toMatchObject({ code: 'forbidden' });
  });

  it.each(['technician', 'engineer', 'manager'] as const)('%s finds all kinds', async (role) => {
    const { groups } = await searchEverywhere({ ctx: await workshop.addPerson({ roles: [role] }), input: { q: 'oil' } });
    expect(groups.map(({ kind }) => kind)).toEqual(['units', 'cases', 'notes', 'rulebook']);
  });
});

describe('whatever is typed', () => {
  it.each(['', '   ', '%', '_', '%%%', "'", "''; drop table unit; --", '"', ':*', '&', '| !', '!!', '(', '<->', 'a & | b', '\\', "\\'", "a':*", '🔧', '🔧🔧 👍🏽', '-', '…—“”', '\t\n', '½', 'ﬃ', 'İ', 'ẞ', '\u0300', '漢字', 'ا', 'a'.repeat(200), '9'.repeat(200), '0'.repeat(50), '2147483648', '#', 'case', '10e5a', 'null'])('“%s” is answered', async (q) => {
    const { groups } = await searchEverywhere({ ctx, input: { q } });
    for (const { hits, total } of groups) expect(total).toBeGreaterThanOrEqual(hits.length);
  });

  it.each(['', '  ', '%', '_', '🔧', "'&|!"])('“%s” finds nothing', async (q) => {
    const { groups } = await searchEverywhere({ ctx, input: { q } });
    expect(groups.map(({ total }) => total)).toEqual([0, 0, 0, 0]);
  });

  it('what is too long is refused in words, and so is a limit beyond reason', async () => {
    await expect(searchEverywhere({ ctx, input: { q: 'a'.repeat(201) } })).rejects.toMatchObject({ fields: { q: 'Keep it under 200 characters.' } });
    await expect(searchEverywhere({ ctx, input: { q: 'a', limit: 1000 } })).rejects.toMatchObject({ code: 'invalid' });
    await expect(searchEverywhere({ ctx, input: { q: 'a\0b' } })).rejects.toMatchObject({ code: 'invalid' });
  });

  it('at most as many as asked for are shown of each kind, and the others are counted', async () => {
    for (let i = 0; i < 7; i++) await addUnit(`M-${i}${i}`, 'Marmalade');
    const { hits, total } = await found('marmalade', 'units');
    expect([hits.length, total]).toEqual([5, 7]);
    const { groups } = await searchEverywhere({ ctx, input: { q: 'marmalade', limit: 25 } });
    expect(groups[0]?.hits).toHaveLength(7);
  });
});
