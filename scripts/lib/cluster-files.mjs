import { appendFileSync, chmodSync, chownSync, existsSync, mkdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { readIfThere } from './files.mjs';
import { CommandFailed } from './processes.mjs';
import { Problem } from './problem.mjs';

/** Written last into a new cluster; a data folder without it was never finished. */
const MARKER = 'carryover-cluster';

/** Password sign-in over loopback is the only way in. */
const HBA = `# Written by Carryover.\nhost all all 127.0.0.1/32 scram-sha-256\n`;

/**
 * @typedef {{ data: string, binaries: import('./postgres-binaries.mjs').PostgresBinaries,
 *   user: import('./postgres-user.mjs').ServerUser, processes: import('./processes.mjs').ProcessKeeper,
 *   durable: boolean }} ClusterPlace
 *   `durable` false gives up safety against a power cut for speed: for throw-away clusters
 */

/** The major version that made the data folder, or undefined when there is no finished cluster. @param {string} data */
export function clusterMajor(data) {
  if (!existsSync(join(data, MARKER))) return undefined;
  return Number(readIfThere(join(data, 'PG_VERSION'))?.trim());
}

/**
 * Sets the superuser's password without knowing the old one, in the server's single-user mode. The server must be down.
 * @param {ClusterPlace} place
 * @param {string} password
 */
export async function setSuperuserPassword({ data, binaries, user, processes, durable }, password) {
  const args = ['--single', '-D', data, ...(durable ? [] : ['-F']), 'postgres'];
  const sql = `alter role postgres password '${password.replaceAll("'", "''")}';\n`;
  const output = await processes.run('postgres-single', join(binaries.folder, 'postgres'), args, { ...user, cwd: '/', input: sql });
  // Single-user mode ends with code 0 whatever became of the statement.
  if (/ERROR|FATAL/.test(output)) throw new CommandFailed('postgres --single', 0, output);
}

/**
 * Makes a cluster beside its final place and moves it there in one step when it is complete, so that a killed run leaves
 * either a whole cluster or none.
 * @param {ClusterPlace} place
 * @param {string} password the superuser's
 */
export async function makeCluster(place, password) {
  const { data, binaries, user, processes, durable } = place;
  const draft = `${data}.making`;
  rmSync(draft, { recursive: true, force: true });
  mkdirSync(dirname(data), { recursive: true });
  mkdirSync(draft, { mode: 0o700 });
  if (user.uid !== undefined) chownSync(draft, user.uid, user.gid ?? user.uid);
  const initdb = ['-D', draft, '-U', 'postgres', '-E', 'UTF8', '--locale=C.UTF-8', '--auth=trust', ...(durable ? [] : ['--no-sync'])];
  await processes.run('initdb', join(binaries.folder, 'initdb'), initdb, { ...user, cwd: '/' });
  await setSuperuserPassword({ ...place, data: draft }, password);
  writeFileSync(join(draft, 'pg_hba.conf'), HBA);
  appendFileSync(join(draft, 'postgresql.conf'), "\ntimezone = 'UTC'\nlog_timezone = 'UTC'\n");
  writeFileSync(join(draft, MARKER), '');
  chmodSync(join(draft, MARKER), 0o644);
  moveAsideUnfinished(data);
  renameSync(draft, data);
}

/** A data folder that we didn't finish may still be somebody's: it is put aside, never removed. @param {string} data */
function moveAsideUnfinished(data) {
  if (!existsSync(data)) return;
  renameSync(data, `${data}.unfinished-${Date.now()}`);
}

/**
 * @param {string} data
 * @param {number} major
 */
export const wrongVersion = (data, major) =>
  new Problem(
    `The database in ${data} was made by PostgreSQL ${major}, whose server programs are not here.`,
    `Install postgresql-${major} or point PG_BIN at it; or, to begin with an empty database, move that folder away.`,
  );
