// @vitest-environment jsdom
import { afterEach, expect, test } from 'vitest';
import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import axe from 'axe-core';
import { PathnameContext } from 'next/dist/shared/lib/hooks-client-context.shared-runtime';
import { SignedInShell } from '@/components/shell/SignedInShell';

afterEach(() => {
  cleanup();
  document.cookie = 'theme=; max-age=0';
  delete document.documentElement.dataset.theme;
});

const shellAt = (pathname: string, unread = 0) => (
  <PathnameContext.Provider value={pathname}>
    <SignedInShell
      person={{ name: 'Ines Okafor', email: 'ines@demo.example' }}
      organisation={{ name: 'Northmoor Haulage' }}
      items={[{ href: '/cases', label: 'Cases' }, { href: '/units', label: 'Units' }]}
      unread={unread}
      theme="device"
      signOut={<button type="button">Sign out</button>}
    >
      <h1>Page</h1>
    </SignedInShell>
  </PathnameContext.Provider>
);
// jsdom applies no style sheet, so both the row and the phone's menu are there; the row comes first.
const row = () => within(screen.getAllByRole('navigation', { name: 'Main' })[0] as HTMLElement);

test.each([
  ['/units', 'page'],
  ['/units/7', 'true'],
  ['/unitsandmore', null],
])('at %s the link to the units says %s', (pathname, current) => {
  render(shellAt(pathname));
  expect(row().getByRole('link', { name: 'Units' }).getAttribute('aria-current')).toBe(current);
  expect(row().getByRole('link', { name: 'Cases' }).hasAttribute('aria-current')).toBe(false);
});

test('the way to the notices says how many are unread, and nothing when none are', () => {
  const { rerender } = render(shellAt('/units', 3));
  expect(screen.getAllByRole('link', { name: 'Notices, 3 unread' })).toHaveLength(2);
  expect(screen.getByText(', 3 unread notices').closest('summary')?.textContent).toContain('Menu');
  rerender(shellAt('/units'));
  expect(screen.getAllByRole('link', { name: 'Notices' })).toHaveLength(2);
});

test('the skip link leads to the main part', () => {
  render(shellAt('/units'));
  const target = screen.getByRole('link', { name: 'Skip to the content' }).getAttribute('href');
  expect(document.querySelector(target ?? '')).toBe(screen.getByRole('main'));
});

test('a menu closes on Escape, giving the focus back, and after going to another page', () => {
  const { container, rerender } = render(shellAt('/units'));
  const menu = () => container.querySelector('details') as HTMLDetailsElement;
  menu().open = true;
  fireEvent.keyDown(within(menu()).getByText('Sign out'), { key: 'Escape' });
  expect(menu().open).toBe(false);
  expect(document.activeElement).toBe(menu().querySelector('summary'));

  menu().open = true;
  rerender(shellAt('/cases'));
  expect(menu().open).toBe(false);
});

test('a theme takes effect at once and is kept for the server', () => {
  const { container } = render(shellAt('/units'));
  const menu = within(container.querySelector('details') as HTMLElement);
  fireEvent.click(menu.getByLabelText('Dark'));
  expect(document.documentElement.dataset.theme).toBe('dark');
  expect(document.cookie).toContain('theme=dark');
  fireEvent.click(menu.getByLabelText('As device'));
  expect(document.documentElement.dataset.theme).toBeUndefined();
});

test('the shell has no axe violation', async () => {
  render(shellAt('/units'));
  // Without a style sheet both navigations are there at once; in the browser one of them is not displayed.
  const { violations } = await axe.run(document.body, { rules: { 'color-contrast': { enabled: false }, 'landmark-unique': { enabled: false } } });
  expect(violations.map(({ id, nodes }) => [id, nodes.map((node) => node.html)])).toEqual([]);
});
