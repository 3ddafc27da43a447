import { afterAll, beforeAll, expect, test } from 'vitest';
import { asTenant } from '@/db/connect';
import { site } from '@/db/schema';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makeTenant } from '@/tests/support/tenant';

let databases: TestDatabases;
beforeAll(async () => {
  databases = await openTestDatabases();
});
afterAll(() => databases.close());

test('a query that forgets its organisation returns nothing', async () => {
  await makeTenant(databases);
  expect(await databases.app.select().from(site)).toEqual([]);
});

test('a transaction sees the rows of its organisation and no others', async () => {
  const ours = await makeTenant(databases);
  await makeTenant(databases);
  const rows = await asTenant(databases.app, { organisationId: ours.organisationId }, (tx) => tx.select({ id: site.id }).from(site));
  expect(rows).toEqual([{ id: ours.siteId }]);
});
