import { existsSync } from 'node:fs';
import { Problem } from './problem.mjs';
import { CommandFailed } from './processes.mjs';

/** @param {string} packageName */
export const aptLine = (packageName) => `apt-get update && apt-get install -y ${packageName}`;

/**
 * Installs a system package when this user may, and otherwise names the one line that does.
 * @param {import('./processes.mjs').ProcessKeeper} processes
 * @param {{ packageName: string, missing: string, elsewhere: string }} wanted `missing` is the sentence that says what
 *   isn't there; `elsewhere` the way out on a system without apt
 */
export async function aptInstall(processes, { packageName, missing, elsewhere }) {
  if (!existsSync('/usr/bin/apt-get')) throw new Problem(missing, elsewhere);
  if (process.getuid?.() !== 0) throw new Problem(missing, `Install it, then run the command again: sudo sh -c '${aptLine(packageName)}'`);
  try {
    await processes.run(`apt-${packageName}`, 'sh', ['-c', aptLine(packageName)], { cwd: '/', env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' } });
  } catch (error) {
    if (!(error instanceof CommandFailed)) throw error;
    throw new Problem(`${missing} Installing it failed: ${error.message}`, `Put that right, check it with "${aptLine(packageName)}" and run the command again.`);
  }
}
