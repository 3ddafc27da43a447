import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type axe from 'axe-core';
import type { Page } from 'playwright-core';
import { expect } from 'vitest';

const source = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

/** axe leaves this WCAG 2.2 rule off by default. */
const options = { rules: { 'target-size': { enabled: true } } };

/**
 * Expects an accessible page, or part of one. The script is evaluated through the debugger: a script element would be
 * stopped by the content security policy, rightly.
 */
export async function expectNoAxeViolations(page: Page, selector = 'html') {
  await page.evaluate(source);
  const { violations } = await page.evaluate(
    ([within, settings]) => (window as unknown as { axe: typeof axe }).axe.run(within, settings),
    [selector, options] as const,
  );
  const readable = violations.map(({ id, help, nodes }) => `${id}: ${help}\n${nodes.map(({ html, failureSummary }) => `  ${html}\n  ${failureSummary ?? ''}`).join('\n')}`);
  expect(readable, `accessibility of ${page.url()}`).toEqual([]);
}
