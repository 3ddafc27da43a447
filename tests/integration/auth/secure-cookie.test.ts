import { afterAll, beforeAll, expect, test } from 'vitest';
import { openApplication, signInAs } from '@/tests/support/application';
import type { TestDatabases } from '@/tests/support/context';
import { makeTenant } from '@/tests/support/tenant';

let databases: TestDatabases;
beforeAll(async () => {
  databases = await openApplication({ url: 'https://carryover.test' });
});
afterAll(() => databases.close());

test('reached by https, the session is kept in a cookie that goes by https alone', async () => {
  const password = 'a password for these tests';
  const { ctx } = await makeTenant(databases, { password });
  const browser = await signInAs(ctx.person.email, password);
  expect(browser.attributes.get('__Secure-next-auth.session-token')).toMatchObject({ httpOnly: true, secure: true, sameSite: 'lax' });
  const { getContext } = await import('@/lib/auth/session');
  expect((await browser.render('/cases', getContext))?.person.id).toBe(ctx.person.id);
});
