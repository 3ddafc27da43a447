import type { Page } from 'playwright-core';

/** As far as anybody would tab before giving up on a page. */
const MOST_TABS = 250;

/** What the focused element is called, near enough to what a screen reader says. */
const focusedName = (page: Page): Promise<string> =>
  page.evaluate(() => {
    const element = document.activeElement;
    // Between the last and the first stop the page itself has the focus.
    if (!element || element === document.body) return '';
    const labels = element instanceof HTMLInputElement || element instanceof HTMLSelectElement || element instanceof HTMLTextAreaElement ? element.labels : null;
    const label = labels && labels.length > 0 ? [...labels].map(({ textContent }) => textContent).join(' ') : element.textContent;
    return (element.getAttribute('aria-label') ?? label ?? '').replace(/\s+/g, ' ').trim();
  });

/** Presses Tab until something with that name has the focus. */
export async function tabTo(page: Page, name: RegExp): Promise<void> {
  const seen: string[] = [];
  for (let presses = 0; presses < MOST_TABS; presses += 1) {
    await page.keyboard.press('Tab');
    const focused = await focusedName(page);
    if (name.test(focused)) return;
    seen.push(focused.slice(0, 40));
  }
  throw new Error(`Tab never reached ${name} on ${page.url()}; it passed ${[...new Set(seen)].join(' | ')}`);
}

/** Walks by arrow keys from the first place, by the fewest steps, until something with that name has the focus. */
export async function walkTo(page: Page, name: RegExp): Promise<void> {
  const ways: string[][] = [[]];
  const seen = new Set<string>();
  for (const way of ways) {
    await page.keyboard.press('Home');
    for (const key of way) await page.keyboard.press(key);
    const focused = await focusedName(page);
    if (name.test(focused)) return;
    if (seen.has(focused)) continue;
    seen.add(focused);
    ways.push(...['ArrowRight', 'ArrowDown', 'ArrowLeft', 'ArrowUp'].map((key) => [...way, key]));
  }
  throw new Error(`No arrow key led to ${name} on ${page.url()}; they led to ${[...seen].join(' | ')}`);
}

/** Tabs there and presses Enter, or another key. */
export async function press(page: Page, name: RegExp, key = 'Enter'): Promise<void> {
  await tabTo(page, name);
  await page.keyboard.press(key);
}

/** Tabs there and types. */
export async function type(page: Page, name: RegExp, text: string): Promise<void> {
  await tabTo(page, name);
  await page.keyboard.type(text);
}
