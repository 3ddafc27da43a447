import { changeKept, matchKept, putKept } from './kept-caches';

/** Built files say nothing of cases, and stay. The service worker (public/sw.js) serves from here too. */
const STATIC_CACHE = 'carryover-static';

/** Whether a page is on the device. */
export const hasPage = async (path: string): Promise<boolean> => (await matchKept('pages', path)) !== undefined;

/** Built files as a page names them: with their whole address in tags, without its beginning in its data. */
const BUILT_FILE = /(?:\/_next\/)?static\/(?:chunks|css|media)\/[\w.~/-]+\.(?:js|css|woff2)/g;

/** Puts pages on the device, with the scripts and styles that they name, so that they open without a connection. */
export async function keepPages(paths: readonly string[]): Promise<void> {
  const files = new Set<string>();
  for (const path of paths) {
    const response = await fetch(path, { headers: { accept: 'text/html' } });
    if (!response.ok || response.redirected) continue;
    const text = await response.clone().text();
    for (const [file] of text.matchAll(BUILT_FILE)) files.add(file.startsWith('/') ? file : `/_next/${file}`);
    await putKept('pages', path, response);
  }
  await keepFiles([...files]);
}

/** Puts the built files that this page, or this worker, came with there too: they may have been loaded before the service worker ruled. */
export function keepBuiltFiles(more: readonly string[] = []): Promise<void> {
  const names = [...performance.getEntriesByType('resource').map(({ name }) => name), ...more];
  return keepFiles([...new Set(names)].filter((name) => name.startsWith(`${location.origin}/_next/static/`)));
}

async function keepFiles(urls: readonly string[]): Promise<void> {
  const cache = await caches.open(STATIC_CACHE);
  for (const url of urls) if (!(await cache.match(url))) await cache.add(url).catch(() => undefined);
}

export async function keepThumbnails(paths: readonly string[]): Promise<void> {
  for (const path of paths) {
    if (await matchKept('thumbnails', path)) continue;
    const response = await fetch(path).catch(() => undefined);
    if (response?.ok) await putKept('thumbnails', path, response);
  }
}

/** Keeps only the pages of these paths: a closed case needs no place. */
export function dropOtherPages(paths: readonly string[]): Promise<void> {
  const wanted = new Set(paths.map((path) => new URL(path, location.origin).href));
  return changeKept('pages', async (cache) => {
    for (const { url } of await cache.keys()) if (!wanted.has(url)) await cache.delete(url);
  });
}
