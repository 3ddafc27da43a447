import { updatePerson } from '@/db/queries/person';
import { PERMITTED } from '@/lib/auth/permissions';
import { setUnitsInput } from '@/lib/schemas/person';
import { defineWrite } from '../define';

/** Sets the units that one sees measures in. What is stored stays as it is. */
export const setUnits = defineWrite({
  name: 'set-units.person',
  doing: 'choose your units of measure',
  roles: PERMITTED['own-settings'],
  input: setUnitsInput,
  run: async ({ tx, ctx, input: unitPreferences, audit }) => {
    await updatePerson(tx, { personId: ctx.person.id }, { unitPreferences });
    audit({ entity: 'person', entityId: ctx.person.id, changed: { unitPreferences } });
  },
});
