import 'server-only';
import { cache } from 'react';
import { headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { getServerSession } from 'next-auth/next';
import { database } from '@/db';
import { env } from '@/lib/env';
import { jobs } from '@/lib/jobs';
import type { Ctx } from '@/lib/services/context';
import type { Standing } from '@/lib/services/session/standing';
import { storage } from '@/lib/storage/of-environment';
import { authOptions } from './options';
import { returnPath } from './return-path';

/** What services take, for somebody of whom it is known what he or she stands on. */
export const contextOf = (standing: Standing): Ctx => ({ ...standing, db: database(), now: () => new Date(), jobs, storage: storage(), signingSecret: env().NEXTAUTH_SECRET });

/** Who is signed in, checked against the database once a request; null when nobody is. */
export const getContext = cache(async (): Promise<Ctx | null> => {
  const session = await getServerSession(authOptions());
  if (session?.failure) throw session.failure;
  return session?.standing ? contextOf(session.standing) : null;
});

/**
 * The same where nobody may come in without: whoever isn't signed in goes to the sign-in, and is brought back after it.
 * A page takes `pageContext`, which looks at roles as well. `x-path` is set by proxy.ts; a layout can't know its address.
 */
export async function requireContext(): Promise<Ctx> {
  const ctx = await getContext();
  if (ctx) return ctx;
  const next = returnPath((await headers()).get('x-path'));
  redirect(next ? `/sign-in?next=${encodeURIComponent(next)}` : '/sign-in');
}
