import { deleteSavedView } from '@/db/queries/saved-view';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { removeViewInput } from '@/lib/schemas/saved-view';
import { defineWrite } from '../define';

/** Deletes one's own view. The cases that it showed stay as they are. */
export const removeView = defineWrite({
  name: 'remove.saved_view',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: removeViewInput,
  run: async ({ tx, ctx, input: { id }, audit }) => {
    if (!(await deleteSavedView(tx, { organisationId: ctx.organisation.id, personId: ctx.person.id, id }))) throw notFound('view');
    audit({ entity: 'saved_view', entityId: id, changed: { deleted: true } });
    return { id };
  },
});
