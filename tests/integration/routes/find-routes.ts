import { readFileSync, readdirSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('../../..', import.meta.url));
const METHODS = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS'];

/** Loads a file of `app`, by its path below it. */
export const load = (path: string): Promise<Record<string, unknown>> => import(/* @vite-ignore */ join(root, 'app', path));

const filesBelow = (folder: string) => readdirSync(join(root, folder), { recursive: true, encoding: 'utf8' }).sort();

/** Names of all pages, actions and methods in `app`, spelt as `nameOf` spells those of the table. */
export async function routesInApp(): Promise<string[]> {
  const names: string[] = [];
  for (const path of filesBelow('app')) {
    const folder = dirname(path);
    if (basename(path) === 'page.tsx') names.push(`page ${folder}`);
    if (basename(path) === 'actions.ts') names.push(...Object.keys(await load(path)).map((name) => `action ${folder} ${name}`));
    if (basename(path) === 'route.ts') {
      names.push(...Object.keys(await load(path)).filter((name) => METHODS.includes(name)).map((method) => `${method} ${folder}`));
    }
  }
  return names.sort();
}

/** Files that make server actions and aren't named so, where this table would miss them. */
export const hiddenActions = (): string[] =>
  ['app', 'components', 'lib']
    .flatMap((folder) => filesBelow(folder).map((path) => join(folder, path)))
    .filter((path) => /\.tsx?$/.test(path) && basename(path) !== 'actions.ts' && /^\s*['"]use server['"]/m.test(readFileSync(join(root, path), 'utf8')));
