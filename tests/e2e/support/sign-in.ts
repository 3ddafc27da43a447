import type { Page } from 'playwright-core';
import { demoSignIns } from '@/scripts/lib/seed.mjs';

/** The demo's first person with the role, as printed by `npm start`. */
export function demoPerson(role: string) {
  const person = demoSignIns().find((signIn) => signIn.role.toLowerCase() === role.toLowerCase());
  if (!person) throw new Error(`The demo has no sign-in for "${role}": db/seed/sign-ins.json lists ${demoSignIns().map((signIn) => signIn.role).join(', ') || 'nobody'}.`);
  return person;
}

/** Signs in through the form, as a person would, and waits until the page behind it is there. */
export async function signIn(page: Page, baseUrl: string, role: string) {
  await signInAs(page, baseUrl, demoPerson(role));
}

/** The same as anybody with an address and a password. */
export async function signInAs(page: Page, baseUrl: string, { email, password }: { email: string; password: string }) {
  await page.goto(`${baseUrl}/sign-in`);
  await page.getByLabel(/e-?mail/i).fill(email);
  await page.getByLabel(/password/i).fill(password);
  await page.getByRole('button', { name: /sign in/i }).click();
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
}
