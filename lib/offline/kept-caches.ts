/**
 * The caches of pages and pictures, which hold what cases say. They are there while somebody is signed in on this device,
 * and nothing is put into one that isn't. Whoever puts holds a lock with the others, the service worker (public/sw.js)
 * among them; whoever drops them holds it alone. So nothing that was under way at a sign-out comes in after it.
 */
const NAMES = { pages: 'carryover-pages', thumbnails: 'carryover-thumbnails' } as const;
const LOCK = 'carryover-kept-caches';

type KeptCache = keyof typeof NAMES;

const isPossible = () => typeof caches !== 'undefined' && navigator.locks !== undefined;

/** What is kept under an address, if anything is. */
export const matchKept = async (which: KeptCache, path: string): Promise<Response | undefined> =>
  typeof caches === 'undefined' ? undefined : caches.match(path, { cacheName: NAMES[which] });

/** Changes one of the caches, if it is there. */
export async function changeKept(which: KeptCache, change: (cache: Cache) => Promise<unknown>): Promise<void> {
  if (!isPossible()) return;
  await navigator.locks.request(LOCK, { mode: 'shared' }, async () => {
    if (await caches.has(NAMES[which])) await change(await caches.open(NAMES[which]));
  });
}

export const putKept = (which: KeptCache, path: string, response: Response): Promise<void> =>
  changeKept(which, (cache) => cache.put(new URL(path, location.origin).href, response));

/** Makes them for whoever has signed in. */
export async function makeKept(): Promise<void> {
  if (!isPossible()) return;
  await navigator.locks.request(LOCK, { mode: 'shared' }, () => Promise.all(Object.values(NAMES).map((name) => caches.open(name))));
}

/** Drops them with all that they hold. */
export async function dropKept(): Promise<void> {
  if (!isPossible()) return;
  await navigator.locks.request(LOCK, () => Promise.all(Object.values(NAMES).map((name) => caches.delete(name))));
}
