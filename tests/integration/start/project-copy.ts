import { spawn, spawnSync, type ChildProcess } from 'node:child_process';
import { chmodSync, cpSync, existsSync, mkdirSync, mkdtempSync, readdirSync, readFileSync, readlinkSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { SERVICES } from '@/scripts/lib/environment.mjs';
import { root } from '@/scripts/lib/paths.mjs';
import { stopOrphans } from '@/scripts/lib/processes.mjs';

const started: ChildProcess[] = [];

/** A clone as somebody else would have it: the project's own files and nothing that was installed or built. */
export function copyProject() {
  const folder = mkdtempSync(join(tmpdir(), 'carryover-start-'));
  // As root the server runs as another user, who must be able to get here.
  chmodSync(folder, 0o755);
  const { stdout } = spawnSync('git', ['ls-files', '-z', '--cached', '--others', '--exclude-standard'], { cwd: root, encoding: 'utf8', maxBuffer: 1 << 26 });
  const files = stdout.split('\0').filter((file) => file !== '' && existsSync(join(root, file)));
  if (files.length === 0) throw new Error('git lists no files of this project.');
  for (const file of files) {
    mkdirSync(dirname(join(folder, file)), { recursive: true });
    cpSync(join(root, file), join(folder, file));
  }
  return {
    folder,
    /** Ends what a failed test left running, then removes the folder. */
    async remove() {
      for (const child of started) child.kill('SIGKILL');
      await stopOrphans(join(folder, '.local', 'run'));
      rmSync(folder, { recursive: true, force: true, maxRetries: 5 });
    },
  };
}

const environment = (port: number): NodeJS.ProcessEnv => {
  const own = Object.fromEntries(Object.entries(process.env).filter(([name]) => ![...SERVICES, 'CARRYOVER_ENV', 'NEXT_DIST_DIR', 'NODE_ENV'].includes(name)));
  // Development packages are installed all the same.
  return { ...own, NODE_ENV: 'production', PORT: String(port) };
};

export interface RunningStart {
  child: ChildProcess;
  output: () => string;
  /** Resolves when the output matches; fails with the output when the command ends before. */
  until(pattern: RegExp): Promise<void>;
  ended: Promise<number | null>;
}

/** Runs what `npm start` runs, so that a signal reaches it itself; or another command. */
export function runStart(folder: string, port: number, command = 'node scripts/start.mjs'): RunningStart {
  const [program = '', ...args] = command.split(' ');
  const child = spawn(program, args, { cwd: folder, env: environment(port), stdio: ['ignore', 'pipe', 'pipe'] });
  started.push(child);
  let output = '';
  child.stdout.on('data', (chunk) => (output += chunk));
  child.stderr.on('data', (chunk) => (output += chunk));
  // Not 'close': orphans of a killed start may hold the pipes open.
  const ended = new Promise<number | null>((resolve) => child.once('exit', resolve));
  const isOver = () => child.exitCode !== null || child.signalCode !== null;
  return {
    child,
    ended,
    output: () => output,
    async until(pattern) {
      while (!pattern.test(output)) {
        if (isOver()) throw new Error(`npm start ended before "${pattern.source}" appeared:\n${output}`);
        await sleep(5);
      }
    },
  };
}

/** The command lines of everything that works in the folder or runs a program or a cluster out of it. */
export function processesOf(folder: string): string[] {
  return readdirSync('/proc')
    .filter((entry) => /^\d+$/.test(entry))
    .flatMap((pid) => {
      try {
        const command = readFileSync(`/proc/${pid}/cmdline`, 'utf8').replaceAll('\0', ' ');
        const worksIn = readlinkSync(`/proc/${pid}/cwd`);
        return command.includes(folder) || worksIn.startsWith(folder) ? [command] : [];
      } catch {
        // It ended while we looked, or it is a zombie: both are gone.
        return [];
      }
    });
}
