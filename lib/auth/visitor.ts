import 'server-only';
import { headers } from 'next/headers';
import { database } from '@/db';
import { env } from '@/lib/env';
import { jobs } from '@/lib/jobs';
import type { Visitor } from '@/lib/services/context';

/**
 * Where a request came from. The last entry is what the proxy in front of us saw; those before it are the client's own
 * claims. Without a proxy Next fills in the socket's address, unless the client sends the header itself: then only the
 * limit by address holds.
 */
const networkOf = (headers: Headers) => headers.get('x-forwarded-for')?.split(',').at(-1)?.trim() || 'unknown';

export const visitorFrom = (headers: Headers): Visitor => ({
  db: database(),
  network: networkOf(headers),
  now: () => new Date(),
  jobs,
  signingSecret: env().NEXTAUTH_SECRET,
});

export const getVisitor = async (): Promise<Visitor> => visitorFrom(await headers());
