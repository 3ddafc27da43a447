// Sets what Next's own modules look for when they load, so it comes before them.
import 'next/dist/server/node-environment-baseline.js';
import { createRequestStoreForRender } from 'next/dist/server/async-storage/request-store.js';
import { workAsyncStorage, type WorkStore } from 'next/dist/server/app-render/work-async-storage.external.js';
import { workUnitAsyncStorage } from 'next/dist/server/app-render/work-unit-async-storage.external.js';

/**
 * A browser as far as the server sees it: its cookies, and where it calls from. Requests run in Next's own request
 * scope, so that `cookies()`, `headers()`, redirects and next-auth are the real ones; only the HTTP around them is left
 * out. It is the one place that leans on Next's insides.
 */
export class Browser {
  readonly cookies = new Map<string, string>();
  /** With what attributes each was set last. */
  readonly attributes = new Map<string, { httpOnly?: boolean; secure?: boolean; sameSite?: unknown }>();
  constructor(readonly network = crypto.randomUUID()) {}

  /** Cookies like this one's in a browser of their own. */
  copy(): Browser {
    const copy = new Browser(this.network);
    for (const [name, value] of this.cookies) copy.cookies.set(name, value);
    return copy;
  }

  headers(more: Record<string, string> = {}): Record<string, string> {
    const cookie = [...this.cookies].map(([name, value]) => `${name}=${encodeURIComponent(value)}`).join('; ');
    return { host: 'carryover.test', 'x-forwarded-for': this.network, ...(cookie && { cookie }), ...more };
  }

  /** What a page does: it can read cookies and not set them. */
  render<T>(path: string, work: () => Promise<T>): Promise<T> {
    return this.#run('render', path, this.headers({ 'x-path': path }), work);
  }

  /** What an action or a route handler does: cookies that it sets are this browser's afterwards. */
  act<T>(path: string, work: () => Promise<T>, headers = this.headers()): Promise<T> {
    return this.#run('action', path, headers, work);
  }

  async #run<T>(phase: 'render' | 'action', path: string, headers: Record<string, string>, work: () => Promise<T>): Promise<T> {
    const url = new URL(path, 'http://carryover.test');
    const request = createRequestStoreForRender(
      ...([{ headers }, undefined, url, {}, undefined, undefined, undefined, false, undefined, null, null, undefined] as unknown as Parameters<typeof createRequestStoreForRender>),
    );
    request.phase = phase;
    // Enough of a work store for the request's own functions; nothing is cached here.
    const store = { route: url.pathname, page: url.pathname, forceDynamic: true, incrementalCache: {}, afterContext: {} } as unknown as WorkStore;
    try {
      return await workAsyncStorage.run(store, () => workUnitAsyncStorage.run(request, work));
    } finally {
      if (phase === 'action') {
        for (const { name, value, maxAge, httpOnly, secure, sameSite } of request.mutableCookies.getAll()) {
          this.attributes.set(name, { httpOnly, secure, sameSite });
          if (value === '' || maxAge === 0) this.cookies.delete(name);
          else this.cookies.set(name, value);
        }
      }
    }
  }
}
