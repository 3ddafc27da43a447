import { updatePerson } from '@/db/queries/person';
import { findSignIn, raiseSessionVersion } from '@/db/queries/sign-in';
import { hashPassword, passwordMatches } from '@/lib/auth/password-hash';
import { PERMITTED } from '@/lib/auth/permissions';
import { invalid } from '@/lib/errors';
import { changePasswordInput } from '@/lib/schemas/sign-in';
import { defineWrite } from '../define';
import { forgetTries, tryOrRefuse } from '../session/tries';

/** Changes one's own password, which ends every session; whoever calls it begins a new one here. */
export const changePassword = defineWrite({
  name: 'change-password.person',
  doing: 'change your password',
  roles: PERMITTED['own-settings'],
  input: changePasswordInput,
  prepare: async ({ ctx, input: { current, password } }) => {
    // A tablet left signed in is no place to guess a password at.
    const trying = { ...ctx, network: '' };
    await tryOrRefuse(trying, 'sign-in by address', ctx.person.email);
    const found = await findSignIn(ctx.db, ctx.person.email);
    if (!(await passwordMatches(found?.passwordHash, current))) throw invalid({ current: 'This is not your present password.' });
    await forgetTries(trying, 'sign-in by address', ctx.person.email);
    return { passwordHash: await hashPassword(password) };
  },
  run: async ({ tx, ctx, prepared, audit }) => {
    await updatePerson(tx, { personId: ctx.person.id }, prepared);
    await raiseSessionVersion(tx, ctx.person.id);
    audit({ entity: 'person', entityId: ctx.person.id, changed: { password: 'changed' } });
    return { email: ctx.person.email };
  },
});
