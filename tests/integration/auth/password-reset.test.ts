import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { audit } from '@/db/schema';
import { sql } from 'drizzle-orm';
import { newId } from '@/lib/ids';
import { mailPasswordReset } from '@/lib/services/password/mail-reset';
import { requestPasswordReset } from '@/lib/services/password/request-reset';
import { resetPassword, viewPasswordReset } from '@/lib/services/password/reset';
import { signIn } from '@/lib/services/session/sign-in';
import { LIMITS } from '@/lib/services/session/tries';
import { HOUR_MS, makeClock } from '@/tests/support/clock';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makePost } from '@/tests/support/post';
import { refusalOf } from '@/tests/support/refusal';
import { makeTenant, makeVisitor } from '@/tests/support/tenant';

const OLD = 'the password of before';
const NEW = 'the password of after';
let databases: TestDatabases;
beforeAll(async () => {
  databases = await openTestDatabases();
});
afterAll(() => databases.close());

async function askedFor() {
  const clock = makeClock();
  const tenant = await makeTenant(databases, { password: OLD, now: clock.now });
  const email = tenant.ctx.person.email;
  const { post, letters, tokenOf } = makePost(databases, clock.now);
  const visitor = makeVisitor(databases, { now: clock.now });
  const mail = async () => {
    await mailPasswordReset(post, { email }, { jobId: newId() });
    return tokenOf(letters.at(-1));
  };
  return { tenant, email, clock, visitor, letters, mail, token: await mail() };
}

const jobsFor = async (email: string) => {
  const { rows } = await databases.app.execute(sql`select data from pgboss.job where name = 'mail-password-reset' and data->>'email' = ${email}`);
  return rows.length;
};

describe('asking for a new password', () => {
  test('is answered alike and leaves a job alike, whether or not anybody has the address', async () => {
    const { ctx } = await makeTenant(databases, { password: OLD });
    const visitor = makeVisitor(databases);
    const unknown = `${crypto.randomUUID()}@people.test`;
    const answers = [await requestPasswordReset({ visitor, input: { email: ctx.person.email } }), await requestPasswordReset({ visitor, input: { email: unknown } })];
    expect(answers).toEqual([undefined, undefined]);
    expect([await jobsFor(ctx.person.email), await jobsFor(unknown)]).toEqual([1, 1]);
  });

  test('mails nothing to an address that nobody has', async () => {
    const { post, letters } = makePost(databases);
    await mailPasswordReset(post, { email: `${crypto.randomUUID()}@people.test` }, { jobId: newId() });
    expect(letters).toEqual([]);
  });

  test('too often for one address is dropped without a word, from one place refused', async () => {
    const email = `${crypto.randomUUID()}@people.test`;
    const { now } = makeClock();
    for (let i = 0; i < LIMITS['reset by address'].most + 3; i++) await requestPasswordReset({ visitor: makeVisitor(databases, { now }), input: { email } });
    expect(await jobsFor(email)).toBe(LIMITS['reset by address'].most);

    const visitor = makeVisitor(databases, { now });
    for (let i = 0; i < LIMITS['reset by network'].most; i++) await requestPasswordReset({ visitor, input: { email } });
    expect((await refusalOf(requestPasswordReset({ visitor, input: { email } }))).code).toBe('too-many');
  });
});

describe('the link of a password reset', () => {
  test('is the same when its mail is tried again, and is not sent again once it was used', async () => {
    const { tenant } = await askedFor();
    const { post, letters, tokenOf } = makePost(databases, tenant.ctx.now);
    const again = { jobId: newId() };
    for (let i = 0; i < 2; i++) await mailPasswordReset(post, { email: tenant.ctx.person.email }, again);
    expect(letters).toHaveLength(2);
    expect(letters[0]).toEqual(letters[1]);
    const visitor = makeVisitor(databases, { now: tenant.ctx.now });
    await resetPassword({ visitor, input: { token: tokenOf(letters[0]), password: NEW } });
    await mailPasswordReset(post, { email: tenant.ctx.person.email }, again);
    expect(letters).toHaveLength(2);
  });

  test('sets the password once, and the old one is of no use any more', async () => {
    const { email, visitor, token } = await askedFor();
    await viewPasswordReset({ visitor, input: { token } });
    await resetPassword({ visitor, input: { token, password: NEW } });
    await expect(signIn({ visitor, input: { email, password: NEW } })).resolves.toMatchObject({ sessionVersion: 2 });
    expect((await refusalOf(signIn({ visitor, input: { email, password: OLD } }))).code).toBe('invalid');
    expect((await refusalOf(resetPassword({ visitor, input: { token, password: 'yet another password' } }))).code).toBe('not-found');
    expect((await refusalOf(viewPasswordReset({ visitor, input: { token } }))).code).toBe('not-found');
  });

  test('works once when used twice at the same moment', async () => {
    const { visitor, token } = await askedFor();
    const uses = await Promise.allSettled([1, 2, 3].map(() => resetPassword({ visitor, input: { token, password: NEW } })));
    expect(uses.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
  });

  test('expires after an hour', async () => {
    const { visitor, token, clock } = await askedFor();
    clock.forward(HOUR_MS - 1);
    await viewPasswordReset({ visitor, input: { token } });
    clock.forward(1);
    expect((await refusalOf(resetPassword({ visitor, input: { token, password: NEW } }))).code).toBe('not-found');
  });

  test('stops working when a newer one is sent', async () => {
    const { visitor, token, mail } = await askedFor();
    const newer = await mail();
    expect((await refusalOf(viewPasswordReset({ visitor, input: { token } }))).code).toBe('not-found');
    await viewPasswordReset({ visitor, input: { token: newer } });
  });

  test('is not used up by a password that is refused', async () => {
    const { visitor, token } = await askedFor();
    const refused = await refusalOf(resetPassword({ visitor, input: { token, password: 'short' } }));
    expect(refused.fields).toHaveProperty('password');
    await resetPassword({ visitor, input: { token, password: NEW } });
  });

  test('is said to be dead in the same words when used, made up or cut short by a character', async () => {
    const { visitor, token } = await askedFor();
    await resetPassword({ visitor, input: { token, password: NEW } });
    const used = await refusalOf(viewPasswordReset({ visitor, input: { token } }));
    const madeUp = await refusalOf(viewPasswordReset({ visitor, input: { token: 'A'.repeat(43) } }));
    expect(madeUp.message).toBe(used.message);
    expect((await refusalOf(viewPasswordReset({ visitor, input: { token: token.slice(1) } }))).code).toBe('invalid');
  });

  test('is kept as a hash alone', async () => {
    const { tenant, token } = await askedFor();
    const kept = await tenant.asOwner((tx) => tx.execute(sql`select r::text from password_reset r`));
    expect(JSON.stringify(kept.rows)).not.toContain(token);
    const queued = await databases.app.execute(sql`select data from pgboss.job`);
    expect(JSON.stringify(queued.rows)).not.toContain(token);
  });

  test('leaves an audit row in the organisation, without the password', async () => {
    const { tenant, visitor, token } = await askedFor();
    await resetPassword({ visitor, input: { token, password: NEW } });
    const rows = await tenant.asOwner((tx) => tx.select().from(audit));
    expect(rows).toMatchObject([{ action: 'reset-password.person', personId: tenant.personId, changed: { password: 'changed' } }]);
  });
});
