import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { randomBytes } from 'node:crypto';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate as applyMissing } from 'drizzle-orm/node-postgres/migrator';
import pg from 'pg';
import { afterAll, beforeAll, expect, inject, test } from 'vitest';
import { databaseUrl } from '@/scripts/lib/cluster.mjs';
import { inProject } from '@/scripts/lib/paths.mjs';
import { ensureDatabase, roleUrls, withClient } from '@/scripts/lib/roles.mjs';
import { migrate } from '@/scripts/migrate.mjs';

const name = `upgrade_${randomBytes(6).toString('hex')}`;
let superuserUrl: string;
let ownerUrl: string;

beforeAll(async () => {
  const { port, secrets } = inject('testCluster');
  superuserUrl = databaseUrl({ port, user: 'postgres', password: secrets.postgres, database: 'postgres' });
  ({ ownerUrl } = roleUrls(port, secrets, name));
  await ensureDatabase(superuserUrl, name);
});
afterAll(() => withClient(superuserUrl, async (client) => void (await client.query(`drop database if exists ${name} with (force)`))));

/** As a database was before a migration came. */
async function migrateUpTo(last: string) {
  const folder = mkdtempSync(join(tmpdir(), 'carryover-upgrade-'));
  cpSync(inProject('drizzle'), folder, { recursive: true });
  const journal = join(folder, 'meta', '_journal.json');
  const { entries, ...rest } = JSON.parse(readFileSync(journal, 'utf8')) as { entries: { tag: string }[] };
  writeFileSync(journal, JSON.stringify({ ...rest, entries: entries.slice(0, entries.findIndex(({ tag }) => tag === last) + 1) }));
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  await client.query('set client_min_messages = warning');
  await applyMissing(drizzle(client), { migrationsFolder: folder });
  await client.end();
  rmSync(folder, { recursive: true });
}

test('invitations that wait to be mailed when the outbox comes are posted, once each', async () => {
  await migrateUpTo('0011_healthy-baselines-rights');
  const [organisation, person, waiting, withdrawn] = [1, 2, 3, 4].map((n) => `00000000-0000-7000-8000-00000000000${n}`);
  await withClient(ownerUrl, async (client) => {
    await client.query(`insert into organisation (id, name, country, currency, labour_rate_per_hour) values ('${organisation}', 'Fleet', 'US', 'USD', 100)`);
    await client.query(`insert into person (id, name, email) values ('${person}', 'Somebody', 'somebody@people.test')`);
    for (const [id, email] of [[waiting, `'new@people.test'`], [withdrawn, 'null']]) {
      await client.query(`insert into invitation (organisation_id, id, email, roles, expires_at, invited_by) values ('${organisation}', '${id}', ${email}, '{technician}', now() + interval '7 days', '${person}')`);
    }
    for (const [id, state] of [[waiting, 'retry'], [waiting, 'created'], [withdrawn, 'active'], [withdrawn, 'failed']]) {
      await client.query(`insert into pgboss.job (name, data, state) values ('mail-invitation', '{"organisationId": "${organisation}", "invitationId": "${id}"}', '${state}')`);
    }
  });

  await migrate(ownerUrl);

  await withClient(ownerUrl, async (client) => {
    await client.query(`select set_config('app.organisation_id', '${organisation}', false)`);
    const posted = await client.query('select id, kind, to_address, subject, state, entity_id from mail');
    expect(posted.rows).toEqual([{ id: expect.any(String), kind: 'invitation', to_address: 'new@people.test', subject: 'Fleet invites you to Carryover', state: 'waiting', entity_id: waiting }]);
    const jobs = await client.query('select name, data, state::text from pgboss.job');
    expect(jobs.rows).toEqual([{ name: 'send-mail', data: { organisationId: organisation, mailId: posted.rows[0].id }, state: 'created' }]);
    expect((await client.query(`select name from pgboss.queue where name = 'mail-invitation'`)).rows).toEqual([]);
  });
});
