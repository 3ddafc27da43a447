import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { readIfThere } from './files.mjs';
import { beganAt, commandOf } from './process-identity.mjs';

const PATIENCE_MS = 10_000;

/**
 * Clears what a crashed or killed server left in its data folder. PostgreSQL itself refuses to start when the lock's
 * process id has meanwhile gone to any other process, so the lock is compared with what really runs: a server of this
 * very folder is stopped, anything else means that the lock is stale.
 * @param {string} data
 */
export async function clearStalePostmaster(data) {
  const lock = join(data, 'postmaster.pid');
  const pid = Number(readIfThere(lock)?.split('\n')[0]);
  if (!Number.isInteger(pid) || pid <= 0) {
    rmSync(lock, { force: true });
    return;
  }
  const ours = () => beganAt(pid) !== undefined && /postgres/.test(commandOf(pid)) && commandOf(pid).includes(data);
  const began = performance.now();
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGQUIT'])) {
    if (ours()) process.kill(pid, signal);
    while (ours() && performance.now() - began < PATIENCE_MS) await sleep(25);
  }
  if (!ours()) rmSync(lock, { force: true });
}
