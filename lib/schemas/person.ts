import { z } from 'zod';
import { ROLES } from '@/lib/auth/roles';
import { QUANTITY_IDS, isUnitOf } from '@/lib/units';
import { checkbox, email, line, optionalId, optionalLine, pageNumber, rowId, several } from './common';
import { invitationToken, newPassword, triedPassword } from './sign-in';

const personName = line('your name', 100);

export const renameInput = z.object({ name: personName });

/** Quantity to unit; a quantity left out keeps what the organisation's country brings. */
export const setUnitsInput = z.record(z.string().max(40), z.string().max(20)).transform((given, context) => {
  const known = Object.entries(given).filter(([quantity]) => (QUANTITY_IDS as readonly string[]).includes(quantity));
  for (const [quantity, unit] of known) {
    if (!QUANTITY_IDS.some((id) => id === quantity && isUnitOf(id, unit))) {
      context.addIssue({ code: 'custom', path: [quantity], message: 'Choose a unit from the list.' });
    }
  }
  return Object.fromEntries(known);
});

const roles = several(z.enum(ROLES, 'This is not a role.')).refine((chosen) => chosen.length > 0, 'Choose at least one role.').transform((chosen) => ROLES.filter((role) => chosen.includes(role)));

export const inviteInput = z.object({ email, roles, siteId: optionalId });
export const invitationInput = z.object({ invitationId: rowId });

export const viewInvitationInput = z.object({ token: invitationToken });

/** Name and a new password for a first sign-in; the password that exists for one that is there. */
export const acceptInvitationInput = z.object({ token: invitationToken, name: z.string().max(200).optional(), password: triedPassword });
export const firstSignInInput = z.object({ name: personName, password: newPassword });

export const memberInput = z.object({ personId: rowId });
export const changeMemberInput = z
  .object({ personId: rowId, roles, siteId: optionalId, mayRelease: checkbox, releaseBasis: optionalLine(300) })
  .refine(({ mayRelease, releaseBasis }) => !mayRelease || releaseBasis !== null, {
    path: ['releaseBasis'],
    message: 'Say what the right to release rests on: a qualification, an appointment.',
  });

export const changeOrganisationOfSessionInput = z.object({ organisationId: rowId });

const day = z.union([z.literal(''), z.iso.date('Enter a day.')]).nullish().transform((text) => text || null);
export const auditQuery = z.object({
  person: optionalId.catch(null),
  entity: optionalLine(40).catch(null),
  entityId: optionalLine(60).catch(null),
  from: day.catch(null),
  until: day.catch(null),
  page: pageNumber,
});
