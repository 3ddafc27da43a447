import 'server-only';
import { AppError, tooMany } from '@/lib/errors';
import { signInInput } from '@/lib/schemas/sign-in';
import { defineVisit } from '@/lib/services/visit';
import { beginSession } from './next-auth';

/** Signs in through next-auth, which asks the service `session/sign-in`; says its refusal in words again. */
export const enter = defineVisit({
  input: signInInput,
  run: async ({ input: { email, password } }) => {
    const refusal = await beginSession(email, password);
    if (refusal === undefined) return;
    if (refusal === 'too-many') throw tooMany('That was tried too often. Wait 15 minutes, then try again.');
    if (refusal === 'unknown') throw new Error('Signing in failed; the log has why');
    throw new AppError('invalid', 'The address or the password is wrong.');
  },
});
