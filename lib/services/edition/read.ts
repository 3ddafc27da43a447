import { z } from 'zod';
import { selectEdition } from '@/db/queries/edition';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { defineRead } from '../define';

/** An edition whole, for a device to rank with. It never changes. */
export const readEdition = defineRead({
  name: 'read.edition',
  doing: 'see the rulebook',
  roles: PERMITTED['case.see'],
  input: z.strictObject({ editionId: z.uuid('This id is not a uuid.') }),
  run: async ({ tx, ctx, input }) => {
    const edition = await selectEdition(tx, { organisationId: ctx.organisation.id, editionId: input.editionId });
    if (!edition) throw notFound('edition');
    return { id: input.editionId, rulebook: edition.rulebook };
  },
});
