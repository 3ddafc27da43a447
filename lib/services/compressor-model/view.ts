import { selectModel } from '@/db/queries/compressor-model';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { modelIdInput } from '@/lib/schemas/compressor-model';
import { defineRead } from '../define';
import { versionOf } from '../editing';
import { textsOf } from '../form-value';
import { modelFormValues } from './form-values';

/** A compressor model: measures in SI, and beside them what a change of it would hold. */
export const viewModel = defineRead({
  name: 'view.compressor-model',
  doing: 'see compressor models',
  roles: PERMITTED['model.see'],
  input: modelIdInput,
  run: async ({ tx, ctx, input }) => {
    const model = await selectModel(tx, { organisationId: ctx.organisation.id, modelId: input.modelId });
    if (!model) throw notFound('compressor model');
    return { model, values: textsOf(modelFormValues(model, ctx.person.units)), version: versionOf(model) };
  },
});
