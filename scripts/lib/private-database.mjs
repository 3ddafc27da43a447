import { join } from 'node:path';
import { aptInstall } from './apt.mjs';
import { clusterMajor, wrongVersion } from './cluster-files.mjs';
import { databaseUrl, startCluster } from './cluster.mjs';
import { freeMb, requireRoom, ROOM_FOR_START_MB } from './disk.mjs';
import { local, root } from './paths.mjs';
import { findPostgres, OLDEST_POSTGRES, postgresWanted } from './postgres-binaries.mjs';
import { reachableFolder, serverUser } from './postgres-user.mjs';
import { Problem } from './problem.mjs';
import { DATABASE, ensureDatabase, ensureRoles, roleUrls } from './roles.mjs';

/** @typedef {{ processes: import('./processes.mjs').ProcessKeeper, steps: ReturnType<typeof import('./steps.mjs').stepPrinter> }} Run */

/**
 * The newest server programs on this machine, installed first when there are none and this user may.
 * @param {Run} run
 */
export async function requirePostgres({ processes, steps }) {
  const found = findPostgres(process.env);
  if (found) return found;
  await steps.step('installing PostgreSQL with apt', () => aptInstall(processes, postgresWanted));
  const installed = findPostgres(process.env);
  if (installed) return installed;
  throw new Problem(`The PostgreSQL that apt offers here is older than ${OLDEST_POSTGRES}.`, `Install version ${OLDEST_POSTGRES} or later from another package source, or set PG_BIN.`);
}

/**
 * Starts the private cluster, making it when there is none, with its roles and its database.
 * @param {Run} run
 * @param {ReturnType<typeof import('./secrets.mjs').keptSecrets>} secrets
 */
export async function startPrivateDatabase(run, secrets) {
  // Before the server's user is looked up: on a bare machine apt makes it.
  const newest = await requirePostgres(run);
  const user = serverUser();
  const data = join(reachableFolder(local.folder, user), 'postgres');
  const major = clusterMajor(data);
  const binaries = major === undefined || major === newest.major ? newest : findPostgres(process.env, major);
  if (!binaries) throw wrongVersion(data, major);
  requireRoom(freeMb(data), ROOM_FOR_START_MB, data);
  return run.steps.step(major === undefined ? 'making and starting the database cluster' : 'starting the database cluster', async (say) => {
    const place = { data, binaries, user, processes: run.processes, durable: true, log: join(local.log, 'postgres.log') };
    const { port, superuserUrl, child } = await startCluster(place, secrets.postgres);
    await ensureRoles(superuserUrl, secrets);
    await ensureDatabase(superuserUrl, DATABASE);
    say(data.startsWith(root) ? `127.0.0.1:${port}` : `127.0.0.1:${port}, in ${data}`);
    return {
      child,
      serverUrl: superuserUrl,
      superuserUrl: databaseUrl({ port, user: 'postgres', password: secrets.postgres, database: DATABASE }),
      ...roleUrls(port, secrets, DATABASE),
    };
  });
}
