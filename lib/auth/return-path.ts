const HERE = 'http://here.invalid';

/** An address of ours to go on to after signing in; undefined for anything that leads elsewhere. */
export function returnPath(asked: unknown): string | undefined {
  if (typeof asked !== 'string' || !asked.startsWith('/') || !URL.canParse(asked, HERE)) return undefined;
  const url = new URL(asked, HERE);
  return url.origin === HERE ? `${url.pathname}${url.search}${url.hash}` : undefined;
}
