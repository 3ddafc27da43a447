import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { cases, idempotentAnswer, unitReading } from '@/db/schema';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import { sweep } from '@/lib/services/session/sweep';
import { createToken } from '@/lib/services/token/create';
import { createUnit } from '@/lib/services/unit/create';
import { callApi } from '@/tests/support/api';
import { openApplication } from '@/tests/support/application';
import type { TestDatabases } from '@/tests/support/context';
import { makeTenant, type Tenant } from '@/tests/support/tenant';

let databases: TestDatabases;
let tenant: Tenant;
let token: string;
let readings: string;
let unitId: string;

beforeAll(async () => {
  databases = await openApplication();
  tenant = await makeTenant(databases, { rulebook: defaultRulebook });
  ({ token } = await createToken({ ctx: tenant.ctx, input: { name: 'Test', scopes: ['units:write', 'cases:write', 'cases:read'], days: 1 } }));
  unitId = newId();
  await createUnit({ ctx: tenant.ctx, input: { id: unitId, fleetNumber: 'K-1', siteId: tenant.siteId, vehicleKind: 'truck' } });
  readings = `/api/v1/units/${unitId}/readings`;
}, 60_000);
afterAll(() => databases.close());

const write = (key: string, body: object, path = readings) => callApi({ method: 'POST', path, token, body, headers: { 'idempotency-key': key } });
const kept = () => tenant.asOwner(async (tx) => (await tx.select({ id: unitReading.id }).from(unitReading).where(eq(unitReading.unitId, unitId))).length);

test('the same request with the same key is done once and answered alike', async () => {
  const before = await kept();
  const [key, body] = [newId(), { readOn: '2025-01-01', odometer: '5,000 mi' }];
  const first = await write(key, body);
  const again = await write(key, body);
  expect([first.status, again.status]).toEqual([201, 201]);
  expect(again.json).toEqual(first.json);
  expect([first.headers.get('idempotency-replayed'), again.headers.get('idempotency-replayed')]).toEqual([null, 'true']);
  expect(await kept()).toBe(before + 1);
});

test('a whole case is answered again as it was, whatever happened since', async () => {
  const caseId = newId();
  const opening = { id: caseId, unit: { kind: 'known', unitId }, complaints: ['complaint-oil'] };
  const first = await write('open it', opening, '/api/v1/cases');
  const finding = { id: newId(), checkId: 'onset', answer: { kind: 'skip' }, deviceAt: new Date().toISOString() };
  const answered = await write('answer it', finding, `/api/v1/cases/${caseId}/findings`);
  await write('answer it anew', { ...finding, id: newId() }, `/api/v1/cases/${caseId}/findings`);
  expect((await write('open it', opening, '/api/v1/cases')).json).toEqual(first.json);
  expect((await write('answer it', finding, `/api/v1/cases/${caseId}/findings`)).json).toEqual(answered.json);
});

test('the same key with another request is refused in words', async () => {
  const key = newId();
  await write(key, { readOn: '2025-01-02', odometer: '5,001 mi' });
  const before = await kept();
  const other = await write(key, { readOn: '2025-01-03', odometer: '5,002 mi' });
  expect(other.status).toBe(422);
  expect(other.json.detail).toContain('This Idempotency-Key was used for another request');
  const elsewhere = await write(key, { reason: 'Sold' }, `/api/v1/units/${unitId}/hide`);
  expect(elsewhere.status).toBe(422);
  expect(await kept()).toBe(before);
});

test('of requests at once with one key, one does it and the others are answered from it', async () => {
  const before = await kept();
  const [key, body] = [newId(), { readOn: '2025-02-01', odometer: '6,000 mi' }];
  const answers = await Promise.all(Array.from({ length: 8 }, () => write(key, body)));
  expect(answers.map(({ status }) => status)).toEqual(Array(8).fill(201));
  expect(answers.filter(({ headers }) => headers.get('idempotency-replayed') === null)).toHaveLength(1);
  expect(await kept()).toBe(before + 1);
});

test('of cases opened at once with one key, there is one', async () => {
  const body = { id: newId(), unit: { kind: 'known', unitId }, complaints: ['complaint-oil'] };
  const answers = await Promise.all(Array.from({ length: 5 }, () => write('five at once', body, '/api/v1/cases')));
  expect(new Set(answers.map(({ status, json }) => `${status} ${JSON.stringify(json)}`)).size).toBe(1);
  const rows = await tenant.asOwner((tx) => tx.select({ id: cases.id }).from(cases).where(eq(cases.id, body.id)));
  expect(rows).toHaveLength(1);
});

test('a request that was refused keeps nothing, so that its key can be used once it is right', async () => {
  const key = newId();
  expect((await write(key, { readOn: '2025-03-01' })).status).toBe(422);
  expect((await write(key, { readOn: '2025-03-01', odometer: '7,000 mi' })).status).toBe(201);
});

test('another person’s key is another key', async () => {
  const colleague = await tenant.addPerson();
  const theirs = await createToken({ ctx: colleague, input: { name: 'Test', scopes: ['units:write'], days: 1 } });
  const body = { readOn: '2025-04-01', odometer: '8,000 mi' };
  await write('a key', body);
  const answer = await callApi({ method: 'POST', path: readings, token: theirs.token, body: { ...body, odometer: '8,001 mi' }, headers: { 'idempotency-key': 'a key' } });
  expect(answer.status).toBe(201);
});

test.each(['', ' ', 'x'.repeat(201)])('the key “%.3s…” is none', async (key) => {
  const answer = await write(key, { readOn: '2025-05-01', odometer: '9,000 mi' });
  expect([answer.status, answer.json.errors]).toEqual([422, { 'Idempotency-Key': 'An Idempotency-Key has 1 to 200 characters.' }]);
});

test('answers are kept for a day', async () => {
  await write('old', { readOn: '2025-06-01', odometer: '10,000 mi' });
  const all = () => tenant.asOwner(async (tx) => (await tx.select({ key: idempotentAnswer.key }).from(idempotentAnswer)).map(({ key }) => key));
  const hours = (number: number) => new Date(Date.now() + number * 3_600_000);
  await sweep({ db: databases.app, now: () => hours(23) });
  expect(await all()).toContain('old');
  await sweep({ db: databases.app, now: () => hours(25) });
  expect(await all()).toEqual([]);
});
