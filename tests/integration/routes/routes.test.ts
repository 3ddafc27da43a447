import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { ROLES, type Role } from '@/lib/auth/roles';
import type { Ctx } from '@/lib/services/context';
import { openApplication, signInAs } from '@/tests/support/application';
import type { TestDatabases } from '@/tests/support/context';
import { Browser } from '@/tests/support/next-request';
import { makeTenant } from '@/tests/support/tenant';
import { malformed, oversized } from './changes';
import { hiddenActions, routesInApp } from './find-routes';
import { nameOf, type Feature, type Made, type Row, type Workshop } from './row';
import { FEATURES } from './table';
import { tryRow } from './try';

const PASSWORD = 'a password for these tests';

/** An organisation with somebody of each role, each signed in. */
interface House {
  workshop: Workshop;
  browsers: Record<Role, Browser>;
}

let databases: TestDatabases;
let ours: House;
let theirs: House;
const made = new Map<Feature, Made>();

async function makeHouse(): Promise<House> {
  const tenant = await makeTenant(databases, { roles: ['administrator'], rulebook: defaultRulebook });
  const people = {} as Record<Role, Ctx>;
  const browsers = {} as Record<Role, Browser>;
  for (const role of ROLES) {
    people[role] = await tenant.addPerson({ roles: [role], mayRelease: true, password: PASSWORD });
    browsers[role] = await signInAs(people[role].person.email, PASSWORD);
  }
  return { workshop: { tenant, as: (role) => people[role], password: PASSWORD }, browsers };
}

beforeAll(async () => {
  databases = await openApplication();
  [ours, theirs] = [await makeHouse(), await makeHouse()];
  for (const feature of FEATURES) made.set(feature, await feature.prepare(ours.workshop));
}, 120_000);
afterAll(() => databases.close());

const rolesOf = (row: Row): readonly Role[] => (row.roles === 'anybody' ? [] : row.roles);
/** Somebody who may, in an organisation; with no sign-in where none is needed. */
async function allowed(row: Row, house: House, role = rolesOf(row)[0]): Promise<Browser> {
  if (role === undefined) return new Browser();
  if (!('action' in row && row.endsSession)) return house.browsers[role].copy();
  const { person } = await house.workshop.tenant.addPerson({ roles: [role], password: PASSWORD });
  return signInAs(person.email, PASSWORD);
}
const auditRows = async (house: House) => {
  const rows = await house.workshop.tenant.asOwner((tx) => tx.execute(sql`select count(*)::int as count from audit`));
  return rows.rows[0];
};
/** What a row names that somebody in another organisation must not get at. */
const namedBy = (row: Row, ids: Made) => {
  const given = 'page' in row ? [row.params?.(ids)] : 'action' in row ? [row.form(ids)] : [row.params?.(ids), row.query?.(ids), row.body?.(ids)];
  const said = JSON.stringify(given);
  return Object.values(ids).filter((value) => /^[0-9a-f-]{36}$/.test(value) && said.includes(value));
};

test('the table has every page, action and route there is, once, and nothing else', async () => {
  const inTable = FEATURES.flatMap(({ rows }) => rows.map(nameOf));
  expect(inTable.filter((name, i) => inTable.indexOf(name) !== i)).toEqual([]);
  expect(inTable.sort()).toEqual(await routesInApp());
});

test('actions are made in files named actions.ts alone', () => {
  expect(hiddenActions()).toEqual([]);
});

for (const feature of FEATURES) for (const row of feature.rows) describe(nameOf(row), () => testsOf(feature, row));

function testsOf(feature: Feature, row: Row) {
  const ids = () => made.get(feature) ?? {};
  const secured = row.roles !== 'anybody';

  if (secured) test('wants a sign-in', async () => {
    const outcome = await tryRow(row, ids(), new Browser());
    if ('page' in row) expect(outcome.redirect).toMatch(/^\/sign-in/);
    else expect(outcome).toMatchObject({ kind: 'refused', message: expect.stringContaining('not signed in') });
    if ('route' in row) expect(outcome.status).toBe(401);
  });

  if (secured) test('refuses every other role', async () => {
    const before = await auditRows(ours);
    for (const role of ROLES.filter((other) => !rolesOf(row).includes(other))) {
      const outcome = await tryRow(row, ids(), ours.browsers[role].copy());
      if ('page' in row) expect([role, outcome.redirect]).toEqual([role, '/not-allowed']);
      else expect([role, outcome.kind, outcome.message]).toEqual([role, 'refused', expect.stringContaining('Your role does not allow')]);
      if ('route' in row) expect(outcome.status).toBe(403);
    }
    expect(await auditRows(ours)).toEqual(before);
  });

  if (secured) test('keeps another organisation out', async () => {
    const before = await auditRows(ours);
    const outcome = await tryRow(row, ids(), await allowed(row, theirs));
    expect(await auditRows(ours)).toEqual(before);
    expect(outcome.kind, outcome.message).not.toBe('broken');
    if (namedBy(row, ids()).length > 0) {
      expect(outcome, 'names something of ours').toMatchObject({ kind: 'refused' });
      if (!('action' in row)) expect([404, 422]).toContain(outcome.status);
    }
    for (const id of [...namedBy(row, ids()), ours.workshop.tenant.ctx.organisation.name]) {
      // Saying back what was asked for tells nothing.
      if (outcome.kind === 'done') expect(outcome.text).not.toContain(id);
    }
  });

  test('does not break on malformed input', async () => {
    for (const [what, change] of Object.entries(malformed(row, ids()))) {
      const outcome = await tryRow(row, ids(), await allowed(row, ours), change);
      expect([what, outcome.kind, outcome.message]).not.toEqual([what, 'broken', outcome.message]);
      if ('action' in row && !row.takesNothing && ['no form', 'nothing at all', 'nonsense'].includes(what)) {
        expect([what, outcome.kind]).toEqual([what, 'refused']);
      }
      if ('route' in row && what === 'half a body') expect(outcome.status).toBe(400);
      if ('route' in row && change.body && what !== 'half a body' && row.body && !row.route.includes('[...')) expect([what, outcome.kind]).toEqual([what, 'refused']);
      // A dead link is a page of its own.
      if (change.params && secured) expect([what, outcome.kind]).toEqual([what, 'refused']);
    }
  });

  test('does not take what is too large', async () => {
    for (const [what, change] of Object.entries(oversized(row, ids()))) {
      const outcome = await tryRow(row, ids(), await allowed(row, ours), change);
      expect([what, outcome.kind, outcome.message.slice(0, 200)]).not.toEqual([what, 'broken', outcome.message.slice(0, 200)]);
      if ('action' in row && !row.isPlain) expect(outcome.kind).toBe('refused');
      if ('route' in row && change.body) expect(outcome.status).toBe(413);
    }
  });

  if (secured && 'route' in row && row.method !== 'GET') test('refuses a request from a page of somebody else', async () => {
    for (const origin of ['https://elsewhere.test', 'null', '']) {
      const outcome = await tryRow(row, ids(), await allowed(row, ours), { headers: { origin } });
      expect([origin, outcome.status]).toEqual([origin, 403]);
    }
  });

  test('works for whoever may', async () => {
    const isWrite = 'action' in row || ('route' in row && row.method !== 'GET');
    const roles = isWrite ? rolesOf(row).slice(0, 1) : rolesOf(row);
    for (const role of roles.length > 0 ? roles : [undefined]) {
      const given = isWrite ? await feature.prepare(ours.workshop) : ids();
      const outcome = await tryRow(row, given, await allowed(row, ours, role));
      expect({ role, kind: outcome.kind, message: outcome.message }).toEqual({ role, kind: 'done', message: outcome.kind === 'done' ? outcome.message : '' });
      if ('page' in row) expect(outcome.redirect).toBe(row.redirectsTo);
      else expect(outcome.redirect ?? '').not.toMatch(/not-allowed/);
    }
  });
}
