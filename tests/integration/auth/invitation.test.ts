import { eq, sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { audit, mail as mailTable } from '@/db/schema';
import type { Role } from '@/lib/auth/roles';
import type { Mail } from '@/lib/mail';
import { acceptInvitation, viewInvitation } from '@/lib/services/invitation/accept';
import { invite } from '@/lib/services/invitation/invite';
import { listInvitations } from '@/lib/services/invitation/list';
import { resendInvitation } from '@/lib/services/invitation/resend';
import { withdrawInvitation } from '@/lib/services/invitation/withdraw';
import { sendMail } from '@/lib/services/mail/send';
import { endMembership } from '@/lib/services/membership/end';
import { listPeople } from '@/lib/services/membership/list';
import { signIn } from '@/lib/services/session/sign-in';
import { DAY_MS, makeClock } from '@/tests/support/clock';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makePost } from '@/tests/support/post';
import { refusalOf } from '@/tests/support/refusal';
import { makeTenant, makeVisitor } from '@/tests/support/tenant';

const PASSWORD = 'a password for these tests';
let databases: TestDatabases;
beforeAll(async () => {
  databases = await openTestDatabases();
});
afterAll(() => databases.close());

const someAddress = () => `${crypto.randomUUID()}@people.test`;

async function invited({ email = someAddress(), roles = ['technician'] as Role[] } = {}) {
  const clock = makeClock();
  const tenant = await makeTenant(databases, { roles: ['administrator'], now: clock.now });
  const { ctx, organisationId } = tenant;
  const { letters, tokenOf, deliver } = makePost(databases, clock.now);
  const visitor = makeVisitor(databases, { now: clock.now });
  const { invitationId } = await invite({ ctx, input: { email, roles, siteId: tenant.siteId } });
  const mail = async () => {
    await deliver(organisationId);
    return tokenOf(letters.at(-1));
  };
  return { tenant, ctx, email, clock, visitor, letters, mail, invitationId, token: await mail() };
}

describe('an invitation', () => {
  test('makes a sign-in and a membership with the roles and site given', async () => {
    const { ctx, tenant, email, visitor, token } = await invited({ roles: ['technician', 'manager'] });
    expect(await viewInvitation({ visitor, input: { token } })).toEqual({ organisationName: ctx.organisation.name, email, roles: ['technician', 'manager'], hasSignIn: false });
    await acceptInvitation({ visitor, input: { token, name: ' New Comer ', password: PASSWORD } });
    expect((await listPeople({ ctx, input: {} })).find((person) => person.email === email)).toMatchObject({
      name: 'New Comer',
      roles: ['technician', 'manager'],
      siteId: tenant.siteId,
      mayRelease: false,
    });
    await expect(signIn({ visitor, input: { email, password: PASSWORD } })).resolves.toMatchObject({ organisationId: tenant.organisationId });
    expect(await listInvitations({ ctx, input: {} })).toEqual([]);
  });

  test('works once, also when used twice at the same moment', async () => {
    const { visitor, token } = await invited();
    const use = () => acceptInvitation({ visitor, input: { token, name: 'New', password: PASSWORD } });
    const uses = await Promise.allSettled([use(), use(), use()]);
    expect(uses.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    expect((await refusalOf(use())).code).toBe('not-found');
  });

  test('expires after seven days; sent again it works with the new link alone', async () => {
    const { ctx, visitor, token, clock, mail, invitationId } = await invited();
    clock.forward(7 * DAY_MS);
    expect((await refusalOf(viewInvitation({ visitor, input: { token } }))).code).toBe('not-found');
    expect((await listInvitations({ ctx, input: {} }))[0]).toMatchObject({ hasExpired: true });

    await resendInvitation({ ctx, input: { invitationId } });
    const newer = await mail();
    expect((await refusalOf(viewInvitation({ visitor, input: { token } }))).code).toBe('not-found');
    await acceptInvitation({ visitor, input: { token: newer, name: 'New', password: PASSWORD } });
  });

  test('stops working at once when sent again, before the new mail is out', async () => {
    const { ctx, visitor, token, invitationId } = await invited();
    await resendInvitation({ ctx, input: { invitationId } });
    expect((await refusalOf(viewInvitation({ visitor, input: { token } }))).code).toBe('not-found');
  });

  test('that is withdrawn stops working, forgets the address and is not mailed', async () => {
    const { ctx, tenant, visitor, token, email, invitationId, letters, mail } = await invited();
    await resendInvitation({ ctx, input: { invitationId } });
    await withdrawInvitation({ ctx, input: { invitationId } });
    expect((await refusalOf(viewInvitation({ visitor, input: { token } }))).code).toBe('not-found');
    const kept = await tenant.asOwner((tx) => tx.execute(sql`select i::text from invitation i union all select m::text from mail m`));
    expect(JSON.stringify(kept.rows)).not.toContain(email);
    const sent = letters.length;
    await expect(mail()).resolves.toBeTruthy();
    expect(letters).toHaveLength(sent);
  });

  test('holds the same link when its mail is tried again, so that it does not matter which copy is read', async () => {
    const { ctx, tenant, visitor, email, invitationId, clock } = await invited();
    clock.forward(1_000);
    await resendInvitation({ ctx, input: { invitationId } });
    const { post, letters, tokenOf, deliver } = makePost(databases, clock.now);
    const unanswered = { ...post.mailer, send: (letter: Mail) => post.mailer.send(letter).then(() => Promise.reject(new Error('The line went dead.'))) };
    const waiting = await tenant.asOwner((tx) => tx.select({ id: mailTable.id }).from(mailTable).where(eq(mailTable.state, 'waiting')));
    const first = { organisationId: tenant.organisationId, mailId: waiting[0]?.id ?? '' };
    await expect(sendMail({ ...post, mailer: unanswered }, first, { isLast: false })).rejects.toThrow('The mail could not be handed to the mail server.');
    await deliver(tenant.organisationId);
    expect(letters).toHaveLength(2);
    expect(letters[0]).toEqual(letters[1]);
    await expect(viewInvitation({ visitor, input: { token: tokenOf(letters[0]) } })).resolves.toMatchObject({ email });
  });

  test('that was sent again meanwhile is not mailed with its older link', async () => {
    const { ctx, tenant, clock, invitationId } = await invited();
    for (let i = 0; i < 2; i++) {
      clock.forward(1_000);
      await resendInvitation({ ctx, input: { invitationId } });
    }
    const { letters, deliver } = makePost(databases, clock.now);
    await deliver(tenant.organisationId);
    expect(letters).toHaveLength(1);
    const states = await tenant.asOwner((tx) => tx.select({ state: mailTable.state }).from(mailTable).orderBy(mailTable.createdAt));
    expect(states.map(({ state }) => state)).toEqual(['sent', 'given-up', 'sent']);
  });

  test('is not used up by a password or name that is refused', async () => {
    const { visitor, token } = await invited();
    const refused = await refusalOf(acceptInvitation({ visitor, input: { token, name: '', password: 'short' } }));
    expect(Object.keys(refused.fields).sort()).toEqual(['name', 'password']);
    await acceptInvitation({ visitor, input: { token, name: 'New', password: PASSWORD } });
  });

  test('reaches somebody who signs in elsewhere, who joins with the password that is there', async () => {
    const elsewhere = await makeTenant(databases, { password: PASSWORD });
    const { ctx, visitor, token, email } = await invited({ email: elsewhere.ctx.person.email });
    expect((await viewInvitation({ visitor, input: { token } })).hasSignIn).toBe(true);
    const refused = await refusalOf(acceptInvitation({ visitor, input: { token, password: 'not that one at all' } }));
    expect(refused.fields).toHaveProperty('password');
    await acceptInvitation({ visitor, input: { token, password: PASSWORD } });
    const person = (await listPeople({ ctx, input: {} })).find((member) => member.email === email);
    expect(person).toMatchObject({ personId: elsewhere.personId, name: elsewhere.ctx.person.name });
  });

  test('looks the same to the administrator whether or not the address has a sign-in elsewhere', async () => {
    const elsewhere = await makeTenant(databases, { password: PASSWORD });
    const { ctx } = await makeTenant(databases, { roles: ['administrator'] });
    for (const email of [elsewhere.ctx.person.email, someAddress()]) await invite({ ctx, input: { email, roles: ['technician'] } });
    const shown = (await listInvitations({ ctx, input: {} })).map(({ id: _id, email: _email, expiresAt: _until, createdAt: _at, ...rest }) => rest);
    expect(shown[0]).toEqual(shown[1]);
  });

  test('brings somebody back who had left, without the rights of before', async () => {
    const admin = await makeTenant(databases, { roles: ['administrator'] });
    const leaver = await admin.addPerson({ roles: ['manager'], mayRelease: true, password: PASSWORD });
    await endMembership({ ctx: admin.ctx, input: { personId: leaver.person.id } });
    await invite({ ctx: admin.ctx, input: { email: leaver.person.email, roles: ['technician'] } });
    const { letters, tokenOf, deliver } = makePost(databases);
    await deliver(admin.organisationId);
    await acceptInvitation({ visitor: makeVisitor(databases), input: { token: tokenOf(letters[0]), password: PASSWORD } });
    const back = (await listPeople({ ctx: admin.ctx, input: {} })).find(({ personId }) => personId === leaver.person.id);
    expect(back).toMatchObject({ roles: ['technician'], mayRelease: false, releaseBasis: null, endedAt: null });
  });

  test('is refused for somebody who works here, and for an address that has been invited', async () => {
    const { ctx, email } = await invited();
    expect((await refusalOf(invite({ ctx, input: { email, roles: ['technician'] } }))).code).toBe('conflict');
    expect((await refusalOf(invite({ ctx, input: { email: ctx.person.email, roles: ['technician'] } }))).code).toBe('conflict');
  });

  test('is kept as a hash alone, in the database and in the queue', async () => {
    const { tenant, token } = await invited();
    const kept = await tenant.asOwner((tx) => tx.execute(sql`select i::text from invitation i union all select m::text from mail m`));
    const queued = await databases.app.execute(sql`select data from pgboss.job`);
    expect(JSON.stringify([kept.rows, queued.rows])).not.toContain(token);
  });

  test('leaves a trace of every step in the audit, without the address', async () => {
    const { tenant, visitor, token, email } = await invited();
    await acceptInvitation({ visitor, input: { token, name: 'New', password: PASSWORD } });
    const rows = await tenant.asOwner((tx) => tx.select().from(audit));
    expect(rows.map(({ action }) => action).sort()).toEqual(['accept.invitation', 'invite.person', 'mail.invitation']);
    expect(JSON.stringify(rows)).not.toContain(email);
  });
});
