import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestDatabase } from '@/tests/support/database';

describe('the throw-away cluster', () => {
  let database: Awaited<ReturnType<typeof createTestDatabase>>;
  beforeAll(async () => {
    database = await createTestDatabase();
  });
  afterAll(() => database.drop());

  async function one(url: string, sql: string) {
    const client = new pg.Client({ connectionString: url });
    await client.connect();
    try {
      const { rows } = await client.query<Record<string, unknown>>(sql);
      return rows[0];
    } finally {
      await client.end();
    }
  }

  it('gives the app a role that owns nothing and cannot get round row-level security', async () => {
    const row = await one(
      database.appUrl,
      `select rolname, rolsuper, rolbypassrls, rolcreatedb, rolcreaterole,
              (select count(*)::int from pg_class where relowner = r.oid) as owned
         from pg_roles r where rolname = current_user`,
    );
    expect(row).toEqual({ rolname: 'carryover_app', rolsuper: false, rolbypassrls: false, rolcreatedb: false, rolcreaterole: false, owned: 0 });
  });

  it('lets the owner, and not the app, change the schema', async () => {
    await one(database.ownerUrl, 'create table scratch (id int)');
    await expect(one(database.appUrl, 'drop table scratch')).rejects.toMatchObject({ code: '42501' });
    await expect(one(database.appUrl, 'create table another (id int)')).rejects.toMatchObject({ code: '42501' });
  });

  it('copies databases that are strangers to each other', async () => {
    const other = await createTestDatabase();
    await one(database.ownerUrl, 'create table only_here (id int)');
    await expect(one(other.ownerUrl, 'select * from only_here')).rejects.toMatchObject({ code: '42P01' });
    await other.drop();
  });
});
