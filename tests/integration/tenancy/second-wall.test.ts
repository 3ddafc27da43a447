import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { asTenant, type Executor } from '@/db/connect';
import { site } from '@/db/schema';
import { newId } from '@/lib/ids';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { makeTenant, type Tenant } from '@/tests/support/tenant';
import { insertOneRowEach } from './one-row-each';

let databases: TestDatabases;
let ours: Tenant;
let theirs: Tenant;
let tables: { name: string; isTenants: boolean; secured: boolean; forced: boolean }[];

beforeAll(async () => {
  databases = await openTestDatabases();
  [ours, theirs] = [await makeTenant(databases), await makeTenant(databases)];
  for (const tenant of [ours, theirs]) await tenant.asOwner((tx) => insertOneRowEach(tx, tenant));
  const { rows } = await databases.owner.execute(sql`
    select c.relname as name, c.relrowsecurity as secured, c.relforcerowsecurity as forced,
           exists (select 1 from pg_attribute a where a.attrelid = c.oid and a.attname = 'organisation_id') as "isTenants"
    from pg_class c join pg_namespace n on n.oid = c.relnamespace where n.nspname = 'public' and c.relkind = 'r' order by 1`);
  tables = rows as typeof tables;
});
afterAll(() => databases.close());

const countIn = async (db: Executor, table: string) => {
  const { rows } = await db.execute(sql`select count(*)::int as count from ${sql.identifier(table)}`);
  return (rows[0] as { count: number }).count;
};
const tenantTables = () => tables.filter(({ isTenants }) => isTenants).map(({ name }) => name);
const codeOf = async (work: Promise<unknown>) => {
  try {
    await work;
    return 'done';
  } catch (error) {
    return ((error as Error).cause as { code?: string } | undefined)?.code;
  }
};
/** Changed by nobody or refused outright, which comes to the same. */
const untouched = (outcome: number | string | undefined | null) => outcome === 0 || outcome === '42501';

describe('row-level security', () => {
  test('is on for every table but those that belong to no organisation and hold no person', () => {
    expect(tables.filter(({ secured }) => !secured).map(({ name }) => name)).toEqual(['attempt', 'upstream_edition']);
  });

  test('holds for the owner too, except where its functions look people up before they are signed in, search, or verify a dossier by its hash', () => {
    expect(tables.filter(({ secured, forced }) => secured && !forced).map(({ name }) => name)).toEqual(['api_token', 'dossier_seal', 'idempotent_answer', 'invitation', 'membership', 'organisation', 'password_reset', 'person', 'search_entry']);
  });

  test('gives the application a role that can neither bypass it nor switch it off', async () => {
    const { rows } = await databases.app.execute(sql`
      select rolsuper, rolbypassrls, (select count(*)::int from pg_class where relowner = r.oid) as owns from pg_roles r where rolname = current_user`);
    expect(rows).toEqual([{ rolsuper: false, rolbypassrls: false, owns: 0 }]);
    expect(await codeOf(databases.app.execute(sql`alter table site disable row level security`))).toBe('42501');
  });
});

describe('a query that forgets its organisation', () => {
  test('returns nothing, of any table', async () => {
    for (const table of tenantTables()) expect([table, await countIn(databases.app, table)]).toEqual([table, 0]);
    expect(await countIn(databases.app, 'organisation')).toBe(0);
    expect(await countIn(databases.app, 'person').catch(() => 0)).toBe(0);
  });

  test('returns nothing after a transaction that had one either, on the same connection', async () => {
    await asTenant(databases.app, { organisationId: ours.organisationId }, (tx) => countIn(tx, 'site'));
    for (let i = 0; i < 5; i++) expect(await databases.app.select().from(site)).toEqual([]);
  });

  test('changes nothing', async () => {
    for (const table of tenantTables()) {
      const outcome = await databases.app
        .execute(sql`update ${sql.identifier(table)} set organisation_id = organisation_id`)
        .then(({ rowCount }) => rowCount, (error: Error) => (error.cause as { code?: string }).code);
      expect([table, untouched(outcome)]).toEqual([table, true]);
    }
  });
});

describe('with an organisation set', () => {
  const asOurs = <T>(work: Parameters<typeof asTenant<T>>[2]) => asTenant(databases.app, { organisationId: ours.organisationId }, work);

  test('its rows are seen and no others, in every table', async () => {
    for (const table of tenantTables()) {
      const { rows } = await asOurs((tx) => tx.execute(sql`select distinct organisation_id as id from ${sql.identifier(table)}`));
      expect([table, rows]).toEqual([table, [{ id: ours.organisationId }]]);
    }
  });

  test('no row can be written into another, and none moved there', async () => {
    const row = { organisationId: theirs.organisationId, id: newId(), name: 'Smuggled', timeZone: 'UTC' };
    expect(await codeOf(asOurs((tx) => tx.insert(site).values(row)))).toBe('42501');
    expect(await codeOf(asOurs((tx) => tx.update(site).set({ organisationId: theirs.organisationId })))).toBe('42501');
    const { rowCount } = await asOurs((tx) => tx.execute(sql`update site set name = 'Ours' where organisation_id = ${theirs.organisationId}`));
    expect(rowCount).toBe(0);
  });

  test('a row of another cannot be pointed at', async () => {
    const unit = { organisationId: ours.organisationId, id: newId(), siteId: theirs.siteId };
    const insert = sql`insert into unit (organisation_id, id, site_id, fleet_number, country, vehicle_kind) values (${unit.organisationId}, ${unit.id}, ${unit.siteId}, 'X', 'US', 'truck')`;
    expect(await codeOf(asOurs((tx) => tx.execute(insert)))).toBe('23503');
  });

  test('people of other organisations are not to be seen', async () => {
    const { rows } = await asOurs((tx) => tx.execute(sql`select id from person`));
    expect(rows).toEqual([{ id: ours.personId }]);
  });

  test('a colleague cannot be changed, only oneself', async () => {
    const colleague = await ours.addPerson();
    const renameAs = (personId: string) =>
      asTenant(databases.app, { organisationId: ours.organisationId, personId }, async (tx) => (await tx.execute(sql`update person set name = 'Changed' where id = ${colleague.person.id}`)).rowCount);
    expect(await renameAs(ours.personId)).toBe(0);
    expect(await renameAs(colleague.person.id)).toBe(1);
  });

  test('sessions of somebody in another organisation cannot be ended', async () => {
    const { rows } = await asOurs((tx) => tx.execute(sql`select raise_session_version(${theirs.personId}) as raised`));
    expect(rows).toEqual([{ raised: false }]);
  });
});

describe('rights of the application', () => {
  const rightsOn = async (right: string) => {
    const { rows } = await databases.app.execute(sql`
      select c.relname as name from pg_class c join pg_namespace n on n.oid = c.relnamespace
      where n.nspname = 'public' and c.relkind = 'r' and (has_table_privilege(c.oid, ${right}) or has_any_column_privilege(c.oid, case when ${right} in ('SELECT', 'INSERT', 'UPDATE') then ${right} else 'UPDATE' end) and ${right} in ('SELECT', 'INSERT', 'UPDATE')) order by 1`);
    return (rows as { name: string }[]).map(({ name }) => name);
  };

  test('let it delete counts of tries and one’s own bookmarks, and nothing else', async () => {
    expect(await rightsOn('DELETE')).toEqual(['attempt', 'saved_view']);
    expect(await rightsOn('TRUNCATE')).toEqual([]);
  });

  test('let it change what has a present state, and no record', async () => {
    expect(await rightsOn('UPDATE')).toEqual(['adopted_limit', 'api_token', 'attachment', 'attempt', 'baseline_set', 'break_in_run', 'case', 'claim', 'compressor_model', 'core_credit', 'dossier', 'fit', 'fitting', 'gate', 'gate_passage', 'invitation', 'mail', 'membership', 'notice', 'notice_preference', 'oil_catch', 'oil_weighing', 'organisation', 'person', 'repair', 'saved_view', 'site', 'unit', 'unit_hold', 'watch', 'watch_link', 'watch_reading']);
  });

  test('let it add no organisation, person or membership, and not touch password links', async () => {
    const insertable = await rightsOn('INSERT');
    for (const table of ['organisation', 'person', 'membership', 'password_reset', 'upstream_edition']) expect(insertable).not.toContain(table);
    expect(await rightsOn('SELECT')).not.toContain('password_reset');
  });

  test('keep password hashes from every query', async () => {
    expect(await codeOf(databases.app.execute(sql`select password_hash from person`))).toBe('42501');
    expect(await codeOf(databases.app.execute(sql`select * from person`))).toBe('42501');
  });

  test('keep its functions to itself, with a pinned search path', async () => {
    const { rows } = await databases.owner.execute(sql`
      select p.proname, p.proconfig, has_function_privilege('public', p.oid, 'execute') as open
      from pg_proc p join pg_namespace n on n.oid = p.pronamespace where n.nspname = 'public' and p.prosecdef`);
    expect(rows.length).toBeGreaterThan(8);
    for (const row of rows) expect(row).toMatchObject({ proconfig: ['search_path=pg_catalog, pg_temp'], open: false });
  });
});
