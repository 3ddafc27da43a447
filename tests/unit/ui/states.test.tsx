import { readdirSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { renderToStaticMarkup } from 'react-dom/server';
import { expect, it } from 'vitest';
import { ErrorPanel } from '@/components/shell/ErrorPanel';
import { pageAt, PAGES } from '@/components/states/shape';
import { Skeleton } from '@/components/states/Skeleton';
import { inProject } from '@/scripts/lib/paths.mjs';

const IN = inProject('app', '(signed-in)');
const filesOf = (name: string) =>
  readdirSync(IN, { recursive: true, encoding: 'utf8' })
    .filter((path) => path === name || path.endsWith(`/${name}`))
    .map((path) => dirname(path));

it('has an outline for every signed-in page', () => {
  expect(PAGES.map(({ route }) => route).sort()).toEqual(filesOf('page.tsx').sort());
});

it.each([
  ['/cases', 'list', 'the cases'],
  ['/cases/new', 'form', 'the form'],
  ['/cases/01890a5d-ac96-774b-bcce-b302099a8057', 'case', 'the case'],
  ['/settings/people/invite', 'form', 'the form'],
  ['/nowhere/at/all', 'form', 'the page'],
])('knows what stands at %s', (path, shape, what) => expect(pageAt(path)).toMatchObject({ shape, what }));

it.each([...new Set(PAGES.map(({ shape }) => shape))])('says what is fetched, and hides the outline of a %s from screen readers', (shape) => {
  const html = renderToStaticMarkup(<Skeleton shape={shape} what="the cases" />);
  expect(html).toContain('Fetching the cases…');
  expect(html.match(/role="status"/g)).toHaveLength(1);
  expect(html).toContain('aria-hidden="true"');
});

it('has a not-found page of its own for every kind of thing with an address', () => {
  const things = filesOf('page.tsx').filter((path) => /\[[^\]]+\]$/.test(path));
  expect(filesOf('not-found.tsx')).toEqual(expect.arrayContaining(things.map((path) => join(path))));
});

it('tells the reference of a server’s error, and of a browser’s what to tell instead', () => {
  const show = (error: Error & { digest?: string }) => renderToStaticMarkup(<ErrorPanel error={error} retry={() => undefined} homeHref="/cases" />);
  expect(show(Object.assign(new Error('no'), { digest: '123456' }))).toMatch(/Whatever was saved before is kept.*reference.*123456/s);
  expect(show(new Error('secret detail'))).not.toContain('secret detail');
  expect(show(new Error('no'))).toContain('what you were doing');
});
