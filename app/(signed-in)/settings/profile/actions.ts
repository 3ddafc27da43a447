'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { action } from '@/lib/auth/action';
import { beginSession, changeOrganisation } from '@/lib/auth/next-auth';
import { changePassword } from '@/lib/services/password/change';
import { rename } from '@/lib/services/person/rename';
import { changeOrganisationOfSession } from '@/lib/services/session/change-organisation';
import { signOutEverywhere } from '@/lib/services/session/sign-out-everywhere';

export const renamePerson = action(rename, { after: () => revalidatePath('/', 'layout') });

/** Every session has ended: this device gets a new one at once. */
export const setPassword = action(changePassword, {
  after: async ({ email }, { password }) => {
    if (await beginSession(email, String(password))) redirect('/sign-in');
  },
});

export const endEverySession = action(signOutEverywhere, { input: () => ({}), after: () => redirect('/sign-in') });

export const goOnElsewhere = action(changeOrganisationOfSession, {
  after: async ({ organisationId }) => {
    await changeOrganisation(organisationId);
    redirect('/settings/profile');
  },
});
