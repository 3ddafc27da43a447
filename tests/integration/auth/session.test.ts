import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { membership } from '@/db/schema';
import { changeMember } from '@/lib/services/membership/change';
import { endMembership } from '@/lib/services/membership/end';
import { rename } from '@/lib/services/person/rename';
import { signOutEverywhere } from '@/lib/services/session/sign-out-everywhere';
import { openApplication, signInAs } from '@/tests/support/application';
import type { TestDatabases } from '@/tests/support/context';
import type { Browser } from '@/tests/support/next-request';
import { refusalOf } from '@/tests/support/refusal';
import { makeTenant } from '@/tests/support/tenant';

const PASSWORD = 'a password for these tests';
let databases: TestDatabases;
beforeAll(async () => {
  databases = await openApplication();
});
afterAll(() => databases.close());

async function contextIn(browser: Browser) {
  const { getContext } = await import('@/lib/auth/session');
  return browser.render('/cases', getContext);
}
const isSignedIn = async (browser: Browser) => (await contextIn(browser)) !== null;

describe('a session', () => {
  test('carries person, organisation and roles, and nothing of the password', async () => {
    const { ctx } = await makeTenant(databases, { roles: ['engineer', 'manager'], mayRelease: true, password: PASSWORD });
    const found = await contextIn(await signInAs(ctx.person.email, PASSWORD));
    expect(found).toMatchObject({ person: ctx.person, organisation: ctx.organisation, roles: ['engineer', 'manager'], mayRelease: true });
    expect(JSON.stringify(found?.person)).not.toMatch(/argon2|hash/i);
  });

  test('is kept in a cookie that scripts cannot read and other sites do not send', async () => {
    const { ctx } = await makeTenant(databases, { password: PASSWORD });
    const browser = await signInAs(ctx.person.email, PASSWORD);
    expect(browser.attributes.get('next-auth.session-token')).toMatchObject({ httpOnly: true, sameSite: 'lax' });
  });

  test('of a cookie that was tampered with is none', async () => {
    const { ctx } = await makeTenant(databases, { password: PASSWORD });
    const browser = await signInAs(ctx.person.email, PASSWORD);
    const cookie = browser.cookies.get('next-auth.session-token') ?? '';
    browser.cookies.set('next-auth.session-token', `${cookie.slice(0, -4)}AAAA`);
    expect(await isSignedIn(browser)).toBe(false);
  });

  test('ends on every device by signing out everywhere', async () => {
    const { ctx } = await makeTenant(databases, { password: PASSWORD });
    const [here, there] = [await signInAs(ctx.person.email, PASSWORD), await signInAs(ctx.person.email, PASSWORD)];
    await signOutEverywhere({ ctx, input: {} });
    expect([await isSignedIn(here), await isSignedIn(there)]).toEqual([false, false]);
    expect(await isSignedIn(await signInAs(ctx.person.email, PASSWORD))).toBe(true);
  });

  test('of one browser ends by signing out, and no other', async () => {
    const { ctx } = await makeTenant(databases, { password: PASSWORD });
    const [here, there] = [await signInAs(ctx.person.email, PASSWORD), await signInAs(ctx.person.email, PASSWORD)];
    const { endSession } = await import('@/lib/auth/next-auth');
    await here.act('/', endSession);
    expect([await isSignedIn(here), await isSignedIn(there)]).toEqual([false, true]);
  });

  test('ends when roles or the right to release change, and not when only the site does', async () => {
    const { ctx, addPerson, siteId } = await makeTenant(databases, { roles: ['administrator'] });
    const colleague = await addPerson({ roles: ['technician'], password: PASSWORD });
    const change = (input: { roles: string[]; mayRelease?: boolean; releaseBasis?: string }) =>
      changeMember({ ctx, input: { personId: colleague.person.id, siteId, ...input } as never });
    let browser = await signInAs(colleague.person.email, PASSWORD);
    await change({ roles: ['technician'] });
    expect(await isSignedIn(browser)).toBe(true);
    await change({ roles: ['technician', 'manager'] });
    expect(await isSignedIn(browser)).toBe(false);
    browser = await signInAs(colleague.person.email, PASSWORD);
    await change({ roles: ['technician', 'manager'], mayRelease: true, releaseBasis: 'Inspector' });
    expect(await isSignedIn(browser)).toBe(false);
  });

  test('ends with the membership, and the way in is shut without saying why', async () => {
    const { ctx, addPerson } = await makeTenant(databases, { roles: ['administrator'] });
    const leaver = await addPerson({ password: PASSWORD });
    const browser = await signInAs(leaver.person.email, PASSWORD);
    await endMembership({ ctx, input: { personId: leaver.person.id } });
    expect(await isSignedIn(browser)).toBe(false);
    const left = await refusalOf(signInAs(leaver.person.email, PASSWORD));
    const unknown = await refusalOf(signInAs('nobody@people.test', PASSWORD));
    expect(left.message).toBe(unknown.message);
  });

  test('is an error, and no sign-out, while the database cannot be asked', async () => {
    const { ctx } = await makeTenant(databases, { password: PASSWORD });
    const browser = await signInAs(ctx.person.email, PASSWORD);
    await databases.owner.execute(sql`revoke execute on function standing(uuid, uuid) from carryover_app`);
    await expect(contextIn(browser)).rejects.toThrow(/standing/);
    await databases.owner.execute(sql`grant execute on function standing(uuid, uuid) to carryover_app`);
    expect(await isSignedIn(browser)).toBe(true);
  });

  test('sees a new name at the next request', async () => {
    const { ctx } = await makeTenant(databases, { password: PASSWORD });
    const browser = await signInAs(ctx.person.email, PASSWORD);
    await rename({ ctx, input: { name: 'Somebody Else' } });
    expect((await contextIn(browser))?.person.name).toBe('Somebody Else');
  });
});

describe('somebody who works for several organisations', () => {
  async function inTwo() {
    const [first, second, foreign] = [await makeTenant(databases, { password: PASSWORD }), await makeTenant(databases), await makeTenant(databases)];
    await second.asOwner((tx) => tx.insert(membership).values({ organisationId: second.organisationId, personId: first.personId, roles: ['manager'] }));
    const browser = await signInAs(first.ctx.person.email, PASSWORD);
    const { changeOrganisation } = await import('@/lib/auth/next-auth');
    return { first, second, foreign, browser, goTo: (id: string) => browser.act('/', () => changeOrganisation(id)) };
  }

  test('can go on in the other, with the roles held there', async () => {
    const { first, second, browser, goTo } = await inTwo();
    expect((await contextIn(browser))?.organisation.id).toBe(first.organisationId);
    await goTo(second.organisationId);
    expect(await contextIn(browser)).toMatchObject({ organisation: { id: second.organisationId }, roles: ['manager'] });
  });

  test('cannot get into a third, whatever is asked of next-auth', async () => {
    const { foreign, browser, goTo } = await inTwo();
    await goTo(foreign.organisationId);
    expect((await contextIn(browser))?.organisation.id).not.toBe(foreign.organisationId);
  });
});
