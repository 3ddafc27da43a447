import { linkSync, mkdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { readIfThere } from './files.mjs';
import { findLauncher } from './launcher.mjs';
import { identityOf, isRunning } from './process-identity.mjs';
import { Problem } from './problem.mjs';

/**
 * A holder whose npm was killed is about to stop.
 * @typedef {{ release: () => void } | { heldBy: number, isStopping: boolean }} LockAnswer
 */

/**
 * Takes a lock for this process. One whose holder is gone is taken over. The file appears with its content in one step
 * (a link), so nobody ever reads half of one.
 * @param {string} lock
 * @returns {LockAnswer}
 */
function tryLock(lock) {
  mkdirSync(dirname(lock), { recursive: true });
  const mine = `${lock}.${process.pid}`;
  writeFileSync(mine, JSON.stringify({ ...identityOf(process.pid), launcher: findLauncher() }));
  try {
    for (;;) {
      try {
        linkSync(mine, lock);
        return { release: () => rmSync(lock, { force: true }) };
      } catch (error) {
        if (error.code !== 'EEXIST') throw error;
      }
      const text = readIfThere(lock);
      const holder = text === undefined ? undefined : JSON.parse(text);
      if (holder && isRunning(holder)) return { heldBy: holder.pid, isStopping: holder.launcher !== undefined && !isRunning(holder.launcher) };
      // Renaming takes away one stale file exactly; another process that does the same finds nothing and tries again.
      try {
        renameSync(lock, `${mine}.stale`);
      } catch (error) {
        if (error.code !== 'ENOENT') throw error;
      }
    }
  } finally {
    rmSync(mine, { force: true });
    rmSync(`${mine}.stale`, { force: true });
  }
}

/**
 * Makes sure that one command at a time works on this folder's cluster and build.
 * @param {string} lock
 * @param {string} wayOut what to do when another one is at it
 * @returns {Promise<() => void>} gives the lock back
 */
export async function takeStartLock(lock, wayOut) {
  for (;;) {
    const answer = tryLock(lock);
    if ('release' in answer) return answer.release;
    if (!answer.isStopping) throw new Problem(`Carryover already runs from this folder (process ${answer.heldBy}).`, `${wayOut} (From elsewhere: kill ${answer.heldBy})`);
    await sleep(200);
  }
}

/**
 * Does the work when nobody else is at it, waiting for them if need be.
 * @template T
 * @param {string} lock
 * @param {() => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function oneAtATime(lock, work) {
  let answer = tryLock(lock);
  while (!('release' in answer)) {
    await sleep(200);
    answer = tryLock(lock);
  }
  try {
    return await work();
  } finally {
    answer.release();
  }
}
