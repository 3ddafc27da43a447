import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import { openCase } from '@/lib/services/case/open';
import { createModel } from '@/lib/services/compressor-model/create';
import { addSite } from '@/lib/services/site/add';
import { createToken } from '@/lib/services/token/create';
import { addReading } from '@/lib/services/unit/add-reading';
import { createUnit } from '@/lib/services/unit/create';
import { callApi } from '@/tests/support/api';
import { openApplication } from '@/tests/support/application';
import type { TestDatabases } from '@/tests/support/context';
import { makeTenant, type Tenant } from '@/tests/support/tenant';

let databases: TestDatabases;
let tenant: Tenant;
let token: string;
let unitId: string;

beforeAll(async () => {
  databases = await openApplication();
  tenant = await makeTenant(databases, { rulebook: defaultRulebook, roles: ['engineer', 'administrator'] });
  for (let i = 0; i < 7; i++) await addTo('units', i);
  for (const name of ['models', 'sites', 'cases', 'readings'] as const) for (let i = 0; i < 5; i++) await addTo(name, i);
  for (let i = 0; i < 3; i++) await tenant.addPerson();
  ({ token } = await createToken({ ctx: tenant.ctx, input: { name: 'Test', scopes: ['units:read', 'models:read', 'sites:read', 'cases:read', 'people:read'], days: 1 } }));
}, 60_000);
afterAll(() => databases.close());

type ListName = 'units' | 'models' | 'sites' | 'cases' | 'readings' | 'people';

async function addTo(name: ListName, i: number): Promise<void> {
  const { ctx } = tenant;
  const id = newId();
  // Neither in the order of their making nor all of one case of letters.
  const title = `${i % 2 ? 'k' : 'K'}-${(i * 5) % 7}${id.slice(-4)}`;
  if (name === 'units') {
    await createUnit({ ctx, input: { id, fleetNumber: title, siteId: tenant.siteId, vehicleKind: 'truck' } });
    unitId ??= id;
  }
  if (name === 'models') await createModel({ ctx, input: { id, name: title } });
  if (name === 'sites') await addSite({ ctx, input: { name: title, timeZone: 'America/Chicago' } });
  if (name === 'cases') await openCase({ ctx, input: { id, unit: { kind: 'known', unitId }, complaints: ['complaint-oil'] } });
  if (name === 'readings') await addReading({ ctx, input: { unitId, readOn: `2025-01-${10 + i}`, odometer: `${1000 + i}` } });
}

const pathOf = (name: ListName) => (name === 'readings' ? `/api/v1/units/${unitId}/readings` : `/api/v1/${name}`);
const page = (name: ListName, query: Record<string, string>) => callApi({ path: `${pathOf(name)}?${new URLSearchParams(query)}`, token });
const idsOf = (name: ListName, json: Record<string, unknown>) => (json[name] as { id: string }[]).map(({ id }) => id);

async function walk(name: ListName, limit: number, between: () => Promise<void> = async () => undefined): Promise<string[]> {
  const seen: string[] = [];
  for (let cursor: string | undefined; ; ) {
    const { json } = await page(name, { limit: String(limit), ...(cursor && { cursor }) });
    seen.push(...idsOf(name, json));
    if (json.next === null) return seen;
    cursor = String(json.next);
    await between();
  }
}

describe.each(['units', 'models', 'sites', 'cases', 'readings', 'people'] as const)('%s', (name) => {
  test('come page by page as they come all at once', async () => {
    const whole = idsOf(name, (await page(name, { limit: '100' })).json);
    expect(whole.length).toBeGreaterThan(3);
    for (const limit of [1, 2, whole.length - 1, whole.length]) expect(await walk(name, limit)).toEqual(whole);
  });

  test('refuse a cursor that they did not give, and a page that is none', async () => {
    for (const cursor of ['nonsense', Buffer.from('["a"').toString('base64url'), Buffer.from('[{}]').toString('base64url')]) {
      const { status, json } = await page(name, { cursor });
      expect([cursor, status, json.errors]).toEqual([cursor, 422, { cursor: 'This is not a cursor that this list gave.' }]);
    }
    for (const limit of ['0', '101', 'all']) expect([limit, (await page(name, { limit })).status]).toEqual([limit, 422]);
    expect((await page(name, { nonsense: 'yes' })).status).toBe(422);
  });
});

test.each(['units', 'models', 'sites', 'cases'] as const)('%s that are added meanwhile make nothing come twice or not at all', async (name) => {
  const whole = idsOf(name, (await page(name, { limit: '100' })).json);
  let added = 20;
  const seen = await walk(name, 2, () => (added < 26 ? addTo(name, added++) : Promise.resolve()));
  expect(new Set(seen).size).toBe(seen.length);
  expect(seen.filter((id) => whole.includes(id))).toEqual(whole);
});

test('a unit is found by part of its number, the exact one first', async () => {
  for (const fleetNumber of ['Z-12', 'AZ-12', 'Z-120']) await createUnit({ ctx: tenant.ctx, input: { id: newId(), fleetNumber, siteId: tenant.siteId, vehicleKind: 'bus' } });
  const { json } = await page('units', { q: 'z-12', limit: '2' });
  const numbers = (of: Record<string, unknown>) => (of.units as { fleetNumber: string }[]).map(({ fleetNumber }) => fleetNumber);
  expect(numbers(json)).toEqual(['Z-12', 'Z-120']);
  expect(numbers((await page('units', { q: 'z-12', limit: '2', cursor: String(json.next) })).json)).toEqual(['AZ-12']);
});

test('cases are cut down to a unit, a state and one’s own', async () => {
  const all = (query: Record<string, string>) => page('cases', { limit: '100', ...query }).then(({ json }) => idsOf('cases', json).length);
  expect(await all({ unit: unitId })).toBe(await all({}));
  expect(await all({ unit: newId() })).toBe(0);
  expect(await all({ status: 'called' })).toBe(0);
  expect(await all({ mine: 'yes' })).toBe(await all({ status: 'open' }));
});
