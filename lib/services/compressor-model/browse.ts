import { browseModels as selectModels } from '@/db/queries/browse';
import { PERMITTED } from '@/lib/auth/permissions';
import { browseModelsInput, cutPage } from '@/lib/schemas/browse';
import { defineRead } from '../define';

/** Compressor models one page after another, by name. */
export const browseModels = defineRead({
  name: 'browse.compressor-model',
  doing: 'see compressor models',
  roles: PERMITTED['model.see'],
  input: browseModelsInput,
  run: async ({ tx, ctx, input: { q, hidden, limit, cursor } }) => {
    const found = await selectModels(tx, { organisationId: ctx.organisation.id, limit: limit + 1, text: q, hidden, after: cursor });
    const { rows, next } = cutPage(found, { limit, keysOf: ({ name, id }) => [name, id] });
    return { models: rows, next };
  },
});
