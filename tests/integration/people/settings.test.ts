import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { audit } from '@/db/schema';
import { listAudit } from '@/lib/services/audit/list';
import { changeOrganisation } from '@/lib/services/organisation/change';
import { viewOrganisation } from '@/lib/services/organisation/view';
import { changePassword } from '@/lib/services/password/change';
import { profile } from '@/lib/services/person/profile';
import { rename } from '@/lib/services/person/rename';
import { setUnits } from '@/lib/services/person/set-units';
import { changeOrganisationOfSession } from '@/lib/services/session/change-organisation';
import { signIn } from '@/lib/services/session/sign-in';
import { standingOf } from '@/lib/services/session/standing';
import { addSite } from '@/lib/services/site/add';
import { changeSite } from '@/lib/services/site/change';
import { listSites } from '@/lib/services/site/list';
import { viewSite } from '@/lib/services/site/view';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { refusalOf } from '@/tests/support/refusal';
import { makeTenant, makeVisitor } from '@/tests/support/tenant';

let databases: TestDatabases;
beforeAll(async () => {
  databases = await openTestDatabases();
});
afterAll(() => databases.close());

const asAdministrator = () => makeTenant(databases, { roles: ['administrator'] });

describe('oneself', () => {
  test('can be renamed; the audit keeps that it happened and not the name', async () => {
    const { ctx, asOwner } = await makeTenant(databases, { roles: ['trainer'] });
    await rename({ ctx, input: { name: '  Newly Named ' } });
    expect(await profile({ ctx, input: {} })).toMatchObject({ name: 'Newly Named', email: ctx.person.email });
    expect(JSON.stringify(await asOwner((tx) => tx.select().from(audit)))).not.toContain('Newly');
  });

  test('sees figures in the units chosen, and in those of the country where none is chosen', async () => {
    const { ctx, personId, organisationId } = await makeTenant(databases, { country: 'PT' });
    const standing = () => standingOf(databases.app, { personId, organisationId, sessionVersion: 1 });
    expect((await standing())?.person.units).toMatchObject({ pressure: 'kPa', distance: 'km' });
    await setUnits({ ctx, input: { pressure: 'psi', nonsense: 'x' } });
    expect((await standing())?.person.units).toMatchObject({ pressure: 'psi', distance: 'km' });
    expect((await refusalOf(setUnits({ ctx, input: { pressure: 'furlong' } }))).fields).toHaveProperty('pressure');
  });

  test('changes the password with the present one, which ends every session', async () => {
    const { ctx } = await makeTenant(databases, { password: 'the password of before' });
    const wrong = await refusalOf(changePassword({ ctx, input: { current: 'not this one', password: 'the password of after' } }));
    expect(wrong.fields).toHaveProperty('current');
    await changePassword({ ctx, input: { current: 'the password of before', password: 'the password of after' } });
    const visitor = makeVisitor(databases);
    await expect(signIn({ visitor, input: { email: ctx.person.email, password: 'the password of after' } })).resolves.toMatchObject({ sessionVersion: 2 });
  });

  test('may go on only in an organisation that one works for', async () => {
    const [{ ctx, organisationId }, other] = [await makeTenant(databases), await makeTenant(databases)];
    expect(await changeOrganisationOfSession({ ctx, input: { organisationId } })).toEqual({ organisationId });
    expect((await refusalOf(changeOrganisationOfSession({ ctx, input: { organisationId: other.organisationId } }))).code).toBe('not-found');
  });
});

describe('sites', () => {
  test('are added and changed by an administrator, listed for everybody', async () => {
    const { ctx, addPerson } = await asAdministrator();
    const { siteId } = await addSite({ ctx, input: { name: 'North depot', timeZone: 'America/Denver' } });
    await changeSite({ ctx, input: { siteId, name: 'North yard', timeZone: 'America/Boise' } });
    const trainer = await addPerson({ roles: ['trainer'] });
    expect(await listSites({ ctx: trainer, input: {} })).toContainEqual({ id: siteId, name: 'North yard', timeZone: 'America/Boise' });
    expect((await refusalOf(addSite({ ctx: trainer, input: { name: 'South', timeZone: 'America/Boise' } }))).code).toBe('forbidden');
    expect((await refusalOf(changeSite({ ctx: trainer, input: { siteId, name: 'South', timeZone: 'America/Boise' } }))).code).toBe('forbidden');
  });

  test('have a name of their own and a time zone that exists', async () => {
    const { ctx, siteId } = await asAdministrator();
    const { siteId: second } = await addSite({ ctx, input: { name: 'Second', timeZone: 'Europe/Lisbon' } });
    const taken = await refusalOf(addSite({ ctx, input: { name: 'Second', timeZone: 'Europe/Lisbon' } }));
    expect([taken.code, Object.keys(taken.fields)]).toEqual(['conflict', ['name']]);
    expect((await refusalOf(changeSite({ ctx, input: { siteId, name: 'Second', timeZone: 'Europe/Lisbon' } }))).code).toBe('conflict');
    for (const timeZone of ['Nowhere/Land', 'CST', '', '../etc']) {
      expect((await refusalOf(changeSite({ ctx, input: { siteId: second, name: 'Second', timeZone } }))).fields).toHaveProperty('timeZone');
    }
  });

  test('of another organisation are not found, and may have the same name', async () => {
    const [ours, theirs] = [await asAdministrator(), await asAdministrator()];
    const taking = { siteId: theirs.siteId, name: 'Taken over', timeZone: 'Europe/Lisbon' };
    expect((await refusalOf(viewSite({ ctx: ours.ctx, input: { siteId: theirs.siteId } }))).code).toBe('not-found');
    expect((await refusalOf(changeSite({ ctx: ours.ctx, input: taking }))).code).toBe('not-found');
    expect(await listSites({ ctx: theirs.ctx, input: {} })).toMatchObject([{ name: 'Yard' }]);
  });
});

describe('the organisation', () => {
  test('is changed by an administrator', async () => {
    const { ctx, addPerson } = await asAdministrator();
    await changeOrganisation({ ctx, input: { name: 'Renamed', country: 'pt', currency: 'eur', labourRatePerHour: '98,50' } });
    expect(await viewOrganisation({ ctx, input: {} })).toEqual({ name: 'Renamed', country: 'PT', currency: 'EUR', labourRatePerHour: 98.5 });
    const manager = await addPerson({ roles: ['manager'] });
    expect((await refusalOf(changeOrganisation({ ctx: manager, input: { name: 'X', country: 'PT', currency: 'EUR' } }))).code).toBe('forbidden');
    expect((await refusalOf(viewOrganisation({ ctx: manager, input: {} }))).code).toBe('forbidden');
  });

  test('has a country and a currency that exist, and a rate that can be one', async () => {
    const { ctx } = await asAdministrator();
    const good = { name: 'Fleet', country: 'US', currency: 'USD', labourRatePerHour: '' };
    const refused = async (change: object) => Object.keys((await refusalOf(changeOrganisation({ ctx, input: { ...good, ...change } }))).fields);
    expect(await refused({ country: 'QX' })).toEqual(['country']);
    expect(await refused({ currency: 'dollars' })).toEqual(['currency']);
    for (const labourRatePerHour of ['much', '-3', '0', 'Infinity', 1e9]) expect(await refused({ labourRatePerHour })).toEqual(['labourRatePerHour']);
    await changeOrganisation({ ctx, input: good });
    expect((await viewOrganisation({ ctx, input: {} })).labourRatePerHour).toBeNull();
  });
});

describe('the audit', () => {
  test('is filtered and paged, of one\'s own organisation alone', async () => {
    const [{ ctx, addPerson, siteId }, theirs] = [await asAdministrator(), await asAdministrator()];
    await changeSite({ ctx: theirs.ctx, input: { siteId: theirs.siteId, name: 'Theirs', timeZone: 'Europe/Lisbon' } });
    const second = await addPerson({ roles: ['administrator'] });
    for (let i = 0; i < 51; i++) await changeSite({ ctx, input: { siteId, name: `Yard ${i}`, timeZone: 'Europe/Lisbon' } });
    await rename({ ctx: second, input: { name: 'Second' } });

    const list = (input: object = {}) => listAudit({ ctx, input: { page: 1, ...input } });
    expect(await list()).toMatchObject({ total: 52, page: 1, pageCount: 2, entities: ['person', 'site'] });
    expect((await list()).rows).toHaveLength(50);
    expect((await list({ page: 2 })).rows).toHaveLength(2);
    expect((await list({ page: 99 })).page).toBe(2);
    expect((await list({ entity: 'person' })).rows).toMatchObject([{ action: 'rename.person', personName: 'Second' }]);
    expect((await list({ person: second.person.id })).total).toBe(1);
    expect((await list({ until: '2020-01-01' })).total).toBe(0);
    expect((await list({ from: '2020-01-01' })).total).toBe(52);
    expect((await list({ person: 'nonsense', from: 'yesterday' })).total).toBe(52);
  });

  test('is for administrators alone', async () => {
    const { ctx } = await makeTenant(databases, { roles: ['manager'] });
    expect((await refusalOf(listAudit({ ctx, input: { page: 1 } }))).code).toBe('forbidden');
  });
});
