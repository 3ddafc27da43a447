import { selectModels } from '@/db/queries/compressor-model';
import { PERMITTED } from '@/lib/auth/permissions';
import { listModelsInput } from '@/lib/schemas/compressor-model';
import { ROWS_A_PAGE } from '@/lib/schemas/list';
import { defineRead } from '../define';

/** Compressor models by filter, each with how many are on units now. */
export const listModels = defineRead({
  name: 'list.compressor-model',
  doing: 'see compressor models',
  roles: PERMITTED['model.see'],
  input: listModelsInput,
  run: async ({ tx, ctx, input }) => {
    const { rows, total } = await selectModels(tx, {
      organisationId: ctx.organisation.id,
      text: input.q || undefined,
      drainOpening: input.drain,
      hidden: input.hidden === 'yes',
      sort: input.sort,
      direction: input.direction,
      limit: ROWS_A_PAGE,
      offset: (input.page - 1) * ROWS_A_PAGE,
    });
    return { models: rows, query: input, total, pages: Math.max(1, Math.ceil(total / ROWS_A_PAGE)) };
  },
});
export type ModelList = Awaited<ReturnType<typeof listModels>>;
