import { asTenant } from '@/db/connect';
import { insertAudit } from '@/db/queries/audit';
import { forgetMailAddress } from '@/db/queries/mail';
import { acceptInvitation as useInvitation, findOpenInvitation, findSignIn } from '@/db/queries/sign-in';
import { hashPassword, passwordMatches } from '@/lib/auth/password-hash';
import { hashToken } from '@/lib/auth/token';
import { AppError, invalid } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { acceptInvitationInput, firstSignInInput, viewInvitationInput } from '@/lib/schemas/person';
import { fieldErrors } from '../field-errors';
import { tryOrRefuse } from '../session/tries';
import { defineVisit } from '../visit';

const noGood = () =>
  new AppError('not-found', 'This link does not work any more: links work once and for seven days, and only the last one sent. Ask whoever invited you for a new one.');

/** What the page of a mailed invitation shows. Whoever holds the link reads the mail of the address. */
export const viewInvitation = defineVisit({
  input: viewInvitationInput,
  run: async ({ visitor, input: { token } }) => {
    await tryOrRefuse(visitor, 'link by network', visitor.network);
    const open = await findOpenInvitation(visitor.db, { tokenHash: hashToken(token), now: visitor.now() });
    if (!open) throw noGood();
    return open;
  },
});

/** Joins the organisation: with a name and a new password, or with the sign-in that the address has already. */
export const acceptInvitation = defineVisit({
  input: acceptInvitationInput,
  run: async ({ visitor, input: { token, name, password } }) => {
    await tryOrRefuse(visitor, 'link by network', visitor.network);
    const link = { tokenHash: hashToken(token), now: visitor.now() };
    const open = await findOpenInvitation(visitor.db, link);
    if (!open) throw noGood();

    let first: { name: string; passwordHash: string } | undefined;
    if (open.hasSignIn) {
      await tryOrRefuse(visitor, 'sign-in by address', open.email);
      const found = await findSignIn(visitor.db, open.email);
      if (!(await passwordMatches(found?.passwordHash, password))) throw invalid({ password: 'This is not the password that you sign in with.' });
    } else {
      const parsed = firstSignInInput.safeParse({ name, password });
      if (!parsed.success) throw invalid(fieldErrors(parsed.error));
      first = { name: parsed.data.name, passwordHash: await hashPassword(parsed.data.password) };
    }

    await visitor.db.transaction(async (tx) => {
      const accepted = await useInvitation(tx, { ...link, newPersonId: newId(), name: first?.name ?? null, passwordHash: first?.passwordHash ?? null });
      if (!accepted) throw noGood();
      const { organisationId, invitationId, personId, roles } = accepted;
      await asTenant(tx, { organisationId, personId }, async (inside) => {
        // The address is the person's from now on, and is kept there alone.
        await forgetMailAddress(inside, { organisationId, entity: 'invitation', entityId: invitationId });
        await insertAudit(inside, [
          { organisationId, personId, action: 'accept.invitation', entity: 'invitation', entityId: invitationId, changed: { personId, roles }, at: link.now },
        ]);
      });
    });
    return { email: open.email };
  },
});
