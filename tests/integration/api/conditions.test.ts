import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import { openCase } from '@/lib/services/case/open';
import { createModel } from '@/lib/services/compressor-model/create';
import { createFit } from '@/lib/services/fit/create';
import { createToken } from '@/lib/services/token/create';
import { createUnit } from '@/lib/services/unit/create';
import { callApi, type ApiAnswer } from '@/tests/support/api';
import { openApplication } from '@/tests/support/application';
import type { TestDatabases } from '@/tests/support/context';
import { makeTenant, type Tenant } from '@/tests/support/tenant';

let databases: TestDatabases;
let tenant: Tenant;
let token: string;
const [unitId, modelId, fitId, caseId] = [newId(), newId(), newId(), newId()];

beforeAll(async () => {
  databases = await openApplication();
  tenant = await makeTenant(databases, { rulebook: defaultRulebook, roles: ['engineer', 'administrator'] });
  const { ctx } = tenant;
  await createModel({ ctx, input: { id: modelId, name: 'Pair 19', bore: '3 5/8' } });
  await createUnit({ ctx, input: { id: unitId, fleetNumber: 'K-1', siteId: tenant.siteId, vehicleKind: 'truck', reservoirs: '5,000', engineFamily: 'Inline six' } });
  await createFit({ ctx, input: { id: fitId, unitId, modelId, condition: 'new', installedOn: '2024-02-01' } });
  await openCase({ ctx, input: { id: caseId, unit: { kind: 'known', unitId }, complaints: ['complaint-oil'] } });
  const scopes = ['units:read', 'units:write', 'models:read', 'models:write', 'sites:read', 'sites:write', 'cases:read', 'cases:write'] as const;
  ({ token } = await createToken({ ctx, input: { name: 'Test', scopes: [...scopes], days: 1 } }));
}, 60_000);
afterAll(() => databases.close());

const read = (path: string, headers = {}) => callApi({ path: `/api/v1${path}`, token, headers });
const write = (method: 'PUT' | 'POST', path: string, body: object, headers = {}) => callApi({ method, path: `/api/v1${path}`, token, body, headers });
const etagOf = ({ headers }: ApiAnswer) => headers.get('etag') ?? '';
const valuesOf = ({ json }: ApiAnswer) => json.values as Record<string, string>;

describe.each([
  ['unit', () => `/units/${unitId}`, { note: 'Repainted' }],
  ['fit', () => `/fits/${fitId}`, { note: 'Seen' }],
  ['compressor model', () => `/models/${modelId}`, { note: 'Read off the plate' }],
])('a %s', (_, path, change) => {
  test('is changed as it was read, and nothing else of it changes', async () => {
    const before = await read(path());
    const answer = await write('PUT', path(), { ...valuesOf(before), ...change }, { 'if-match': etagOf(before) });
    expect([answer.status, answer.json]).toEqual([200, expect.objectContaining({ id: before.json.id })]);
    const { values: _values, updatedAt: _updated, ...after } = (await read(path())).json;
    const { values: _before, updatedAt: _at, ...was } = before.json;
    expect(after).toEqual({ ...was, ...change });
  });

  test('that was changed meanwhile refuses an older state in words', async () => {
    const before = await read(path());
    expect((await write('PUT', path(), { ...valuesOf(before), note: newId() }, { 'if-match': etagOf(before) })).status).toBe(200);
    const late = await write('PUT', path(), { ...valuesOf(before), note: 'Mine' }, { 'if-match': etagOf(before) });
    expect([late.status, late.json.detail]).toEqual([412, 'This was changed since the state that If-Match names. Read it again, and send your change with the ETag that it has now.']);
    expect(late.json.errors).toHaveProperty('note');
    expect((await write('PUT', path(), { ...valuesOf(before), note: 'Mine' }, { 'if-match': '*' })).status).toBe(200);
  });

  test('can’t be changed without saying which state is meant', async () => {
    const { status, json } = await write('PUT', path(), valuesOf(await read(path())));
    expect([status, json.detail]).toEqual([428, 'Say in If-Match which state you are changing: the ETag that reading it gave, or * for any.']);
    for (const tag of ['"of another time"', 'unquoted', '"a", "b"', '""']) {
      expect([tag, (await write('PUT', path(), valuesOf(await read(path())), { 'if-match': tag })).status]).toEqual([tag, 412]);
    }
  });

  test('that is held is not sent again', async () => {
    const tag = etagOf(await read(path()));
    for (const held of [tag, `W/${tag}`, `"other", ${tag}`, '*']) {
      const answer = await read(path(), { 'if-none-match': held });
      expect([held, answer.status, answer.json]).toEqual([held, 304, {}]);
      expect(etagOf(answer)).toBe(tag);
    }
    expect((await read(path(), { 'if-none-match': '"other"' })).status).toBe(200);
  });
});

test('a site is changed as it was read', async () => {
  const path = `/sites/${tenant.siteId}`;
  const before = await read(path);
  expect((await write('PUT', path, { name: 'North yard', timeZone: 'America/Denver' }, { 'if-match': etagOf(before) })).status).toBe(200);
  expect((await write('PUT', path, { name: 'Mine', timeZone: 'America/Denver' }, { 'if-match': etagOf(before) })).status).toBe(412);
  expect((await read(path)).json).toMatchObject({ name: 'North yard' });
});

test('the state of a case is held until something happens to it, a note included', async () => {
  const path = `/cases/${caseId}`;
  const findingId = newId();
  const held = etagOf(await read(path));
  expect((await read(path, { 'if-none-match': held })).status).toBe(304);
  await write('POST', `${path}/findings`, { id: findingId, checkId: 'onset', answer: { kind: 'skip' }, deviceAt: new Date().toISOString() });
  const answered = await read(path, { 'if-none-match': held });
  expect(answered.status).toBe(200);
  await write('POST', `${path}/findings/${findingId}/notes`, { id: newId(), text: 'Black' });
  expect((await read(path, { 'if-none-match': etagOf(answered) })).status).toBe(200);
});

test('a call, a reopening and an assignment can be made to depend on the state that they were decided on', async () => {
  const path = `/cases/${caseId}`;
  const call = () => ({ id: newId(), mainCause: 'something-else', whyNotLeading: 'Seen', unlistedCause: 'A rag', sureness: 'sure' });
  const held = etagOf(await read(path));
  await write('POST', `${path}/findings`, { id: newId(), checkId: 'onset', answer: { kind: 'cannot-tell' }, deviceAt: new Date().toISOString() });
  const late = await write('POST', `${path}/call`, call(), { 'if-match': held });
  expect([late.status, late.json.detail]).toEqual([412, expect.stringContaining('Read it again')]);
  expect((await write('POST', `${path}/assign`, { personId: null }, { 'if-match': held })).status).toBe(412);
  const now = etagOf(await read(path));
  expect((await write('POST', `${path}/call`, call(), { 'if-match': now })).status).toBe(201);
  expect((await write('POST', `${path}/reopen`, { id: newId(), reason: 'Came back' }, { 'if-match': now })).status).toBe(412);
  expect((await write('POST', `${path}/reopen`, { id: newId(), reason: 'Came back' }, { 'if-match': '*' })).status).toBe(201);
  expect((await write('POST', `${path}/assign`, { personId: tenant.personId })).status).toBe(200);
});
