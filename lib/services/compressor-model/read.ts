import { selectModel } from '@/db/queries/compressor-model';
import { selectUnitsWithModel } from '@/db/queries/fit';
import { selectLastRemoval } from '@/db/queries/removal';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { modelIdInput } from '@/lib/schemas/compressor-model';
import { defineRead } from '../define';
import { versionOf } from '../editing';
import { textsOf } from '../form-value';
import { modelFormValues } from './form-values';

/** A compressor model and the units that one is on. */
export const readModel = defineRead({
  name: 'read.compressor-model',
  doing: 'see compressor models',
  roles: PERMITTED['model.see'],
  input: modelIdInput,
  run: async ({ tx, ctx, input }) => {
    const of = { organisationId: ctx.organisation.id, modelId: input.modelId };
    const model = await selectModel(tx, of);
    if (!model) throw notFound('compressor model');
    return {
      model,
      units: await selectUnitsWithModel(tx, of),
      hidden: model.hiddenAt ? await selectLastRemoval(tx, { organisationId: of.organisationId, entity: 'compressor-model', entityId: model.id }) : undefined,
    };
  },
});

/** What the form of a model is opened with. */
export const readModelForm = defineRead({
  name: 'read.compressor-model-form',
  doing: 'change compressor models',
  roles: PERMITTED['model.edit'],
  input: modelIdInput,
  run: async ({ tx, ctx, input }) => {
    const model = await selectModel(tx, { organisationId: ctx.organisation.id, modelId: input.modelId });
    if (!model) throw notFound('compressor model');
    return { name: model.name, version: versionOf(model), values: textsOf(modelFormValues(model, ctx.person.units)) };
  },
});
