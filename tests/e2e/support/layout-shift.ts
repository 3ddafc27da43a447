import type { Page } from 'playwright-core';

/** Shifts of one page that no tap or key of the last half second explains, other than the rows of the ranking: they glide to their new places, which is what they tell. */
export interface Shifts {
  sum: number;
  /** What moved each time, to find out why. */
  moved: string[];
}

/** Watches every page from its first frame on. Call it before the page is loaded. */
export async function watchShifts(page: Page): Promise<void> {
  await page.addInitScript(() => {
    const shifts: Shifts = { sum: 0, moved: [] };
    Object.assign(window, { shifts });
    type Shift = PerformanceEntry & { value: number; hadRecentInput: boolean; sources: { node?: Node; previousRect: DOMRect; currentRect: DOMRect }[] };
    const told = ({ node, previousRect, currentRect }: Shift['sources'][number]) =>
      `${node instanceof Element ? node.outerHTML.slice(0, 80) : (node?.textContent?.slice(0, 40) ?? 'gone')}: ${previousRect.y.toFixed(0)} to ${currentRect.y.toFixed(0)}`;
    new PerformanceObserver((list) => {
      for (const { value, hadRecentInput, sources } of list.getEntries() as Shift[]) {
        if (hadRecentInput || (sources.length > 0 && sources.every(({ node }) => node instanceof Element && node.closest('[data-cause]')))) continue;
        shifts.sum += value;
        shifts.moved.push(`${value.toFixed(4)} of ${sources.map(told).join(' | ')}`);
      }
    }).observe({ type: 'layout-shift', buffered: true });
  });
}

export const shiftsOn = (page: Page): Promise<Shifts> => page.evaluate(() => (window as unknown as { shifts: Shifts }).shifts);
