import { findSignIn, organisationsOf } from '@/db/queries/sign-in';
import { passwordMatches } from '@/lib/auth/password-hash';
import { AppError } from '@/lib/errors';
import { signInInput } from '@/lib/schemas/sign-in';
import { defineVisit } from '../visit';
import { forgetTries, tryOrRefuse } from './tries';

/** The same for an unknown address, a wrong password and somebody who has left. */
const refused = () => new AppError('invalid', 'The address or the password is wrong.');

/** Checks address and password; says who it is and where he or she works. */
export const signIn = defineVisit({
  input: signInInput,
  run: async ({ visitor, input: { email, password } }) => {
    await tryOrRefuse(visitor, 'sign-in by network', visitor.network);
    await tryOrRefuse(visitor, 'sign-in by address', email);

    const found = await findSignIn(visitor.db, email);
    const matches = await passwordMatches(found?.passwordHash, password);
    if (!found || !matches) throw refused();
    const [organisation] = await organisationsOf(visitor.db, found.personId);
    if (!organisation) throw refused();

    await forgetTries(visitor, 'sign-in by address', email);
    return { personId: found.personId, sessionVersion: found.sessionVersion, organisationId: organisation.id };
  },
});
