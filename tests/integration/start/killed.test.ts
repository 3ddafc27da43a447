import { existsSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { freePort } from '@/scripts/lib/ports.mjs';
import { copyProject, processesOf, runStart, type RunningStart } from './project-copy';

const MINUTES = 60_000;

/**
 * One copy of the project goes through its whole set-up, killed at ten moments of it. Each start has to get past the
 * moment at which the one before was killed, so the last one proves them all; the port stays the same, so an orphan
 * that kept it would be noticed. The tests build on each other in this order.
 */
describe('npm start', () => {
  let copy: ReturnType<typeof copyProject>;
  let port: number;
  const inCopy = (...parts: string[]) => join(copy.folder, ...parts);

  beforeAll(async () => {
    copy = copyProject();
    port = await freePort();
  }, MINUTES);
  afterAll(() => copy.remove(), 5 * MINUTES);

  async function exists(start: RunningStart, path: string) {
    while (!existsSync(path)) {
      if (start.child.exitCode !== null) throw new Error(`npm start ended before ${path} was there:\n${start.output()}`);
      await sleep(2);
    }
  }

  const moments: [moment: string, reached: (start: RunningStart) => Promise<unknown>][] = [
    ['while packages are installed', (start) => start.until(/installing the packages/).then(() => sleep(4_000))],
    ['while initdb fills a cluster', (start) => exists(start, inCopy('.local', 'postgres.making', 'base'))],
    ['when the cluster is made and its server is not up', (start) => exists(start, inCopy('.local', 'postgres', 'PG_VERSION'))],
    ['when the cluster runs', (start) => start.until(/starting the local stand-ins/)],
    ['while mail and storage start', (start) => start.until(/starting the local stand-ins/).then(() => sleep(200))],
    ['when mail and storage run', (start) => start.until(/bringing the database up to date/)],
    ['while the schema is migrated', (start) => start.until(/bringing the database up to date/).then(() => sleep(80))],
    ['while the demo is filled in', (start) => start.until(/filling in the demo/).then(() => sleep(2_000))],
    ['while the app is built', (start) => start.until(/building the app/).then(() => sleep(3_000))],
    ['while the web server starts', (start) => start.until(/starting the web server/).then(() => sleep(300))],
  ];

  it.each(moments)('goes on after being killed %s', async (_moment, reached) => {
    const start = runStart(copy.folder, port);
    try {
      await reached(start);
    } finally {
      start.child.kill('SIGKILL');
    }
    // No exit code: it was the signal that ended it, at the moment meant.
    expect(await start.ended).toBe(null);
  }, 10 * MINUTES);

  it('is up at last, answers, and stops everything on Ctrl-C', async () => {
    const start = runStart(copy.folder, port);
    await start.until(/Carryover is at/);
    const answer = await fetch(`http://127.0.0.1:${port}/sign-in`);
    expect(answer.status).toBe(200);
    start.child.kill('SIGINT');
    expect(await start.ended).toBe(0);
    expect(processesOf(copy.folder)).toEqual([]);
  }, 5 * MINUTES);

  it('skips what is done, also past the stale lock of a crashed cluster', async () => {
    writeFileSync(inCopy('.local', 'postgres', 'postmaster.pid'), `${process.pid}\n${inCopy('.local', 'postgres')}\n`);
    const start = runStart(copy.folder, port);
    await start.until(/Carryover is at/);
    expect(start.output()).not.toMatch(/installing|making|filling|building/);

    const second = runStart(copy.folder, port);
    expect(await second.ended).toBe(1);
    expect(second.output()).toMatch(/already runs from this folder \(process \d+\)\.\nUse that one/);
    const reset = runStart(copy.folder, port, 'node scripts/reset-demo.mjs');
    expect(await reset.ended).toBe(1);
    expect(reset.output()).toMatch(/already runs.*\nStop it with Ctrl-C/);

    start.child.kill('SIGTERM');
    await start.ended;
    expect(processesOf(copy.folder)).toEqual([]);
  }, 5 * MINUTES);

  it('stops when npm is ended, which tells it nothing, and lets the next one in', async () => {
    const killed = runStart(copy.folder, port, 'npm start');
    await killed.until(/Carryover is at/);
    killed.child.kill('SIGKILL');
    const ended = runStart(copy.folder, port, 'npm start');
    await ended.until(/Carryover is at/);
    ended.child.kill('SIGTERM');
    await expect.poll(() => processesOf(copy.folder), { timeout: MINUTES }).toEqual([]);
  }, 5 * MINUTES);

  it('has its demo put back, mail and all', async () => {
    const letter = inCopy('.local', 'mail', '1-0001.eml');
    writeFileSync(letter, 'Subject: old\n\n');
    const reset = runStart(copy.folder, port, 'node scripts/reset-demo.mjs');
    expect([await reset.ended, existsSync(letter)], reset.output()).toEqual([0, false]);
    expect(processesOf(copy.folder)).toEqual([]);
  }, 5 * MINUTES);

  it('names a taken port and the way out', async () => {
    const squatter = createServer().listen(port, '127.0.0.1');
    const start = runStart(copy.folder, port);
    expect(await start.ended).toBe(1);
    expect(start.output()).toContain(`Port ${port} is already in use by another program.`);
    expect(start.output()).toContain(`PORT=${port + 1} npm start`);
    await new Promise((resolve) => squatter.close(resolve));
  }, MINUTES);
});
