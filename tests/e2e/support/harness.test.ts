import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { expectNoAxeViolations } from './axe';
import { launchBrowser, SIZES } from './browser';
import { startServer, type TestServer } from './server';

describe('the built application in a browser', () => {
  let server: TestServer;
  let browser: Browser;
  beforeAll(async () => {
    [server, browser] = await Promise.all([startServer(), launchBrowser()]);
  });
  afterAll(() => Promise.all([browser?.close(), server?.stop()]));

  it.each(SIZES)('opens the first page on a %s, accessible and without a complaint in the console', async (_name, size) => {
    const context = await browser.newContext(size);
    const page = await context.newPage();
    const complaints: string[] = [];
    page.on('pageerror', (error) => complaints.push(error.message));
    page.on('console', (message) => message.type() === 'error' && complaints.push(message.text()));
    const response = await page.goto(server.url, { waitUntil: 'networkidle' });
    expect(response?.status()).toBe(200);
    expect(await page.getByRole('heading', { level: 1 }).count()).toBe(1);
    await expectNoAxeViolations(page);
    expect(complaints).toEqual([]);
    await context.close();
  });
});
