import { fork, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { build } from 'vite';
import { inProject, root } from '@/scripts/lib/paths.mjs';

export interface Orders {
  env: Record<string, string>;
  /** In the data of the job that it is to die over. */
  marker: string;
  /** The step of it at which it dies. */
  point: number;
}

export interface Victim {
  child: ChildProcess;
  go(orders: Orders): void;
  /** Steps of its job. */
  steps(): Promise<number>;
  /** The signal that ended it. */
  ended: Promise<NodeJS.Signals | null>;
}

/** Everything that it would inherit but what a worker is told by. */
const bare = (): NodeJS.ProcessEnv => ({ PATH: process.env.PATH, HOME: process.env.HOME, NODE_ENV: 'production' });

/**
 * Workers to be killed: worker/index.ts, built into one file so that hundreds of them can be begun in minutes, each loaded
 * beforehand and waiting for its orders.
 */
export async function openVictims({ ready }: { ready: number }) {
  // Below node_modules, so that its packages are found.
  const folder = mkdtempSync(inProject('node_modules', '.victims-'));
  await build({
    configFile: false,
    root,
    logLevel: 'silent',
    resolve: { alias: { '@': root } },
    // As in production, whatever the tests call themselves.
    oxc: { jsx: { runtime: 'automatic', development: false } },
    build: { ssr: 'worker/index.ts', outDir: folder, target: 'node20', rollupOptions: { output: { entryFileNames: 'worker.mjs' } } },
  });
  const alive = new Set<ChildProcess>();

  async function load(): Promise<Victim> {
    const child = fork(join(folder, 'worker.mjs'), { execArgv: ['--import', inProject('tests', 'kills', 'kill-at.mjs')], env: bare(), stdio: ['ignore', 'ignore', 'inherit', 'ipc'] });
    alive.add(child);
    const ended = once(child, 'exit').then(([, signal]) => (alive.delete(child), signal as NodeJS.Signals | null));
    await Promise.race([once(child, 'message'), ended]);
    return {
      child,
      go: (orders) => void child.send(orders),
      steps: async () => {
        child.send('steps');
        const [steps] = (await once(child, 'message')) as [number];
        return steps;
      },
      ended,
    };
  }

  const loading = Array.from({ length: ready }, load);
  return {
    /** One that is loaded; another begins to load in its place. */
    async take(): Promise<Victim> {
      const next = loading.shift() ?? load();
      loading.push(load());
      return next;
    },
    /** The worker as `npm start` starts it. */
    startAsEver(env: Record<string, string>): ChildProcess {
      const child = fork(inProject('worker', 'index.ts'), { execArgv: ['--import', 'tsx'], cwd: root, env: { ...bare(), ...env }, stdio: ['ignore', 'ignore', 'inherit', 'ipc'] });
      alive.add(child);
      child.once('exit', () => alive.delete(child));
      return child;
    },
    async close() {
      await Promise.allSettled(loading);
      await Promise.all([...alive].map(async (child) => {
        const ended = once(child, 'exit');
        child.kill('SIGKILL');
        await ended;
      }));
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

export type Victims = Awaited<ReturnType<typeof openVictims>>;
