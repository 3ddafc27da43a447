import { selectSavedViews } from '@/db/queries/saved-view';
import { PERMITTED } from '@/lib/auth/permissions';
import { listSavedViewsInput } from '@/lib/schemas/saved-view';
import { defineRead } from '../define';

/** The reader's own views of a list. */
export const listSavedViews = defineRead({
  name: 'list.saved_view',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: listSavedViewsInput,
  run: ({ tx, ctx, input }) => selectSavedViews(tx, { organisationId: ctx.organisation.id, personId: ctx.person.id, list: input.list }),
});
