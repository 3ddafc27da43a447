import { selectFit } from '@/db/queries/fit';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { hideFitInput } from '@/lib/schemas/fit';
import { defineRead } from '../define';
import { versionOf } from '../editing';
import { textsOf } from '../form-value';
import { fitFormValues } from './form-values';

/** A fit by its own id: measures in SI, and beside them what a change of it would hold. */
export const viewFit = defineRead({
  name: 'view.fit',
  doing: 'see fits',
  roles: PERMITTED['unit.see'],
  input: hideFitInput.omit({ reason: true }),
  run: async ({ tx, ctx, input }) => {
    const fit = await selectFit(tx, { organisationId: ctx.organisation.id, fitId: input.fitId });
    if (!fit) throw notFound('fit');
    return { fit, values: textsOf(fitFormValues(fit, ctx.person.units)), version: versionOf(fit) };
  },
});
