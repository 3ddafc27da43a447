const LOCAL = ['127.0.0.1', 'localhost', '[::1]', ''];

/** Why a database is not to be filled with invented data; undefined when it may. */
export function whyNotSeed(url: string, environment: string | undefined): string | undefined {
  if (environment === 'production') return 'The demo is never put into a production database.';
  const { hostname, searchParams } = new URL(url);
  const hosts = [hostname, ...searchParams.getAll('host')].filter((host) => !host.startsWith('/'));
  const elsewhere = hosts.find((host) => !LOCAL.includes(host));
  return elsewhere === undefined ? undefined : `The demo is put only into a database on this machine, and this one is on ${elsewhere}.`;
}
