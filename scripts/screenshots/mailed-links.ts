import { setTimeout as sleep } from 'node:timers/promises';
import type { Page } from 'playwright-core';
import { demoSignIns } from '../lib/seed.mjs';
import type { Go, Places } from './places';

/** What was sent so far. */
export type Letters = () => Promise<{ links: string[] }[]>;

/** Asks for an invitation and a new password as a person would, and reads the links out of the mail. */
export async function mailedLinks(go: Go, anonymous: Page, base: string, letters: Letters): Promise<Pick<Places, 'invitation' | 'reset'>> {
  const invite = await go('administrator', '/settings/people/invite');
  await invite.getByLabel(/e-?mail/i).fill('new-here@quillmere.test');
  await invite.getByRole('checkbox', { name: /technician/i }).check();
  await invite.getByRole('button', { name: /invit/i }).click();
  const invitation = await linkOf(letters, '/invite/');

  await anonymous.goto(`${base}/reset-password`);
  await anonymous.getByLabel(/e-?mail/i).fill(demoSignIns()[0]?.email ?? '');
  await anonymous.getByRole('main').getByRole('button').first().click();
  return { invitation, reset: await linkOf(letters, '/reset-password/') };
}

async function linkOf(letters: Letters, part: string): Promise<string | undefined> {
  for (let tries = 0; tries < 60; tries += 1) {
    const link = (await letters()).flatMap(({ links }) => links).find((href) => href.includes(part));
    if (link) return new URL(link).pathname;
    await sleep(250);
  }
  return undefined;
}
