import { execFile } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { promisify } from 'node:util';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { expectNoAxeViolations } from './support/axe';
import { DESKTOP, launchBrowser, PHONE } from './support/browser';
import { startServer, type TestServer } from './support/server';
import { signIn } from './support/sign-in';

const run = promisify(execFile);

/** The script of the README, as it stands there. */
function scriptOfReadme(): string {
  const readme = readFileSync(new URL('../../README.md', import.meta.url), 'utf8');
  const [, script] = /## From a script\n[\s\S]*?```bash\n([\s\S]*?)```/.exec(readme) ?? [];
  if (script === undefined) throw new Error('README.md has no block of bash under “From a script”');
  return script;
}

let server: TestServer;
let browser: Browser;
let page: Page;
let token: string;
const complaints: string[] = [];

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), launchBrowser()]);
  page = await (await browser.newContext(DESKTOP)).newPage();
  page.on('pageerror', (error) => complaints.push(error.message));
  page.on('console', (message) => message.type() === 'error' && complaints.push(message.text()));
});
afterAll(() => Promise.all([browser?.close(), server?.stop()]));

const runScript = (env: Record<string, string>) => run('bash', ['--norc', '-euo', 'pipefail', '-c', scriptOfReadme()], { env: { ...process.env, API: `${server.url}/api/v1`, ...env } });

describe('a script with a token', () => {
  it('gets the token from the settings, where it is shown once', async () => {
    await signIn(page, server.url, 'technician');
    await page.goto(`${server.url}/settings/tokens`);
    await page.getByRole('textbox', { name: 'Name' }).fill('The script of the README');
    for (const scope of ['cases:read', 'cases:write', 'units:read']) await page.locator(`input[value="${scope}"]`).check();
    await page.getByRole('button', { name: 'Make the token' }).click();
    await page.getByRole('heading', { name: /The token “The script of the README” is made/ }).waitFor();
    token = (await page.locator('code').filter({ hasText: /^carryover_/ }).textContent()) ?? '';
    expect(token).toMatch(/^carryover_[\w-]{43}$/);
    await expectNoAxeViolations(page);
    await page.reload();
    expect(await page.content()).not.toContain(token);
  });

  it('does the whole main job by curl, as the README has it', async () => {
    await page.goto(`${server.url}/units`);
    const fleetNumber = (await page.locator('tbody th').first().textContent())?.trim() ?? '';
    const { stdout } = await runScript({ TOKEN: token, UNIT: fleetNumber });
    const lines = stdout.trim().split('\n');
    expect(lines.filter((line, i) => !(line.startsWith('Caution: ') && lines[i - 1]?.startsWith('Caution: ')))).toEqual([
      expect.stringMatching(/^Case \d+ is open$/),
      expect.stringMatching(/^Tells most: .+\? ?.*\([a-z0-9-]+(, [a-z0-9-]+)+\)$/),
      expect.stringMatching(/^Caution: /),
      expect.stringMatching(/^Acknowledged: [1-9]$/),
      'Noted: From 85 to 100 psi',
      expect.stringMatching(/^48 s.*: [a-z-]+ leads with \d+ %$/),
      'The case is called',
    ]);
    const number = /^Case (\d+)/.exec(stdout)?.[1] ?? '';
    await page.goto(`${server.url}/cases?q=${number}&status=all`);
    await page.getByRole('link', { name: new RegExp(number) }).first().waitFor();
  });

  it('is told why when its token was revoked', async () => {
    await page.goto(`${server.url}/settings/tokens`);
    await page.getByRole('button', { name: /Revoke the token The script of the README/ }).click();
    await page.getByText('Revoked', { exact: true }).waitFor();
    await expect(runScript({ TOKEN: token, UNIT: 'any' })).rejects.toThrow();
    const answer = await fetch(`${server.url}/api/v1/profile`, { headers: { authorization: `Bearer ${token}` } });
    expect(await answer.json()).toMatchObject({ status: 401, detail: 'This token was revoked. Make a new one under Settings, Tokens.' });
  });
});

describe('the pages of the API', () => {
  async function expectReadable(own: Page) {
    expect(await own.evaluate(() => document.documentElement.scrollWidth <= window.innerWidth)).toBe(true);
    await expectNoAxeViolations(own);
  }

  it.each([['phone', PHONE, 'dark'], ['desktop', DESKTOP, 'light']] as const)('are readable on a %s without a word in the console', async (_, size, colorScheme) => {
    const own = await (await browser.newContext({ ...size, colorScheme })).newPage();
    const said: string[] = [];
    own.on('console', (message) => said.push(message.text()));
    own.on('request', (request) => new URL(request.url()).origin !== server.url && !request.url().startsWith('data:') && said.push(request.url()));
    await own.goto(`${server.url}/api/docs`);
    await own.getByRole('heading', { level: 1, name: 'API' }).waitFor();
    await expectReadable(own);
    await own.getByRole('link', { name: 'Answer a check' }).click();
    await own.getByRole('heading', { level: 3, name: 'Answer a check' }).waitFor();
    expect(new URL(own.url()).hash).toBe('#postCasesIdFindings');
    await expectReadable(own);
    expect(said).toEqual([]);
    await own.context().close();
  });
});

it('none of the pages complained', () => expect(complaints).toEqual([]));
