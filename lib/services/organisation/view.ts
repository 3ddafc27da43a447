import { z } from 'zod';
import { findOrganisation } from '@/db/queries/organisation';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { defineRead } from '../define';

export const viewOrganisation = defineRead({
  name: 'view.organisation',
  doing: 'see the settings of the organisation',
  roles: PERMITTED['organisation.manage'],
  input: z.object({}),
  run: async ({ tx, ctx }) => {
    const organisation = await findOrganisation(tx, { organisationId: ctx.organisation.id });
    if (!organisation) throw notFound('organisation');
    return organisation;
  },
});
