import { mkdirSync } from 'node:fs';
import { freeMb, requireRoom, ROOM_FOR_INSTALL_MB, ROOM_FOR_START_MB } from './disk.mjs';
import { install, isInstalled } from './install.mjs';
import { root } from './paths.mjs';
import { stopOrphans } from './processes.mjs';

/**
 * What every command does first: stop what a killed run left behind, look at the room on the disk, install the packages.
 * @param {import('./private-database.mjs').Run} run
 * @param {{ runFolder: string, logFolder: string }} folders
 */
export async function prepare({ processes, steps }, { runFolder, logFolder }) {
  mkdirSync(logFolder, { recursive: true });
  const orphans = await stopOrphans(runFolder);
  if (orphans.length > 0) steps.line(`  stopped what an earlier run left behind: ${[...new Set(orphans)].join(', ')}`);
  const installed = isInstalled();
  requireRoom(freeMb(root), installed ? ROOM_FOR_START_MB : ROOM_FOR_INSTALL_MB, root);
  if (!installed) await steps.step('installing the packages of the lock file', () => install(processes));
}
