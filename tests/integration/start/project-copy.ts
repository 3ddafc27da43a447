import { spawn, spawnSync, type ChildProcess } from 'node:child_process';
import { chmodSync, cpSync, existsSync, mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { SERVICES } from '@/scripts/lib/environment.mjs';
import { root } from '@/scripts/lib/paths.mjs';

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
  return { folder, remove: () => rmSync(folder, { recursive: true, force: true }) };
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

/** Runs what `npm start` runs. */
export function runStart(folder: string, port: number): RunningStart {
  const child = spawn(process.execPath, ['scripts/start.mjs'], { cwd: folder, env: environment(port), stdio: ['ignore', 'pipe', 'pipe'] });
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

/** The command lines of everything that runs out of the folder. */
export function processesOf(folder: string): string[] {
  return readdirSync('/proc')
    .filter((entry) => /^\d+$/.test(entry))
    .map((pid) => {
      try {
        const isZombie = / Z /.test(readFileSync(`/proc/${pid}/stat`, 'utf8').replace(/\(.*\)/, ''));
        return isZombie ? '' : readFileSync(`/proc/${pid}/cmdline`, 'utf8').replaceAll('\0', ' ');
      } catch {
        return '';
      }
    })
    .filter((command) => command.includes(folder));
}
