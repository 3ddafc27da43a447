import { spawn } from 'node:child_process';
import { closeSync, mkdirSync, openSync, readFileSync, readdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { groupIsRunning, identityOf, isRunning, processesMarked } from './process-identity.mjs';

/**
 * How a process is asked to stop. PostgreSQL's server stops its own children; everything else is asked as a group.
 * @typedef {{ signal: NodeJS.Signals, group: boolean }} StopManner
 * @typedef {{ name: string, pid: number, began: string, manner: StopManner, removes?: string,
 *   owner: import('./process-identity.mjs').ProcessIdentity }} ProcessRecord
 * @typedef {{ cwd?: string, env?: Record<string, string>, uid?: number, gid?: number, log?: string, input?: string,
 *   show?: boolean, manner?: StopManner, removes?: string }} SpawnOptions
 */

/** @type {StopManner} */
const ORDINARY = { signal: 'SIGTERM', group: true };
const GRACE_MS = 8_000;
/** In the environment of everything that is started: where its record is kept and who started it. */
const MARK = 'CARRYOVER_STARTED_BY';

/** A command that ended badly, with the end of what it printed. */
export class CommandFailed extends Error {
  /** @param {string} name @param {number | null} code @param {string} output */
  constructor(name, code, output) {
    super(`${name} ended with ${code === null ? 'a signal' : `code ${code}`}.\n${output.trim().split('\n').slice(-15).join('\n')}`);
    this.name = 'CommandFailed';
    this.output = output;
  }
}

/** @param {number} pid @param {NodeJS.Signals} signal */
function signalQuietly(pid, signal) {
  try {
    process.kill(pid, signal);
  } catch (error) {
    if (error.code !== 'ESRCH') throw error;
  }
}

/**
 * Stops a process and everything it started, waiting until it is gone.
 * @param {{ pid: number, manner: StopManner }} target
 */
async function stopTree({ pid, manner }) {
  signalQuietly(manner.group ? -pid : pid, manner.signal);
  const deadline = performance.now() + GRACE_MS;
  while (groupIsRunning(pid) && performance.now() < deadline) await sleep(25);
  if (groupIsRunning(pid)) signalQuietly(-pid, 'SIGKILL');
  while (groupIsRunning(pid)) await sleep(25);
}

/** @param {string} folder @returns {{ path: string, record?: ProcessRecord }[]} */
function readRecords(folder) {
  mkdirSync(folder, { recursive: true });
  return readdirSync(folder)
    .filter((file) => file.endsWith('.pid.json'))
    .map((file) => {
      const path = join(folder, file);
      try {
        return { path, record: JSON.parse(readFileSync(path, 'utf8')) };
      } catch {
        return { path };
      }
    });
}

/** @param {string} folder @param {import('./process-identity.mjs').ProcessIdentity} owner */
const markOf = (folder, owner) => [folder, owner.pid, owner.began].join('|');

/**
 * The process groups of killed runs that have no record: a run can be killed between starting a process and writing its
 * record, and that happens.
 * @param {string} folder
 */
const unrecordedGroups = (folder) =>
  new Set(
    processesMarked(MARK)
      .filter(({ value }) => {
        const [place, pid, began] = value.split('|');
        return place === folder && !isRunning({ pid: Number(pid), began });
      })
      .map(({ group }) => group),
  );

/**
 * Stops whatever a killed run left behind. A record whose leader has another beginning belongs to a stranger that got
 * the same process id, and is left alone.
 * @param {string} folder where the records are
 * @returns {Promise<string[]>} the names of what was stopped
 */
export async function stopOrphans(folder) {
  const stopped = [];
  for (const { path, record } of readRecords(folder)) {
    if (record && isRunning(record.owner)) continue;
    const leaderNow = record ? identityOf(record.pid).began : '';
    if (record && (leaderNow === record.began || leaderNow === '') && groupIsRunning(record.pid)) {
      await stopTree(record);
      stopped.push(record.name);
    }
    if (record?.removes) rmSync(record.removes, { recursive: true, force: true });
    rmSync(path, { force: true });
  }
  for (const group of unrecordedGroups(folder)) {
    await stopTree({ pid: group, manner: ORDINARY });
    stopped.push('a process without a record');
  }
  return stopped;
}

/**
 * The processes that one run started. Each is the head of its own process group and leaves a record in the folder, so
 * that the next run can stop it if this one is killed.
 * @param {string} folder
 */
export function processKeeper(folder) {
  mkdirSync(folder, { recursive: true });
  const owner = identityOf(process.pid);
  /** @type {Map<number, { record: ProcessRecord, path: string }>} */
  const kept = new Map();
  let stopping = false;

  /**
   * @param {string} name
   * @param {string} command
   * @param {string[]} args
   * @param {SpawnOptions} [options]
   */
  function start(name, command, args, options = {}) {
    // Work that hasn't noticed yet must not start what nobody would stop.
    if (stopping) throw new Error(`${name} is not started any more: everything is being stopped.`);
    const { log, show = false, manner = ORDINARY, removes, cwd, env, uid, gid } = options;
    const sink = log === undefined ? undefined : openSync(log, 'a');
    const output = sink ?? (show ? 'inherit' : 'pipe');
    const marked = { ...(env ?? process.env), [MARK]: markOf(folder, owner) };
    const child = spawn(command, args, { cwd, env: marked, uid, gid, detached: true, stdio: [options.input === undefined ? 'ignore' : 'pipe', output, output] });
    if (sink !== undefined) closeSync(sink);
    const { pid } = child;
    if (pid !== undefined) {
      const path = join(folder, `${name}-${pid}.pid.json`);
      /** @type {ProcessRecord} */
      const record = { name, ...identityOf(pid), manner, removes, owner };
      writeFileSync(`${path}.new`, JSON.stringify(record));
      renameSync(`${path}.new`, path);
      kept.set(pid, { record, path });
    }
    child.stdin?.end(options.input);
    return child;
  }

  /** @param {number} pid */
  async function stop(pid) {
    const entry = kept.get(pid);
    if (!entry) return;
    await stopTree(entry.record);
    if (entry.record.removes) rmSync(entry.record.removes, { recursive: true, force: true });
    rmSync(entry.path, { force: true });
    kept.delete(pid);
  }

  return {
    start,
    stop,
    get stopping() {
      return stopping;
    },
    /**
     * Runs a command to its end and returns what it printed.
     * @param {string} name
     * @param {string} command
     * @param {string[]} args
     * @param {SpawnOptions} [options]
     * @returns {Promise<string>}
     */
    async run(name, command, args, options = {}) {
      const child = start(name, command, args, options);
      let output = '';
      child.stdout?.on('data', (chunk) => (output += chunk));
      child.stderr?.on('data', (chunk) => (output += chunk));
      child.stdin?.on('error', () => undefined);
      const code = await new Promise((resolve, reject) => {
        child.once('error', reject);
        child.once('close', resolve);
      });
      if (child.pid !== undefined) await stop(child.pid);
      if (code !== 0) throw new CommandFailed(name, code, output);
      return output;
    },
    /** Stops everything, the last started first. */
    async stopAll() {
      stopping = true;
      for (const pid of [...kept.keys()].reverse()) await stop(pid);
    },
  };
}

/** @typedef {ReturnType<typeof processKeeper>} ProcessKeeper */
