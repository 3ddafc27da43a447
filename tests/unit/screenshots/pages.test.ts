import { readdirSync } from 'node:fs';
import { dirname } from 'node:path';
import { expect, it } from 'vitest';
import { inProject } from '@/scripts/lib/paths.mjs';
import { ONLY_REDIRECTS, SHOTS } from '@/scripts/screenshots/pages';

const pagesOfApp = () =>
  readdirSync(inProject('app'), { recursive: true, encoding: 'utf8' })
    .filter((path) => /(^|\/)page\.tsx$/.test(path))
    .map((path) => dirname(path));

it('pictures every page of the application, and none that is gone', () => {
  const pictured = new Set([...SHOTS.flatMap(({ page }) => page ?? []), ...ONLY_REDIRECTS]);
  expect([...pictured].sort()).toEqual(pagesOfApp().sort());
});

it('gives each picture a file of its own', () => {
  const names = SHOTS.map(({ name }) => name);
  expect(new Set(names).size).toBe(names.length);
  for (const name of names) expect(name).toMatch(/^[a-z0-9-]+$/);
});
