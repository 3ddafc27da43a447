import { updatePerson } from '@/db/queries/person';
import { PERMITTED } from '@/lib/auth/permissions';
import { renameInput } from '@/lib/schemas/person';
import { defineWrite } from '../define';

/** Changes one's own name. The audit says that it changed, not to what: names stand in one place only. */
export const rename = defineWrite({
  name: 'rename.person',
  doing: 'change your name',
  roles: PERMITTED['own-settings'],
  input: renameInput,
  run: async ({ tx, ctx, input: { name }, audit }) => {
    await updatePerson(tx, { personId: ctx.person.id }, { name });
    audit({ entity: 'person', entityId: ctx.person.id, changed: { name: 'changed' } });
  },
});
