'use server';

import { redirect } from 'next/navigation';
import { visitorAction } from '@/lib/auth/action';
import { enter } from '@/lib/auth/enter';
import { homeFor } from '@/lib/auth/navigation';
import { returnPath } from '@/lib/auth/return-path';
import { getContext } from '@/lib/auth/session';

export const signIn = visitorAction(enter, {
  after: async (_result, { next }) => {
    const ctx = await getContext();
    redirect(returnPath(next) ?? homeFor(ctx?.roles ?? []));
  },
});
