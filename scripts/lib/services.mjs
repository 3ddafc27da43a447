import { lastLines } from './files.mjs';
import { setTimeout as sleep } from 'node:timers/promises';
import { inProject, root } from './paths.mjs';
import { LOOPBACK, untilAccepting } from './ports.mjs';
import { Problem } from './problem.mjs';

/**
 * Starts the web server and waits for its first answer. Next is run by its own file: `npx next` leaves an orphan.
 * @param {import('./processes.mjs').ProcessKeeper} processes
 * @param {{ command: 'start' | 'dev', port: number, env: Record<string, string>, log?: string }} options without a log
 *   it prints to this terminal
 */
export async function startWeb(processes, { command, port, env, log }) {
  const args = [inProject('node_modules', 'next', 'dist', 'bin', 'next'), command, '--hostname', LOOPBACK, '--port', String(port)];
  const child = processes.start('web', process.execPath, args, { cwd: root, env, log, show: log === undefined });
  // The development server would compile a page for this answer, which may be another one than is wanted.
  const answered = (await untilAccepting(port, child)) && (command === 'dev' || (await firstAnswer(port, child)));
  if (!answered) throw new Problem('The web server did not start.', log ? `The end of its log, ${log}:\n${lastLines(log)}` : 'What it printed above says why.');
  return child;
}

/** @param {number} port @param {import('node:child_process').ChildProcess} child */
async function firstAnswer(port, child) {
  while (child.exitCode === null && child.signalCode === null) {
    const response = await fetch(`http://${LOOPBACK}:${port}/`, { redirect: 'manual' }).catch(() => undefined);
    if (response) return true;
    await sleep(50);
  }
  return false;
}

/**
 * Starts the job worker.
 * @param {import('./processes.mjs').ProcessKeeper} processes
 * @param {{ env: Record<string, string>, log?: string }} options
 */
export const startWorker = (processes, { env, log }) =>
  processes.start('worker', process.execPath, ['--import', 'tsx', inProject('worker', 'index.ts')], { cwd: root, env, log, show: log === undefined });
