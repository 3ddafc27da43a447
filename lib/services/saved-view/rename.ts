import { findSavedView, renameSavedView, selectSavedViews } from '@/db/queries/saved-view';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { renameViewInput } from '@/lib/schemas/saved-view';
import { defineWrite } from '../define';
import { takenName } from './save';

/** Gives one's own view another name. */
export const renameView = defineWrite({
  name: 'rename.saved_view',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: renameViewInput,
  run: async ({ tx, ctx, input: { id, name }, audit, unchanged }) => {
    const key = { organisationId: ctx.organisation.id, personId: ctx.person.id, id };
    const view = await findSavedView(tx, key);
    if (!view) throw notFound('view');
    if (view.name === name) {
      unchanged();
      return { id, name };
    }
    const others = await selectSavedViews(tx, { ...key, list: view.list });
    if (others.some((other) => other.name === name)) throw takenName();
    await renameSavedView(tx, { ...key, name });
    audit({ entity: 'saved_view', entityId: id, changed: { name } });
    return { id, name };
  },
});
