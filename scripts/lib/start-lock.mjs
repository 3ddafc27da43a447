import { linkSync, mkdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { readIfThere } from './files.mjs';
import { identityOf, isRunning } from './process-identity.mjs';
import { Problem } from './problem.mjs';

/** @param {string} path @returns {import('./process-identity.mjs').ProcessIdentity | undefined} */
function holderOf(path) {
  const text = readIfThere(path);
  return text === undefined ? undefined : JSON.parse(text);
}

/**
 * Makes sure that one command at a time works on this folder's cluster and build. A lock whose holder is gone is taken
 * over. The file appears with its content in one step (a link), so nobody ever reads half of one.
 * @param {string} folder
 * @returns {() => void} gives the lock back
 */
export function takeStartLock(folder) {
  mkdirSync(folder, { recursive: true });
  const lock = join(folder, 'start.lock');
  const mine = join(folder, `start.lock.${process.pid}`);
  writeFileSync(mine, JSON.stringify(identityOf(process.pid)));
  try {
    for (;;) {
      try {
        linkSync(mine, lock);
        return () => rmSync(lock, { force: true });
      } catch (error) {
        if (error.code !== 'EEXIST') throw error;
      }
      const holder = holderOf(lock);
      if (holder && isRunning(holder)) {
        throw new Problem(
          `Carryover already runs from this folder (process ${holder.pid}).`,
          'Use that one, or stop it with Ctrl-C first; a second copy needs a folder of its own.',
        );
      }
      // Renaming takes away one stale file exactly; another starter that does the same finds nothing and tries again.
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
