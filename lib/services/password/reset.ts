import { asTenant } from '@/db/connect';
import { insertAudit } from '@/db/queries/audit';
import { isPasswordResetOpen, organisationsOf, usePasswordReset } from '@/db/queries/sign-in';
import { hashPassword } from '@/lib/auth/password-hash';
import { hashToken } from '@/lib/auth/token';
import { AppError } from '@/lib/errors';
import { resetPasswordInput, viewResetInput } from '@/lib/schemas/sign-in';
import { tryOrRefuse } from '../session/tries';
import { defineVisit } from '../visit';

const noGood = () =>
  new AppError('not-found', 'This link does not work any more: links work once and for an hour, and only the last one sent. Ask for a new one.');

/** Whether a mailed link can still be used, for the page that it opens. */
export const viewPasswordReset = defineVisit({
  input: viewResetInput,
  run: async ({ visitor, input: { token } }) => {
    await tryOrRefuse(visitor, 'link by network', visitor.network);
    if (!(await isPasswordResetOpen(visitor.db, { tokenHash: hashToken(token), now: visitor.now() }))) throw noGood();
  },
});

/** Sets a new password by a mailed link, and ends every session of the person. */
export const resetPassword = defineVisit({
  input: resetPasswordInput,
  run: async ({ visitor, input: { token, password } }) => {
    await tryOrRefuse(visitor, 'link by network', visitor.network);
    const link = { tokenHash: hashToken(token), now: visitor.now() };
    if (!(await isPasswordResetOpen(visitor.db, link))) throw noGood();

    const passwordHash = await hashPassword(password);
    await visitor.db.transaction(async (tx) => {
      const used = await usePasswordReset(tx, { ...link, passwordHash });
      if (!used) throw noGood();
      // A password belongs to no organisation: each that the person works for has it in its audit.
      for (const { id: organisationId } of await organisationsOf(tx, used.personId)) {
        await asTenant(tx, { organisationId, personId: used.personId }, (inside) =>
          insertAudit(inside, [
            { organisationId, personId: used.personId, action: 'reset-password.person', entity: 'person', entityId: used.personId, changed: { password: 'changed' }, at: link.now },
          ]),
        );
      }
    });
  },
});
