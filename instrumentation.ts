import type { Instrumentation } from 'next';

/**
 * Puts what broke a page into the log, under the reference that the page shows: Next's digest of the error. The address
 * itself stays out, since the links that are mailed hold a secret; the route says which page it was.
 */
export const onRequestError: Instrumentation.onRequestError = async (error, { method }, { routePath, routeType }) => {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return;
  const { log } = await import('@/lib/log');
  const digest = typeof error === 'object' && error !== null && 'digest' in error ? String(error.digest) : undefined;
  log.error({ reference: digest, method, route: routePath, kind: routeType, err: error, cause: error instanceof Error ? error.cause : undefined }, 'a page or request failed');
};
