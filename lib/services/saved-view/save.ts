import { findSavedView, insertSavedView, selectSavedViews } from '@/db/queries/saved-view';
import { PERMITTED } from '@/lib/auth/permissions';
import { conflict, invalid } from '@/lib/errors';
import { filtersOf, saveViewInput } from '@/lib/schemas/saved-view';
import { defineWrite } from '../define';

/** More than anybody reads through. */
const MOST = 30;

/** Keeps the filters of a list under a name, for the person who saves them. What the list doesn't know is left out. */
export const saveView = defineWrite({
  name: 'save.saved_view',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: saveViewInput,
  run: async ({ tx, ctx, input, audit, unchanged }) => {
    const owner = { organisationId: ctx.organisation.id, personId: ctx.person.id };
    const { id, list, name } = input;
    const query = filtersOf(input.query);
    const held = await findSavedView(tx, { ...owner, id });
    if (held) {
      unchanged();
      return held;
    }
    const views = await selectSavedViews(tx, { ...owner, list });
    if (views.length >= MOST) throw conflict(`${MOST} views are kept. Delete one that you don’t use first.`);
    if (views.some((view) => view.name === name)) throw takenName();
    if (!(await insertSavedView(tx, { ...owner, id, list, name, query }))) throw takenName();
    audit({ entity: 'saved_view', entityId: id, changed: { list, name, query } });
    return { id, list, name, query };
  },
});

export const takenName = () => invalid({ name: 'You have a view of this name. Give this one another.' });
