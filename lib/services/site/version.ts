import { createHash } from 'node:crypto';

/** A site keeps no time of its last change: what it holds is its version. */
export const siteVersion = ({ name, timeZone }: { name: string; timeZone: string }): string =>
  createHash('sha256').update(JSON.stringify([name, timeZone])).digest('hex').slice(0, 16);
