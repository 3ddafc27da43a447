import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';
import { Problem } from './problem.mjs';

/** @typedef {{ uid?: number, gid?: number }} ServerUser */

/**
 * Whom the server runs as: PostgreSQL refuses root, so root lends it the system's postgres user. Nobody else may, or
 * need.
 * @returns {ServerUser}
 */
export function serverUser() {
  if (process.getuid?.() !== 0) return {};
  const line = readFileSync('/etc/passwd', 'utf8').split('\n').find((entry) => entry.startsWith('postgres:'));
  if (line === undefined) {
    throw new Problem('PostgreSQL refuses to run as root, and this machine has no user "postgres" to run it as.', 'Create one (useradd --system postgres), or run Carryover as an ordinary user.');
  }
  const [, , uid, gid] = line.split(':');
  return { uid: Number(uid), gid: Number(gid) };
}

/**
 * Whether the server's user may enter the folder.
 * @param {string} folder
 * @param {ServerUser} user
 */
const mayEnter = (folder, user) => user.uid === undefined || spawnSync('test', ['-x', folder], { ...user, cwd: '/' }).status === 0;

/**
 * The folder under which a cluster may live: the project's own, or, when the server's user can't get there (root's home
 * is closed to it), one under /var/lib named after the project. Nobody's home has its modes changed.
 * @param {string} preferred
 * @param {ServerUser} user
 */
export function reachableFolder(preferred, user) {
  if (mayEnter(dirname(preferred), user)) return preferred;
  const project = dirname(preferred);
  const name = `${basename(project)}-${createHash('sha256').update(project).digest('hex').slice(0, 8)}`;
  return join('/var/lib/carryover', name);
}
