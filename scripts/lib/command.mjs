import { whenLauncherEnds } from './launcher.mjs';
import { root } from './paths.mjs';
import { explain } from './problem.mjs';
import { processKeeper } from './processes.mjs';
import { stepPrinter } from './steps.mjs';

const SIGNALS = /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP']);
const STOPPED_EARLY = 130;

/**
 * Runs one of the project's commands: whatever way it ends, everything that it started is stopped first.
 * @param {string} runFolder where records of its processes are kept
 * @param {(run: import('./private-database.mjs').Run & { untilStopped: () => Promise<number> }) => Promise<number>} work
 *   answers the exit code
 * @param {() => void} [afterwards] runs last, when everything is stopped
 */
export async function runCommand(runFolder, work, afterwards = () => undefined) {
  const processes = processKeeper(runFolder);
  const steps = stepPrinter();
  /** @type {(code: number) => void} */
  let stop = () => undefined;
  /** @type {Promise<number>} */
  const stopped = new Promise((resolve) => (stop = resolve));
  let isUp = false;
  for (const signal of SIGNALS) process.on(signal, () => stop(isUp ? 0 : STOPPED_EARLY));
  whenLauncherEnds(() => stop(STOPPED_EARLY));
  // The reader of our output went away (npm start | head): there is nobody to serve any more.
  process.stdout.on('error', () => stop(STOPPED_EARLY));

  const untilStopped = () => {
    isUp = true;
    return stopped;
  };
  const failed = (/** @type {unknown} */ error) => {
    if (processes.stopping) return STOPPED_EARLY;
    steps.breakOff();
    console.error(explain(error, root));
    return 1;
  };
  const code = await Promise.race([work({ processes, steps, untilStopped }).catch(failed), stopped.finally(() => steps.line('Stopping.'))]);
  await processes.stopAll();
  afterwards();
  process.exit(code);
}
