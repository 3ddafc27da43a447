import { ANYONE } from '@/lib/auth/roles';
import { newId } from '@/lib/ids';
import { invite } from '@/lib/services/invitation/invite';
import { mailPasswordReset } from '@/lib/services/password/mail-reset';
import { makePost } from '@/tests/support/post';
import { feature } from '../row';

export const signingIn = feature({
  async prepare({ tenant, as, password }) {
    const { post, letters, tokenOf, deliver } = makePost({ app: as('administrator').db });
    await invite({ ctx: as('administrator'), input: { email: `${crypto.randomUUID()}@people.test`, roles: ['technician'] } });
    await deliver(tenant.organisationId);
    const forgetful = await tenant.addPerson({ password });
    await mailPasswordReset(post, { email: forgetful.person.email }, { jobId: newId() });
    return { invitation: tokenOf(letters.at(-2)), reset: tokenOf(letters.at(-1)), email: forgetful.person.email, password };
  },
  rows: [
    { page: '(public)', roles: 'anybody' },
    { page: '(auth)/sign-in', roles: 'anybody', query: () => ({ next: '/units' }) },
    { page: '(auth)/reset-password', roles: 'anybody' },
    { page: '(auth)/reset-password/[token]', roles: 'anybody', params: ({ reset }) => ({ token: reset }) },
    { page: '(auth)/invite/[token]', roles: 'anybody', params: ({ invitation }) => ({ token: invitation }) },
    { page: '(signed-in)/not-allowed', roles: ANYONE },
    { action: '(auth)/sign-in', name: 'signIn', roles: 'anybody', form: ({ email, password }) => ({ email, password }) },
    { action: '(auth)/reset-password', name: 'requestReset', roles: 'anybody', form: ({ email }) => ({ email }) },
    { action: '(auth)/reset-password', name: 'reset', roles: 'anybody', form: ({ reset }) => ({ token: reset, password: 'another password, a new one' }) },
    { action: '(auth)/invite/[token]', name: 'join', roles: 'anybody', form: ({ invitation, password }) => ({ token: invitation, name: 'New Comer', password }) },
    { action: '(signed-in)', name: 'signOut', roles: 'anybody', form: () => ({}), takesNothing: true, isPlain: true },
    { route: 'api/auth/[...nextauth]', method: 'GET', roles: 'anybody', params: () => ({ nextauth: ['session'] }) },
    { route: 'api/auth/[...nextauth]', method: 'POST', roles: 'anybody', params: () => ({ nextauth: ['signout'] }), body: () => ({ json: 'true' }) },
  ],
});
