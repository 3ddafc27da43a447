/*
 * Serves Carryover's pages, built files and thumbnails when there is no connection. What people enter never passes
 * here: answers wait in IndexedDB, and requests to the API go to the network as they are.
 */
const STATIC = 'carryover-static';
const PAGES = 'carryover-pages';
const THUMBNAILS = 'carryover-thumbnails';
/** As lib/offline/kept-caches.ts has it: pages and thumbnails are put only where somebody is signed in. */
const LOCK = 'carryover-kept-caches';
/** Built files of former builds are of no use; the newest are at the end. */
const MOST_STATIC = 500;

self.addEventListener('install', () => self.skipWaiting());
self.addEventListener('activate', (event) => event.waitUntil(self.clients.claim()));

self.addEventListener('fetch', (event) => {
  const { request } = event;
  const url = new URL(request.url);
  if (request.method !== 'GET' || url.origin !== self.location.origin) return;
  if (url.pathname.startsWith('/_next/static/')) event.respondWith(builtFile(request));
  else if (/^\/api\/v1\/photos\/[^/]+\/thumbnail$/.test(url.pathname)) event.respondWith(thumbnail(request));
  else if (request.mode === 'navigate' && isKept(url)) event.respondWith(fromNetworkFirst(request));
});

/** The list of cases, each case as it is now, and the bench: what a bay goes on with. */
const isKept = ({ pathname, search }) => pathname === '/cases' || (/^\/cases\/[0-9a-f-]{36}$/.test(pathname) && search === '') || isBench(pathname);
const isBench = (pathname) => /^\/bench(\/[a-z-]+)?$/.test(pathname);

async function builtFile(request) {
  const cache = await caches.open(STATIC);
  const held = await cache.match(request);
  if (held) return held;
  const response = await fetch(request);
  if (response.ok) {
    await cache.put(request, response.clone());
    void trim(cache);
  }
  return response;
}

async function thumbnail(request) {
  const held = await caches.match(request, { cacheName: THUMBNAILS });
  if (held) return held;
  const response = await fetch(request);
  if (response.ok) await put(THUMBNAILS, request, response.clone());
  return response;
}

function put(name, request, response) {
  return navigator.locks.request(LOCK, { mode: 'shared' }, async () => {
    if (await caches.has(name)) await (await caches.open(name)).put(request, response);
  });
}

async function trim(cache) {
  const keys = await cache.keys();
  for (const key of keys.slice(0, Math.max(0, keys.length - MOST_STATIC))) await cache.delete(key);
}

async function fromNetworkFirst(request) {
  const { origin, pathname } = new URL(request.url);
  const kept = (url) => caches.match(url, { cacheName: PAGES });
  // A sum reads its own address, so that its page does for any readings.
  const held = async () => (await kept(request.url)) ?? (isBench(pathname) ? await kept(origin + pathname) : undefined);
  try {
    const response = await fetch(request);
    // A redirect (to the sign-in) is the browser's to follow, and no page of this address.
    if (response.ok && response.type === 'basic' && !response.redirected) await put(PAGES, request.url, response.clone());
    if (response.status < 502) return response;
    return (await held()) ?? response;
  } catch {
    return (await held()) ?? noPage();
  }
}

function noPage() {
  const body = `<!doctype html><html lang="en"><meta charset="utf-8"><meta name="viewport" content="width=device-width">
<title>No connection · Carryover</title>
<style>body{font:1.0625rem/1.5 system-ui,sans-serif;max-width:38rem;margin:12vh auto;padding:0 1.25rem;background:#f6f1e6;color:#0e2f3a}
a{color:inherit}@media(prefers-color-scheme:dark){body{background:#10191d;color:#e9e2d3}}</style>
<h1>No connection</h1><p>This page is not kept on this device. What you entered in a case is: it is sent when the connection is back.</p>
<p><a href="/cases">Open the cases kept on this device</a></p></html>`;
  return new Response(body, { status: 503, headers: { 'content-type': 'text/html; charset=utf-8' } });
}
