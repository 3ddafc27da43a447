import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { readIfThere, writeWhole } from './files.mjs';
import { inProject, root } from './paths.mjs';
import { Problem } from './problem.mjs';
import { CommandFailed } from './processes.mjs';

/** Inside node_modules, because `npm ci` begins by removing that folder: a half-done install has no stamp. */
const stampPath = inProject('node_modules', '.carryover-install');
const lockHash = () => createHash('sha256').update(readFileSync(inProject('package-lock.json'))).digest('hex');

export const isInstalled = () => readIfThere(stampPath)?.trim() === lockHash();

/**
 * Installs the packages of the lock file.
 * @param {import('./processes.mjs').ProcessKeeper} processes
 */
export async function install(processes) {
  const hash = lockHash();
  const npm = process.env.npm_execpath;
  // Development packages are part of it whatever NODE_ENV says: tsx runs the worker.
  const args = ['ci', '--include=dev', '--prefer-offline', '--no-audit', '--no-fund', '--loglevel=error'];
  try {
    if (npm?.endsWith('.js')) await processes.run('npm-ci', process.execPath, [npm, ...args], { cwd: root });
    else await processes.run('npm-ci', 'npm', args, { cwd: root });
  } catch (error) {
    if (!(error instanceof CommandFailed) || /ENOSPC/.test(error.output)) throw error;
    if (/EAI_AGAIN|ENOTFOUND|ECONNREFUSED|ETIMEDOUT|ECONNRESET|network/i.test(error.output)) {
      throw new Problem('The packages could not be fetched: the package registry is out of reach.', 'Connect this machine to the network, or set its proxy for npm, and run the command again.');
    }
    throw new Problem(`The packages could not be installed. ${error.message}`, 'Put right what npm names above and run the command again.');
  }
  writeWhole(stampPath, `${hash}\n`);
}
