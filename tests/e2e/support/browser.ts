import { chromium, type Browser, type BrowserContextOptions } from 'playwright-core';
import { chromiumWanted, findChromium } from '@/scripts/lib/chromium.mjs';

/** A phone in a gloved hand and the desktop in the office: the two sizes that every main job is proved at. */
export const PHONE = { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true } satisfies BrowserContextOptions;
export const DESKTOP = { viewport: { width: 1280, height: 900 } } satisfies BrowserContextOptions;
export const SIZES = [
  ['phone', PHONE],
  ['desktop', DESKTOP],
] as const;

/** Fails, and never skips, without a browser. */
export function launchBrowser(): Promise<Browser> {
  const executablePath = findChromium();
  if (!executablePath) throw new Error(`${chromiumWanted.missing} ${chromiumWanted.elsewhere}`);
  return chromium.launch({ executablePath });
}
