import { randomBytes } from 'node:crypto';
import { chownSync, mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { migrate } from '../migrate.mjs';
import { databaseUrl, startCluster } from './cluster.mjs';
import { requirePostgres } from './private-database.mjs';
import { serverUser } from './postgres-user.mjs';
import { ensureDatabase, ensureRoles, roleUrls, withClient } from './roles.mjs';
import { makeSecrets } from './secrets.mjs';

/** @typedef {{ port: number, secrets: ReturnType<typeof makeSecrets> }} TestCluster plain data, to hand to other processes */
/** @typedef {{ name: string, ownerUrl: string, appUrl: string, superuserUrl: string }} TestDatabase */

/**
 * Starts a cluster with its two roles in a folder of the system's own for such things, which the next run removes even
 * when this one is killed.
 * @param {import('./private-database.mjs').Run} run
 * @returns {Promise<TestCluster>}
 */
export async function startThrowAwayCluster(run) {
  const binaries = await requirePostgres(run);
  const user = serverUser();
  const secrets = makeSecrets();
  const folder = mkdtempSync(join(tmpdir(), 'carryover-test-'));
  if (user.uid !== undefined) chownSync(folder, user.uid, user.gid ?? user.uid);
  const place = { data: join(folder, 'postgres'), binaries, user, processes: run.processes, durable: false, log: join(folder, 'postgres.log'), removes: folder };
  const { port, superuserUrl } = await startCluster(place, secrets.postgres);
  await ensureRoles(superuserUrl, secrets);
  return { port, secrets };
}

/** @param {TestCluster} cluster @param {string} [database] */
const superuserUrl = ({ port, secrets }, database = 'postgres') => databaseUrl({ port, user: 'postgres', password: secrets.postgres, database });

/** @param {string} kind */
const freshName = (kind) => `${kind}_${randomBytes(6).toString('hex')}`;

/** @param {TestCluster} cluster @param {string} name @returns {TestDatabase} */
const addresses = (cluster, name) => ({ name, ...roleUrls(cluster.port, cluster.secrets, name), superuserUrl: superuserUrl(cluster, name) });

/**
 * Makes a database to copy from: migrated, and filled by `fill` when that is given. Afterwards nobody can connect to it,
 * because PostgreSQL refuses to copy a database that somebody is connected to.
 * @param {TestCluster} cluster
 * @param {(database: TestDatabase) => Promise<void>} [fill]
 * @returns {Promise<string>} its name
 */
export async function makeTemplate(cluster, fill) {
  const name = freshName('template');
  await ensureDatabase(superuserUrl(cluster), name);
  const database = addresses(cluster, name);
  await migrate(database.ownerUrl);
  await fill?.(database);
  await withClient(superuserUrl(cluster), (client) => client.query(`alter database ${name} with allow_connections false`));
  return name;
}

/**
 * Copies a template: some tens of milliseconds.
 * @param {TestCluster} cluster
 * @param {string} template
 * @returns {Promise<TestDatabase & { drop: () => Promise<void> }>}
 */
export async function copyTemplate(cluster, template) {
  const name = freshName('test');
  await withClient(superuserUrl(cluster), async (client) => {
    await client.query(`create database ${name} template ${template} owner carryover_owner`);
    await client.query(`revoke all on database ${name} from public`);
    await client.query(`grant connect, temporary on database ${name} to carryover_app`);
  });
  const drop = () => withClient(superuserUrl(cluster), async (client) => void (await client.query(`drop database if exists ${name} with (force)`)));
  return { ...addresses(cluster, name), drop };
}
