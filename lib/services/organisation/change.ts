import { updateOrganisation } from '@/db/queries/organisation';
import { PERMITTED } from '@/lib/auth/permissions';
import { changeOrganisationInput } from '@/lib/schemas/organisation';
import { defineWrite } from '../define';

export const changeOrganisation = defineWrite({
  name: 'change.organisation',
  doing: 'change the settings of the organisation',
  roles: PERMITTED['organisation.manage'],
  input: changeOrganisationInput,
  run: async ({ tx, ctx, input, audit }) => {
    await updateOrganisation(tx, { organisationId: ctx.organisation.id }, input);
    audit({ entity: 'organisation', entityId: ctx.organisation.id, changed: input });
  },
});
