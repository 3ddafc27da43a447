import { commandOf, identityOf, isRunning, parentOf } from './process-identity.mjs';

const LOOK_EVERY_MS = 250;

/**
 * The npm that runs this command, or else what stands in its place; nothing when somebody ran the script themselves.
 * npm puts a shell between itself and us, and neither passes on the signal that ends it.
 * @returns {import('./process-identity.mjs').ProcessIdentity | undefined}
 */
export function findLauncher() {
  if (process.env.npm_lifecycle_event === undefined) return undefined;
  const ancestors = [process.ppid, parentOf(process.ppid)];
  return identityOf(ancestors.find((pid) => /\bnpm\b/.test(commandOf(pid))) ?? process.ppid);
}

/**
 * Calls back when the launcher is gone: killing `npm start` has to stop what it started.
 * @param {() => void} gone
 */
export function whenLauncherEnds(gone) {
  const launcher = findLauncher();
  if (launcher) setInterval(() => isRunning(launcher) || gone(), LOOK_EVERY_MS).unref();
}
