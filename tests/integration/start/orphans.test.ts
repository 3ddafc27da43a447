import { spawn } from 'node:child_process';
import { existsSync, mkdirSync, mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { oneAtATime, takeStartLock } from '@/scripts/lib/lock-file.mjs';
import { reachableFolder, serverUser } from '@/scripts/lib/postgres-user.mjs';
import { identityOf, isRunning } from '@/scripts/lib/process-identity.mjs';
import { stopOrphans } from '@/scripts/lib/processes.mjs';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'carryover-orphans-'));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

const gone = { pid: 1, began: 'another boot/1' };
function sleeper(marks: Record<string, string> = {}) {
  const { pid } = spawn('sh', ['-c', 'sleep 60 & sleep 60'], { detached: true, stdio: 'ignore', env: { ...process.env, ...marks } });
  if (pid === undefined) throw new Error('sh did not start.');
  return identityOf(pid);
}

function record(name: string, content: object) {
  const path = join(folder, `${name}.pid.json`);
  writeFileSync(path, JSON.stringify({ name, manner: { signal: 'SIGTERM', group: true }, owner: gone, ...content }));
  return path;
}

describe('what a killed run left behind', () => {
  it('is stopped with everything that it started, and its folder removed', async () => {
    const identity = sleeper();
    const rubbish = join(folder, 'rubbish');
    mkdirSync(rubbish);
    const path = record('orphan', { ...identity, removes: rubbish });
    expect(await stopOrphans(folder)).toEqual(['orphan']);
    expect(isRunning(identity)).toBe(false);
    expect([path, rubbish].map((left) => existsSync(left))).toEqual([false, false]);
  });

  it('is left alone when the process id has gone to a stranger', async () => {
    const identity = sleeper();
    record('recycled', { pid: identity.pid, began: `${identity.began}0` });
    expect(await stopOrphans(folder)).toEqual([]);
    expect(isRunning(identity)).toBe(true);
    process.kill(-identity.pid, 'SIGKILL');
  });

  it('is left alone while the run that started it is alive', async () => {
    const identity = sleeper();
    const path = record('in-use', { ...identity, owner: identityOf(process.pid) });
    expect(await stopOrphans(folder)).toEqual([]);
    expect(isRunning(identity) && existsSync(path)).toBe(true);
    process.kill(-identity.pid, 'SIGKILL');
  });

  it('is found by its environment when the run was killed before it could write a record', async () => {
    const mark = (owner: { pid: number; began: string }) => ({ CARRYOVER_STARTED_BY: `${folder}|${owner.pid}|${owner.began}` });
    const [orphan, inUse] = [sleeper(mark(gone)), sleeper(mark(identityOf(process.pid)))];
    expect(await stopOrphans(folder)).toEqual(['a process without a record']);
    expect([orphan, inUse].map(isRunning)).toEqual([false, true]);
    process.kill(-inUse.pid, 'SIGKILL');
  });

  it('may be half a record', async () => {
    writeFileSync(join(folder, 'half.pid.json'), '{"name":"ha');
    expect(await stopOrphans(folder)).toEqual([]);
    expect(readdirSync(folder)).toEqual([]);
  });
});

describe('the lock on a folder', () => {
  it('refuses a second holder, and is taken over from one that is gone', async () => {
    const lock = join(folder, 'start.lock');
    writeFileSync(lock, JSON.stringify(gone));
    const release = await takeStartLock(lock, 'Stop it.');
    await expect(takeStartLock(lock, 'Stop it.')).rejects.toThrow(`Carryover already runs from this folder (process ${process.pid}). Stop it. (From elsewhere: kill ${process.pid})`);
    release();
    (await takeStartLock(lock, 'Stop it.'))();
    expect(readdirSync(folder)).toEqual([]);
  });

  it('makes a second one wait where that is better', async () => {
    const order: string[] = [];
    const lock = join(folder, 'install.lock');
    const work = (name: string) =>
      oneAtATime(lock, async () => {
        order.push(`${name} begins`);
        await new Promise((resolve) => setTimeout(resolve, 50));
        order.push(`${name} ends`);
      });
    await Promise.all([work('first'), work('second')]);
    expect(order).toEqual(['first begins', 'first ends', 'second begins', 'second ends']);
  });
});

describe('the place of the cluster', () => {
  it("is the project's own folder, or one under /var/lib when the server's user may not enter", () => {
    const user = serverUser();
    const own = join(folder, '.local');
    const elsewhere = /^\/var\/lib\/carryover\/carryover-orphans-\w+-[0-9a-f]{8}$/;
    // The temporary folder is closed to everybody but its owner; only root runs the server as somebody else.
    if (user.uid === undefined) expect(reachableFolder(own, user)).toBe(own);
    else expect(reachableFolder(own, user)).toMatch(elsewhere);
  });
});
