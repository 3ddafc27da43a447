import { requestResetInput } from '@/lib/schemas/sign-in';
import { mayTry, tryOrRefuse } from '../session/tries';
import { defineVisit } from '../visit';

/**
 * Asks for a link by mail. Whether anybody has the address is looked up by the job, so that neither the answer nor its
 * time tells; too many for one address are dropped without a word.
 */
export const requestPasswordReset = defineVisit({
  input: requestResetInput,
  run: async ({ visitor, input: { email } }) => {
    await tryOrRefuse(visitor, 'reset by network', visitor.network);
    if (await mayTry(visitor, 'reset by address', email)) await visitor.jobs.send(visitor.db, 'mail-password-reset', { email });
  },
});
