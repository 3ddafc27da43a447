import { join } from 'node:path';
import type { Page } from 'playwright-core';
import type { Shot } from './pages';

export const SIZES = [
  { name: 'phone', width: 390, height: 844 },
  { name: 'tablet', width: 820, height: 1180 },
  { name: 'desktop', width: 1280, height: 900 },
] as const;

const THEMES = ['light', 'dark'] as const;

export interface Taken {
  name: string;
  path: string;
  as: string;
  files: { file: string; caption: string; width: number }[];
}

/** Goes to the page once, and pictures it whole in every size and theme. */
export async function take(page: Page, url: string, { name, as }: Shot, folder: string): Promise<Taken> {
  await page.setViewportSize(SIZES[0]);
  await page.goto(url);
  // The outline of a page that is still fetched has no heading, and neither has one that leads elsewhere.
  await page.locator('h1').waitFor();
  await page.evaluate(() => document.fonts.ready);
  const files: Taken['files'] = [];
  for (const size of SIZES) {
    await page.setViewportSize(size);
    for (const theme of THEMES) {
      await page.emulateMedia({ colorScheme: theme, reducedMotion: 'reduce' });
      const file = `${name}.${size.name}.${theme}.png`;
      await page.screenshot({ path: join(folder, file), fullPage: true, animations: 'disabled' });
      files.push({ file, caption: `${size.name}, ${theme}`, width: size.width });
    }
  }
  const { pathname, search } = new URL(url);
  return { name, path: pathname + search, as, files };
}
