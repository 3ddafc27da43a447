import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { audit } from '@/db/schema';
import { changeMember } from '@/lib/services/membership/change';
import { endMembership } from '@/lib/services/membership/end';
import { listPeople } from '@/lib/services/membership/list';
import { viewMember } from '@/lib/services/membership/view';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { refusalOf } from '@/tests/support/refusal';
import { makeTenant } from '@/tests/support/tenant';

let databases: TestDatabases;
beforeAll(async () => {
  databases = await openTestDatabases();
});
afterAll(() => databases.close());

const asAdministrator = () => makeTenant(databases, { roles: ['administrator'] });

describe('changing what somebody may do', () => {
  test('keeps several roles in their usual order, the site, and the right to release with its basis', async () => {
    const { ctx, addPerson, siteId, asOwner } = await asAdministrator();
    const { person } = await addPerson();
    await changeMember({ ctx, input: { personId: person.id, roles: ['manager', 'technician'], siteId, mayRelease: 'on', releaseBasis: ' Inspector, 2026 ' } });
    expect(await viewMember({ ctx, input: { personId: person.id } })).toMatchObject({ roles: ['technician', 'manager'], siteId, mayRelease: true, releaseBasis: 'Inspector, 2026' });
    expect(await asOwner((tx) => tx.select().from(audit))).toMatchObject([{ action: 'change.membership', entityId: person.id, personId: ctx.person.id, changed: { mayRelease: true, releaseBasis: 'Inspector, 2026' } }]);
  });

  test('asks for a basis with the right to release, and for at least one role that exists', async () => {
    const { ctx, addPerson } = await asAdministrator();
    const personId = (await addPerson()).person.id;
    const change = (input: object) => refusalOf(changeMember({ ctx, input: { personId, roles: ['technician'], ...input } as never }));
    expect((await change({ mayRelease: 'on', releaseBasis: '  ' })).fields).toHaveProperty('releaseBasis');
    expect((await change({ roles: [] })).fields).toHaveProperty('roles');
    expect(Object.keys((await change({ roles: 'owner' })).fields)[0]).toMatch(/^roles/);
  });

  test('refuses a site of another organisation as if it did not exist', async () => {
    const [{ ctx, addPerson }, other] = [await asAdministrator(), await asAdministrator()];
    const personId = (await addPerson()).person.id;
    expect((await refusalOf(changeMember({ ctx, input: { personId, roles: ['technician'], siteId: other.siteId } }))).fields).toHaveProperty('siteId');
  });

  test('of another organisation is not found', async () => {
    const [{ ctx }, other] = [await asAdministrator(), await asAdministrator()];
    const stranger = (await other.addPerson()).person.id;
    expect((await refusalOf(changeMember({ ctx, input: { personId: stranger, roles: ['technician'] } }))).code).toBe('not-found');
    expect((await refusalOf(endMembership({ ctx, input: { personId: stranger } }))).code).toBe('not-found');
    expect((await refusalOf(viewMember({ ctx, input: { personId: stranger } }))).code).toBe('not-found');
    expect((await listPeople({ ctx, input: {} })).map(({ personId }) => personId)).toEqual([ctx.person.id]);
  });

  test('is for administrators alone', async () => {
    const { addPerson } = await asAdministrator();
    const manager = await addPerson({ roles: ['technician', 'engineer', 'manager', 'trainer'] });
    const input = { personId: manager.person.id, roles: ['administrator'] as const };
    expect((await refusalOf(changeMember({ ctx: manager, input: { ...input, roles: [...input.roles] } }))).code).toBe('forbidden');
    expect((await refusalOf(endMembership({ ctx: manager, input }))).code).toBe('forbidden');
    expect((await refusalOf(listPeople({ ctx: manager, input: {} }))).code).toBe('forbidden');
  });
});

describe('the last administrator', () => {
  test('can neither lose the role nor leave', async () => {
    const { ctx } = await asAdministrator();
    const personId = ctx.person.id;
    expect((await refusalOf(changeMember({ ctx, input: { personId, roles: ['manager'] } }))).code).toBe('conflict');
    expect((await refusalOf(endMembership({ ctx, input: { personId } }))).code).toBe('conflict');
  });

  test('is not lost by two of them going at the same moment', async () => {
    const { ctx, addPerson } = await asAdministrator();
    const second = await addPerson({ roles: ['administrator'] });
    const outcomes = await Promise.allSettled([
      endMembership({ ctx, input: { personId: second.person.id } }),
      endMembership({ ctx: second, input: { personId: ctx.person.id } }),
    ]);
    expect(outcomes.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
  });
});

test('somebody who has left stays in the list, last, and cannot be changed', async () => {
  const { ctx, addPerson } = await asAdministrator();
  const { person } = await addPerson({ roles: ['manager'], mayRelease: true });
  await endMembership({ ctx, input: { personId: person.id } });
  expect((await listPeople({ ctx, input: {} })).at(-1)).toMatchObject({ personId: person.id, mayRelease: false, endedAt: expect.any(Date) });
  expect((await refusalOf(changeMember({ ctx, input: { personId: person.id, roles: ['technician'] } }))).code).toBe('not-found');
  expect((await refusalOf(endMembership({ ctx, input: { personId: person.id } }))).code).toBe('not-found');
});
