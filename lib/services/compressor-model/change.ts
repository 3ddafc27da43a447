import { lockModel, selectModel, updateModel } from '@/db/queries/compressor-model';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { changeModelInput } from '@/lib/schemas/compressor-model';
import { defineWrite } from '../define';
import { changedFields, refuseStale } from '../editing';
import { modelFormValues } from './form-values';
import { modelColumns } from './model-columns';
import { refuseTakenName } from './taken-name';

/** Changes a compressor model; refused when somebody else changed it since the form was opened. */
export const changeModel = defineWrite({
  name: 'change.compressor-model',
  doing: 'change compressor models',
  roles: PERMITTED['model.edit'],
  input: changeModelInput,
  run: async ({ tx, ctx, input, audit, unchanged }) => {
    const { modelId, version, ...facts } = input;
    const of = { organisationId: ctx.organisation.id, modelId };
    await lockModel(tx, of);
    const before = await selectModel(tx, of);
    if (!before) throw notFound('compressor model');
    refuseStale(before, { version, what: 'model', typed: facts, stored: modelFormValues(before, ctx.person.units) });

    const next = modelColumns(ctx, facts, before);
    const changed = changedFields(before, next);
    if (Object.keys(changed).length === 0) {
      unchanged();
      return { id: modelId };
    }
    await refuseTakenName({ tx, ctx }, { name: next.name, modelId });
    await updateModel(tx, of, { ...changed, updatedAt: ctx.now() });
    audit({ entity: 'compressor-model', entityId: modelId, changed });
    return { id: modelId };
  },
});
