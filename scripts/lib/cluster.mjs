import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { clusterMajor, makeCluster, setSuperuserPassword } from './cluster-files.mjs';
import { readIfThere } from './files.mjs';
import { freePort, LOOPBACK, untilAccepting } from './ports.mjs';
import { diskFull, Problem } from './problem.mjs';
import { clearStalePostmaster } from './stale-postmaster.mjs';

/** Nobody has to know these; a throw-away cluster also gives up safety against a power cut. */
const THROW_AWAY = ['-c', 'fsync=off', '-c', 'synchronous_commit=off', '-c', 'full_page_writes=off', '-c', 'max_connections=200'];
const STOP = /** @type {const} */ ({ signal: 'SIGINT', group: false });
const PATIENCE_MS = 30_000;

/** @param {{ port: number, user: string, password: string, database: string }} parts */
export const databaseUrl = ({ port, user, password, database }) => `postgres://${user}:${encodeURIComponent(password)}@${LOOPBACK}:${port}/${database}`;

/**
 * What became of an attempt to sign in: PostgreSQL accepts connections before it is ready, and refuses them by code.
 * @param {string} url
 * @returns {Promise<'ready' | 'starting' | 'wrong password'>}
 */
async function trySignIn(url) {
  const { default: pg } = await import('pg');
  const client = new pg.Client({ connectionString: url });
  try {
    await client.connect();
    return 'ready';
  } catch (error) {
    if (error.code === '28P01' || error.code === '28000') return 'wrong password';
    if (error.code === '57P03' || error.code === 'ECONNREFUSED' || error.code === 'ECONNRESET') return 'starting';
    throw error;
  } finally {
    await client.end().catch(() => undefined);
  }
}

/**
 * Starts the server once.
 * @param {import('./cluster-files.mjs').ClusterPlace & { log: string, removes?: string }} place
 * @param {string} password
 */
async function startOnce({ data, binaries, user, processes, log, durable, removes }, password) {
  const logBefore = readIfThere(log)?.length ?? 0;
  const port = await freePort();
  const settings = ['-c', `listen_addresses=${LOOPBACK}`, '-c', `port=${port}`, '-c', 'unix_socket_directories=', ...(durable ? [] : THROW_AWAY)];
  const child = processes.start('postgres', join(binaries.folder, 'postgres'), ['-D', data, ...settings], { ...user, cwd: '/', log, manner: STOP, removes });
  const url = databaseUrl({ port, user: 'postgres', password, database: 'postgres' });
  const said = () => (readIfThere(log) ?? '').slice(logBefore);
  const deadline = performance.now() + PATIENCE_MS;
  while (await untilAccepting(port, child)) {
    const answer = await trySignIn(url);
    if (answer !== 'starting') return { answer, port, url, child, said };
    if (performance.now() > deadline) break;
    await sleep(25);
  }
  return { answer: /** @type {const} */ ('ended'), port, url, child, said };
}

/**
 * Makes the cluster when there is none, clears what a crash left, starts the server and waits until it answers.
 * @param {import('./cluster-files.mjs').ClusterPlace & { log: string, removes?: string }} place
 * @param {string} password the superuser's; set anew when the cluster has another one
 * @returns {Promise<{ port: number, superuserUrl: string, child: import('node:child_process').ChildProcess }>}
 */
export async function startCluster(place, password) {
  if (clusterMajor(place.data) === undefined) await makeCluster(place, password);
  await clearStalePostmaster(place.data);
  const deadline = performance.now() + PATIENCE_MS;
  for (;;) {
    const { answer, port, url, child, said } = await startOnce(place, password);
    if (answer === 'ready') return { port, superuserUrl: url, child };
    if (child.pid !== undefined) await place.processes.stop(child.pid);
    if (answer === 'wrong password') {
      await setSuperuserPassword(place, password);
      continue;
    }
    if (/No space left on device/.test(said())) throw diskFull(place.data);
    // Another program took the port between our look and the start, or the last servers of a killed one are still going.
    const passing = /could not bind|Address already in use|pre-existing shared memory block|is still in use/.test(said());
    if (!passing || performance.now() > deadline) {
      throw new Problem(
        `The database server did not start: ${said().trim().split('\n').filter((line) => /FATAL|PANIC|HINT|ERROR/.test(line)).slice(-2).join(' ') || `see ${place.log}`}.`,
        `Its log is ${place.log}; to begin with an empty database, move ${place.data} away and run the command again.`,
      );
    }
    await sleep(250);
  }
}
