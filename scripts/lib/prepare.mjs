import { mkdirSync } from 'node:fs';
import { freeMb, requireRoom, ROOM_FOR_INSTALL_MB, ROOM_FOR_START_MB } from './disk.mjs';
import { install, isInstalled } from './install.mjs';
import { oneAtATime } from './lock-file.mjs';
import { local, root, test } from './paths.mjs';
import { stopOrphans } from './processes.mjs';

/**
 * What every command does first: stop what killed runs left behind, look at the room on the disk, install the packages.
 * `npm start` and `npm test` may do so at the same time, so one installs and the other waits.
 * @param {import('./private-database.mjs').Run} run
 */
export async function prepare({ processes, steps }) {
  mkdirSync(local.log, { recursive: true });
  const orphans = [...(await stopOrphans(local.run)), ...(await stopOrphans(test.run))];
  if (orphans.length > 0) steps.line(`  stopped what an earlier run left behind: ${[...new Set(orphans)].join(', ')}`);
  requireRoom(freeMb(root), isInstalled() ? ROOM_FOR_START_MB : ROOM_FOR_INSTALL_MB, root);
  if (isInstalled()) return;
  await steps.step('installing the packages of the lock file', () =>
    oneAtATime(local.installLock, async () => {
      if (!isInstalled()) await install(processes);
    }),
  );
}
