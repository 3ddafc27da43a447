import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { sql } from 'drizzle-orm';
import { fleetKey, fold } from '@/lib/search/fold';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makeTenant, type Tenant } from '@/tests/support/tenant';

let databases: TestDatabases;
let tenant: Tenant;

beforeAll(async () => {
  databases = await openTestDatabases();
  tenant = await makeTenant(databases);
  // Enough of them that reading all of the organisation's is the dearer way.
  await tenant.asOwner((tx) =>
    tx.execute(sql`
      insert into unit (organisation_id, id, site_id, fleet_number, country, vehicle_kind, note)
      select ${tenant.organisationId}, gen_random_uuid(), ${tenant.siteId}, 'T-' || n, 'US', 'truck', 'Parks at place ' || n from generate_series(1, 3000) n`),
  );
  await databases.owner.execute(sql`analyze search_entry`);
});
afterAll(() => databases.close());

/** How the server would run the query that stands in one of the owner's functions: as it is there, as its owner. */
async function planOf(name: string, types: string, values: string): Promise<string> {
  return tenant.asOwner(async (tx) => {
    const { rows } = await tx.execute(sql`select prosrc as body, proargnames as names from pg_proc where proname = ${name}`);
    const [{ body, names }] = rows as [{ body: string; names: string[] }];
    const numbered = names.filter((argument) => argument.startsWith('p_')).reduce((text, argument, i) => text.replaceAll(argument, `$${i + 1}`), body);
    await tx.execute(sql.raw(`prepare ${name}_plan (${types}) as ${numbered}`));
    // As it has to be for values that aren't known yet.
    await tx.execute(sql`set local plan_cache_mode = force_generic_plan`);
    await tx.execute(sql`set local enable_seqscan = off`);
    const plan = await tx.execute(sql.raw(`explain execute ${name}_plan (${values})`));
    return plan.rows.map((row) => String(Object.values(row)[0])).join('\n');
  });
}

describe('what is searched', () => {
  it('is found by the index of words, within the organisation', async () => {
    const plan = await planOf('search_entries', 'uuid, text[], tsquery, integer', `'${tenant.organisationId}', array['unit'], '''place'':*', 10`);
    expect(plan).toContain('Bitmap Index Scan on search_entry_words');
    expect(plan).toMatch(/Index Cond: .*organisation_id = .*words @@/);
  });

  it('is found by the index of fleet numbers, those that are nearly it included', async () => {
    const plan = await planOf('search_fleet_numbers', 'uuid, text, boolean, integer', `'${tenant.organisationId}', 't104', true, 10`);
    expect(plan.match(/Bitmap Index Scan on search_entry_fleet_key/g)).toHaveLength(2);
    expect(plan).toMatch(/Index Cond: .*organisation_id = .*~~/);
    expect(plan).toMatch(/Index Cond: .*organisation_id = .*%/);
    expect(plan).not.toContain('Seq Scan');
  });

  // Why the words stand in a table of their own, searched by the owner's functions.
  it('would not be, by the application under row-level security', async () => {
    const { rows } = await databases.app.transaction(async (tx) => {
      await tx.execute(sql`select set_config('app.organisation_id', ${tenant.organisationId}, true), set_config('enable_seqscan', 'off', true)`);
      return tx.execute(sql`explain select id from search_entry where organisation_id = ${tenant.organisationId} and words @@ '''place'''::tsquery`);
    });
    expect(rows.map((row) => String(Object.values(row)[0])).join('\n')).not.toMatch(/Index Cond: .*@@/);
  });
});

describe('the database folds as we do:', () => {
  it.each(['T-104', 'TR 0104', '0007', 'a0b00c000', 'Señal ÉL ñandú', '½ 1/8" 10e5a', 'x²', 'ÅNGSTRÖM', '“quoted” – dashed…', 'Ünïcödé_under_score', '🔧leak🔧', '漢字 かな', 'İstanbul', 'µm ºC ª', '', '  ', 'a\u00a0b\u2003c', 'Don’t', '№ 5', '\ufeffbom'])('“%s”', async (text) => {
    const { rows } = await databases.owner.execute(sql`select search_fold(${text}) as folded, search_fleet_key(${text}) as key`);
    expect(rows).toEqual([{ folded: fold(text), key: fleetKey(text) }]);
  });
});
