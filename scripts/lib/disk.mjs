import { existsSync, statfsSync } from 'node:fs';
import { dirname } from 'node:path';
import { Problem } from './problem.mjs';

const MB = 1024 * 1024;

/** Room wanted before packages are installed and the app is built, and before merely starting again. */
export const ROOM_FOR_INSTALL_MB = 1_500;
export const ROOM_FOR_START_MB = 200;

/**
 * @param {number} freeMb
 * @param {number} neededMb
 * @param {string} folder
 */
export function requireRoom(freeMb, neededMb, folder) {
  if (freeMb >= neededMb) return;
  throw new Problem(
    `Only ${Math.floor(freeMb)} MB are free on the disk that holds ${folder}, and ${neededMb} MB are needed.`,
    'Free some space and run the command again.',
  );
}

/** Free space for an ordinary user on the disk that holds the folder, which need not exist yet. @param {string} folder */
export function freeMb(folder) {
  let existing = folder;
  while (!existsSync(existing)) existing = dirname(existing);
  const { bavail, bsize } = statfsSync(existing);
  return (bavail * bsize) / MB;
}
