import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { apiToken } from '@/db/schema';
import { SCOPE_IDS, type Scope } from '@/lib/auth/scopes';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import type { Ctx } from '@/lib/services/context';
import { endMembership } from '@/lib/services/membership/end';
import { createToken } from '@/lib/services/token/create';
import { listTokens } from '@/lib/services/token/list';
import { revokeToken } from '@/lib/services/token/revoke';
import { createUnit } from '@/lib/services/unit/create';
import { callApi } from '@/tests/support/api';
import { openApplication, signInAs } from '@/tests/support/application';
import type { TestDatabases } from '@/tests/support/context';
import { makeTenant, type Tenant } from '@/tests/support/tenant';

const A_DAY_MS = 86_400_000;
const UNITS = '/api/v1/units';

let databases: TestDatabases;
let tenant: Tenant;

beforeAll(async () => {
  databases = await openApplication();
  tenant = await makeTenant(databases, { rulebook: defaultRulebook });
}, 60_000);
afterAll(() => databases.close());

const mint = (ctx: Ctx, scopes: Scope[], days = 30) => createToken({ ctx, input: { name: 'Test', scopes, days } });
const rowOf = (id: string) => tenant.asOwner(async (tx) => (await tx.select().from(apiToken).where(eq(apiToken.id, id)))[0]);
const newUnit = () => ({ id: newId(), fleetNumber: newId(), siteId: tenant.siteId, vehicleKind: 'truck' });

test('a token lets a script in without cookie and Origin, and only its hash is kept', async () => {
  const { id, token } = await mint(tenant.ctx, ['units:read', 'units:write']);
  expect((await callApi({ path: UNITS, token })).status).toBe(200);
  expect((await callApi({ method: 'POST', path: UNITS, token, body: newUnit() })).status).toBe(201);
  const row = await rowOf(id);
  expect(JSON.stringify(row)).not.toContain(token);
  expect(row?.ending).toBe(token.slice(-4));
  const audit = await tenant.asOwner((tx) => tx.query.audit.findMany());
  expect(JSON.stringify(audit)).not.toContain(token);
});

test('a cookie still needs the Origin for a write', async () => {
  const { person } = await tenant.addPerson({ password: 'a password for these tests' });
  const browser = await signInAs(person.email, 'a password for these tests');
  expect((await callApi({ method: 'POST', path: UNITS, browser, body: newUnit() })).status).toBe(201);
  const foreign = await callApi({ method: 'POST', path: UNITS, browser, body: newUnit(), headers: { origin: 'https://elsewhere.test' } });
  expect(foreign.status).toBe(403);
});

test('what the token has no scope for is refused with the scope named, before anything is looked at', async () => {
  const { token } = await mint(tenant.ctx, ['units:read']);
  const refused = await callApi({ method: 'POST', path: UNITS, token, body: newUnit() });
  expect(refused.status).toBe(403);
  expect(refused.json.detail).toBe('This token lacks the scope “units:write”. Make one that has it under Settings, Tokens.');
  expect(refused.headers.get('www-authenticate')).toBe('Bearer realm="Carryover", error="insufficient_scope", scope="units:write"');
});

test('a scope gives no more than the roles of its person', async () => {
  const engineer = await tenant.addPerson({ roles: ['engineer'] });
  const { token } = await mint(engineer, ['models:write']);
  const body = { id: newId(), name: newId() };
  expect((await callApi({ method: 'POST', path: '/api/v1/models', token, body })).status).toBe(201);
  const manager = await tenant.addPerson({ roles: ['administrator'] });
  await expect(mint(manager, ['models:write'])).rejects.toMatchObject({ fields: { scopes: 'Your role allows nothing of “models:write”.' } });
});

test.each([
  ['revoked', 'This token was revoked. Make a new one under Settings, Tokens.'],
  ['expired', 'This token has expired. Make a new one under Settings, Tokens.'],
  ['unknown', 'There is no such token. Check that it was copied whole.'],
])('a token that is %s is refused in a sentence', async (how, sentence) => {
  const early = { ...tenant.ctx, now: () => new Date(Date.now() - 8 * A_DAY_MS) };
  const made = await mint(how === 'expired' ? early : tenant.ctx, ['units:read'], 7);
  if (how === 'revoked') await revokeToken({ ctx: tenant.ctx, input: { tokenId: made.id } });
  const token = how === 'unknown' ? `carryover_${'a'.repeat(43)}` : made.token;
  const refused = await callApi({ path: UNITS, token });
  expect([refused.status, refused.json.detail]).toEqual([401, sentence]);
  expect(refused.headers.get('www-authenticate')).toBe('Bearer realm="Carryover", error="invalid_token"');
});

test('no token at all is answered with what would be one', async () => {
  const refused = await callApi({ path: UNITS });
  expect(refused.status).toBe(401);
  expect(refused.headers.get('www-authenticate')).toBe('Bearer realm="Carryover"');
  for (const authorization of ['Basic YTpi', 'Bearer', 'Bearer a b', `Bearer ${'x'.repeat(500)}`]) {
    expect((await callApi({ path: UNITS, headers: { authorization } })).status).toBe(401);
  }
});

test('a token in the address is refused, under any name and with a sign-in beside it', async () => {
  const { id, token } = await mint(tenant.ctx, ['units:read']);
  for (const query of [`access_token=${token}`, `q=${token}`, 'token=anything', `${token}=1`]) {
    const refused = await callApi({ path: `${UNITS}?${query}`, token });
    expect([query, refused.status]).toEqual([query, 401]);
    expect(refused.json.detail).toContain('A token does not belong in an address');
    expect(JSON.stringify(refused.json)).not.toContain(token);
  }
  expect((await callApi({ path: `${UNITS}/${token}`, token })).status).toBe(401);
  expect((await rowOf(id))?.lastUsedAt).toBeNull();
});

test('another organisation is not there for a token', async () => {
  const other = await makeTenant(databases);
  const unit = newUnit();
  await createUnit({ ctx: tenant.ctx, input: { ...unit, vehicleKind: 'truck' } });
  const { token } = await mint(other.ctx, ['units:read', 'units:write']);
  const path = `${UNITS}/${unit.id}`;
  expect((await callApi({ path, token })).status).toBe(404);
  expect((await callApi({ method: 'POST', path: `${path}/hide`, token, body: { reason: 'Mine now' } })).status).toBe(404);
  const { json } = await callApi({ path: `${UNITS}?q=${unit.fleetNumber}`, token });
  expect(json.units).toEqual([]);
});

test('whoever leaves loses his tokens at once', async () => {
  const administrator = await tenant.addPerson({ roles: ['administrator'] });
  const leaver = await tenant.addPerson();
  const { token } = await mint(leaver, ['units:read']);
  expect((await callApi({ path: UNITS, token })).status).toBe(200);
  await endMembership({ ctx: administrator, input: { personId: leaver.person.id } });
  const refused = await callApi({ path: UNITS, token });
  expect([refused.status, refused.json.detail]).toEqual([401, 'The person whose token this is does not work in this organisation any more.']);
});

test('use is noted, at most once a minute', async () => {
  const { id, token } = await mint(tenant.ctx, ['units:read']);
  const used = async () => {
    await callApi({ path: UNITS, token });
    return (await rowOf(id))?.lastUsedAt?.getTime() ?? 0;
  };
  const first = await used();
  expect(Math.abs(Date.now() - first)).toBeLessThan(10_000);
  expect(await used()).toBe(first);
  const earlier = new Date(first - 61_000);
  await tenant.asOwner((tx) => tx.update(apiToken).set({ lastUsedAt: earlier }).where(eq(apiToken.id, id)));
  expect(await used()).toBeGreaterThan(earlier.getTime());
});

test('a token is one person’s: nobody else sees or revokes it', async () => {
  const colleague = await tenant.addPerson({ roles: ['administrator'] });
  const { id, token } = await mint(tenant.ctx, ['units:read']);
  expect((await listTokens({ ctx: colleague, input: {} })).map((row) => row.id)).not.toContain(id);
  await expect(revokeToken({ ctx: colleague, input: { tokenId: id } })).rejects.toMatchObject({ code: 'not-found' });
  expect((await callApi({ path: UNITS, token })).status).toBe(200);
});

test('no token is made for longer than a year, without a scope or with one that is none', async () => {
  const refusal = (input: object) => createToken({ ctx: tenant.ctx, input: { name: 'x', scopes: ['units:read'], days: 30, ...input } as never });
  await expect(refusal({ days: 366 })).rejects.toMatchObject({ fields: { days: 'A token works for a year at most.' } });
  await expect(refusal({ scopes: [] })).rejects.toMatchObject({ fields: { scopes: 'Choose at least one thing that it may do.' } });
  await expect(refusal({ scopes: ['everything'] })).rejects.toMatchObject({ code: 'invalid' });
  expect(SCOPE_IDS).not.toContain('everything');
});
