import { insertModel, selectModel } from '@/db/queries/compressor-model';
import { PERMITTED } from '@/lib/auth/permissions';
import { createModelInput } from '@/lib/schemas/compressor-model';
import { defineWrite } from '../define';
import { modelColumns } from './model-columns';
import { refuseTakenName, taken } from './taken-name';

/** Adds a compressor model. Sent twice (the same id), it adds one. */
export const createModel = defineWrite({
  name: 'create.compressor-model',
  doing: 'add compressor models',
  roles: PERMITTED['model.edit'],
  input: createModelInput,
  run: async ({ tx, ctx, input, audit, unchanged }) => {
    const { id, ...facts } = input;
    const organisationId = ctx.organisation.id;
    if (await selectModel(tx, { organisationId, modelId: id })) {
      unchanged();
      return { id };
    }
    const row = modelColumns(ctx, facts);
    await refuseTakenName({ tx, ctx }, { name: row.name, modelId: id });
    if (!(await insertModel(tx, { ...row, organisationId, id, createdBy: ctx.person.id }))) throw taken(row.name);
    audit({ entity: 'compressor-model', entityId: id, changed: row });
    return { id };
  },
});
