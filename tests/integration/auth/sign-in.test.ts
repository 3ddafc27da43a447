import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { attempt } from '@/db/schema';
import { passwordMatches, hashPassword } from '@/lib/auth/password-hash';
import { signIn } from '@/lib/services/session/sign-in';
import { LIMITS } from '@/lib/services/session/tries';
import { makeClock, MINUTE_MS } from '@/tests/support/clock';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { refusalOf } from '@/tests/support/refusal';
import { makeTenant, makeVisitor } from '@/tests/support/tenant';

const PASSWORD = 'a password for these tests';
let databases: TestDatabases;
beforeAll(async () => {
  databases = await openTestDatabases();
});
afterAll(() => databases.close());

const someAddress = () => `${crypto.randomUUID()}@people.test`;

describe('signing in', () => {
  test('takes the address in any case, with spaces around it', async () => {
    const { ctx, organisationId } = await makeTenant(databases, { password: PASSWORD });
    const visitor = makeVisitor(databases);
    const signedIn = await signIn({ visitor, input: { email: `  ${ctx.person.email.toUpperCase()} `, password: PASSWORD } });
    expect(signedIn).toEqual({ personId: ctx.person.id, organisationId, sessionVersion: 1 });
  });

  test('says the same of a wrong password and of an address that nobody has', async () => {
    const { ctx } = await makeTenant(databases, { password: PASSWORD });
    const visitor = makeVisitor(databases);
    const wrong = await refusalOf(signIn({ visitor, input: { email: ctx.person.email, password: 'something else' } }));
    const unknown = await refusalOf(signIn({ visitor, input: { email: someAddress(), password: 'something else' } }));
    expect({ ...wrong, message: wrong.message }).toEqual({ ...unknown, message: unknown.message });
  });

  test('refuses somebody invited who has no password yet', async () => {
    const { ctx } = await makeTenant(databases);
    expect((await refusalOf(signIn({ visitor: makeVisitor(databases), input: { email: ctx.person.email, password: 'x' } }))).code).toBe('invalid');
  });

  test('hashes for an address that nobody has as well, so that time does not tell', async () => {
    const hash = await hashPassword(PASSWORD);
    const timeOf = async (passwordHash: string | undefined) => {
      const began = performance.now();
      expect(await passwordMatches(passwordHash, 'wrong')).toBe(false);
      return performance.now() - began;
    };
    await timeOf(undefined);
    const pairs = [];
    for (let i = 0; i < 7; i++) pairs.push((await timeOf(undefined)) / (await timeOf(hash)));
    const median = pairs.sort((a, b) => a - b)[3];
    // Without the hashing it would be some hundredths.
    expect(median).toBeGreaterThan(0.3);
    expect(median).toBeLessThan(3);
  });
});

describe('guessing is slowed', () => {
  test('by address, from wherever it comes, whether or not anybody has it', async () => {
    const { ctx } = await makeTenant(databases, { password: PASSWORD });
    for (const email of [ctx.person.email, someAddress()]) {
      const clock = makeClock();
      const tryIt = (password: string) => signIn({ visitor: makeVisitor(databases, { now: clock.now }), input: { email, password } });
      for (let i = 0; i < LIMITS['sign-in by address'].most; i++) expect((await refusalOf(tryIt('wrong'))).code).toBe('invalid');
      expect((await refusalOf(tryIt(PASSWORD))).code).toBe('too-many');
      clock.forward(15 * MINUTE_MS);
      const after = tryIt(PASSWORD);
      if (email === ctx.person.email) await expect(after).resolves.toMatchObject({ personId: ctx.person.id });
      else expect((await refusalOf(after)).code).toBe('invalid');
    }
  });

  test('by network address, whatever addresses are tried', async () => {
    const { now } = makeClock();
    const visitor = makeVisitor(databases, { now });
    // Counted straight, because a hundred hashes take four seconds.
    const { tryOrRefuse } = await import('@/lib/services/session/tries');
    for (let i = 0; i < LIMITS['sign-in by network'].most; i++) await tryOrRefuse(visitor, 'sign-in by network', visitor.network);
    expect((await refusalOf(signIn({ visitor, input: { email: someAddress(), password: 'x' } }))).code).toBe('too-many');
    expect((await refusalOf(signIn({ visitor: makeVisitor(databases, { now }), input: { email: someAddress(), password: 'x' } }))).code).toBe('invalid');
  });

  test('and forgiven by signing in', async () => {
    const { ctx } = await makeTenant(databases, { password: PASSWORD });
    const { now } = makeClock();
    const tryIt = (password: string) => signIn({ visitor: makeVisitor(databases, { now }), input: { email: ctx.person.email, password } });
    for (let round = 0; round < 2; round++) {
      for (let i = 0; i < LIMITS['sign-in by address'].most - 1; i++) await refusalOf(tryIt('wrong'));
      await tryIt(PASSWORD);
    }
  });

  test('when tried at the same moment as well', async () => {
    const { now } = makeClock();
    const email = someAddress();
    const tries = Array.from({ length: LIMITS['sign-in by address'].most + 4 }, () =>
      refusalOf(signIn({ visitor: makeVisitor(databases, { now }), input: { email, password: 'wrong' } })),
    );
    const codes = (await Promise.all(tries)).map(({ code }) => code);
    expect(codes.filter((code) => code === 'too-many')).toHaveLength(4);
  });

  test('without keeping anybody\'s address', async () => {
    const email = someAddress();
    await refusalOf(signIn({ visitor: makeVisitor(databases, { network: '203.0.113.9' }), input: { email, password: 'wrong' } }));
    const kept = JSON.stringify(await databases.app.select().from(attempt));
    expect(kept).not.toContain(email);
    expect(kept).not.toContain('203.0.113.9');
  });
});
