import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { Problem } from './problem.mjs';

/** The oldest major version that the migrations are written for. */
export const OLDEST_POSTGRES = 15;

/** @typedef {{ folder: string, major: number }} PostgresBinaries */

/** @param {string} folder @returns {PostgresBinaries | undefined} */
function inspect(folder) {
  if (!existsSync(join(folder, 'initdb')) || !existsSync(join(folder, 'postgres'))) return undefined;
  const { stdout } = spawnSync(join(folder, 'postgres'), ['--version'], { encoding: 'utf8' });
  const major = Number(/\(PostgreSQL\) (\d+)/.exec(stdout ?? '')?.[1]);
  return Number.isInteger(major) ? { folder, major } : undefined;
}

/** Folders named after their version, as Debian and Red Hat lay them out. */
function packagedFolders() {
  const debian = '/usr/lib/postgresql';
  const versions = existsSync(debian) ? readdirSync(debian).map((version) => join(debian, version, 'bin')) : [];
  const redHat = existsSync('/usr') ? readdirSync('/usr').filter((name) => /^pgsql-\d+$/.test(name)).map((name) => join('/usr', name, 'bin')) : [];
  return [...versions, ...redHat];
}

/**
 * Finds server binaries: PG_BIN alone when it is set, otherwise the newest (or the major asked for, because a cluster
 * can only be run by the version that made it).
 * @param {Record<string, string | undefined>} environment
 * @param {number} [wantedMajor]
 * @returns {PostgresBinaries | undefined}
 */
export function findPostgres(environment, wantedMajor) {
  if (environment.PG_BIN) {
    const found = inspect(environment.PG_BIN);
    if (found && found.major >= OLDEST_POSTGRES) return found;
    throw new Problem(
      `PG_BIN is ${environment.PG_BIN}, and there are no server programs of PostgreSQL ${OLDEST_POSTGRES} or later in that folder.`,
      'Point PG_BIN at the folder that holds initdb and postgres, or leave it out.',
    );
  }
  const folders = [...packagedFolders(), ...(environment.PATH ?? '').split(delimiter).filter(Boolean), '/usr/local/pgsql/bin'];
  return folders
    .map(inspect)
    .filter((found) => found !== undefined && found.major >= OLDEST_POSTGRES)
    .filter((found) => wantedMajor === undefined || found.major === wantedMajor)
    .sort((a, b) => b.major - a.major)[0];
}

/** What to say when none are found, for apt to put right. */
export const postgresWanted = {
  packageName: 'postgresql',
  missing: `The server programs of PostgreSQL ${OLDEST_POSTGRES} or later are not on this machine.`,
  elsewhere: 'Install them with this system\'s package manager, or set PG_BIN to the folder that holds initdb and postgres.',
};
