import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { requireRoom } from '@/scripts/lib/disk.mjs';
import { parseDotenv, withDotenv } from '@/scripts/lib/dotenv.mjs';
import { appEnvironment, readPlan, SERVICES } from '@/scripts/lib/environment.mjs';
import { nodeVersionProblem } from '@/scripts/lib/node-version.mjs';
import { findPostgres } from '@/scripts/lib/postgres-binaries.mjs';
import { explain } from '@/scripts/lib/problem.mjs';
import { CommandFailed } from '@/scripts/lib/processes.mjs';
import { readCountLine, readVitestReport } from '@/scripts/lib/test-results.mjs';

describe('what is wrong, and the way out', () => {
  it.each([['18.20.4'], ['20.8.1'], ['16.0.0']])('refuses Node %s in one sentence', (version) => {
    expect(nodeVersionProblem(version)).toBe(`Carryover needs Node 20.9 or later and this is Node ${version}. Install Node 20 or later, then run the command again.`);
  });

  it.each([['20.9.0'], ['20.20.2'], ['22.1.0'], ['24.0.0']])('takes Node %s', (version) => expect(nodeVersionProblem(version)).toBeUndefined());

  it('looks at the room on the disk before it begins', () => {
    expect(() => requireRoom(1500, 1500, '/srv/carryover')).not.toThrow();
    expect(() => requireRoom(120.7, 1500, '/srv/carryover')).toThrow('Only 120 MB are free on the disk that holds /srv/carryover, and 1500 MB are needed. Free some space');
  });

  it.each([
    [Object.assign(new Error('ENOSPC: no space left on device, write'), { code: 'ENOSPC' })],
    [new CommandFailed('npm-ci', 228, 'npm error code ENOSPC\nnpm error nospc ENOSPC: no space left on device')],
    [new Error('query failed', { cause: new Error('could not extend file: No space left on device') })],
  ])('knows a full disk wherever it shows', (error) => {
    expect(explain(error, '/srv/carryover')).toMatch(/^The disk that holds \/srv\/carryover is full\.\nFree some space/);
  });

  it('says so when PG_BIN points at nothing', () => {
    expect(() => findPostgres({ PG_BIN: '/nowhere' })).toThrow(/PG_BIN is \/nowhere.*Point PG_BIN at the folder/);
  });
});

describe('what is started here and what is pointed at', () => {
  it('starts everything when nothing is set', () => {
    expect(readPlan({})).toEqual({ anythingSet: false, ownDatabase: true, ownMail: true, ownStorage: true });
  });

  it('wants both addresses of a database or none', () => {
    expect(() => readPlan({ DATABASE_URL: 'postgres://a@b/c' })).toThrow(/DATABASE_URL is set and DATABASE_OWNER_URL isn't/);
  });

  it('names what a production start lacks', () => {
    const all = Object.fromEntries(SERVICES.map((name) => [name, 'set']));
    expect(readPlan({ ...all, CARRYOVER_ENV: 'production' })).toMatchObject({ ownDatabase: false, ownMail: false, ownStorage: false });
    expect(() => readPlan({ ...all, CARRYOVER_ENV: 'production', SMTP_URL: '' })).toThrow(/not set: SMTP_URL\. Set them/);
  });

  it("keeps the owner's address from web and worker, whatever .env says", () => {
    const env = appEnvironment({ DATABASE_URL: 'app', DATABASE_OWNER_URL: 'owner' }, { mode: 'production', port: 3000, nextauthSecret: 's' });
    expect(env).toMatchObject({ DATABASE_URL: 'app', DATABASE_OWNER_URL: '' });
  });

  it('reads .env, and lets the shell win', () => {
    expect(parseDotenv('# note\nA=1 # one\nexport B="two words"\n C = \'3\'\nnonsense\nD=')).toEqual({ A: '1', B: 'two words', C: '3', D: '' });
    const folder = mkdtempSync(join(tmpdir(), 'carryover-env-'));
    writeFileSync(join(folder, '.env'), 'PORT=4000\nMAIL_FROM=a@b\n');
    expect(withDotenv(join(folder, '.env'), { PORT: '5000', EMPTY: '' })).toEqual({ PORT: '5000', MAIL_FROM: 'a@b' });
    expect(withDotenv(join(folder, 'none'), {})).toEqual({});
    rmSync(folder, { recursive: true });
  });
});

describe('the count of npm test', () => {
  let folder: string;
  beforeAll(() => {
    folder = mkdtempSync(join(tmpdir(), 'carryover-report-'));
  });
  afterAll(() => rmSync(folder, { recursive: true }));
  const report = (testResults: unknown[]) => {
    const path = join(folder, 'report.json');
    writeFileSync(path, JSON.stringify({ testResults }));
    return path;
  };
  const ran = (status: string) => ({ fullName: `is ${status}`, status, failureMessages: status === 'failed' ? ['expected 1'] : [] });

  it('counts a skipped test, a broken file and a project without tests as failures', () => {
    const well = { exitedWell: true, output: '' };
    expect(readVitestReport('p', report([{ name: 'a', status: 'passed', message: '', assertionResults: [ran('passed'), ran('skipped')] }]), well)).toMatchObject({ passed: 1, failed: 1 });
    expect(readVitestReport('p', report([{ name: 'a', status: 'failed', message: 'no module', assertionResults: [] }]), well)).toMatchObject({ passed: 0, failed: 1 });
    expect(readVitestReport('p', report([]), well)).toMatchObject({ passed: 0, failed: 1 });
    expect(readVitestReport('p', '/nowhere.json', well)).toMatchObject({ passed: 0, failed: 1 });
  });

  it('fails when everything passed but the run ended badly', () => {
    const path = report([{ name: 'a', status: 'passed', message: '', assertionResults: [ran('passed')] }]);
    expect(readVitestReport('p', path, { exitedWell: false, output: 'Unhandled error' })).toEqual({ passed: 1, failed: 1, failures: [{ title: 'p', text: 'Unhandled error' }] });
  });

  it("takes the fault runs' own last line", () => {
    expect(readCountLine('1 passed, 0 failed\n10 passed, 0 failed\n')).toEqual({ passed: 10, failed: 0, failures: [] });
    expect(readCountLine('9 passed, 1 failed')).toMatchObject({ passed: 9, failed: 1 });
    expect(readCountLine('boom')).toMatchObject({ passed: 0, failed: 1 });
  });
});
