'use server';

import { redirect } from 'next/navigation';
import { endSession } from '@/lib/auth/next-auth';

/** Ends this session. Whoever isn't signed in comes to the same place. */
export async function signOut(): Promise<void> {
  await endSession();
  redirect('/');
}
