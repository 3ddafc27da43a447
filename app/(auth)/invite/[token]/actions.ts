'use server';

import { redirect } from 'next/navigation';
import { visitorAction } from '@/lib/auth/action';
import { homeFor } from '@/lib/auth/navigation';
import { beginSession } from '@/lib/auth/next-auth';
import { getContext } from '@/lib/auth/session';
import { acceptInvitation } from '@/lib/services/invitation/accept';

export const join = visitorAction(acceptInvitation, {
  after: async ({ email }, { password }) => {
    await beginSession(email, String(password));
    const ctx = await getContext();
    redirect(ctx ? homeFor(ctx.roles) : '/sign-in');
  },
});
