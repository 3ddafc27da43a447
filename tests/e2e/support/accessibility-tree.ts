import type { Page } from 'playwright-core';

export interface AccessibleNode {
  role: string;
  name: string;
  value: string;
}

/** What Chromium tells a screen reader of the page: everything that is not ignored, in order. */
export async function accessibilityTree(page: Page): Promise<AccessibleNode[]> {
  const session = await page.context().newCDPSession(page);
  const { nodes } = await session.send('Accessibility.getFullAXTree');
  await session.detach();
  return nodes
    .filter(({ ignored }) => !ignored)
    .map(({ role, name, value }) => ({
      role: String(role?.value ?? ''),
      name: String(name?.value ?? ''),
      value: String(value?.value ?? ''),
    }));
}
