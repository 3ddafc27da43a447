import { lockModel, selectModel, updateModel } from '@/db/queries/compressor-model';
import { insertRemoval } from '@/db/queries/removal';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { hideModelInput, showModelInput } from '@/lib/schemas/compressor-model';
import { defineWrite, type Work } from '../define';

/** Takes a model out of lists and choices; fits that name it stay as they are. */
export const hideModel = defineWrite({
  name: 'hide.compressor-model',
  doing: 'hide compressor models',
  roles: PERMITTED['model.edit'],
  input: hideModelInput,
  run: (work) => setHidden(work, { ...work.input, hidden: true }),
});

/** Puts a hidden model back into lists and choices. */
export const showModel = defineWrite({
  name: 'show.compressor-model',
  doing: 'show compressor models again',
  roles: PERMITTED['model.edit'],
  input: showModelInput,
  run: (work) => setHidden(work, { modelId: work.input.modelId, reason: work.input.reason ?? 'Needed again', hidden: false }),
});

async function setHidden({ tx, ctx, audit, unchanged }: Work<unknown>, { modelId, reason, hidden }: { modelId: string; reason: string; hidden: boolean }) {
  const of = { organisationId: ctx.organisation.id, modelId };
  await lockModel(tx, of);
  const model = await selectModel(tx, of);
  if (!model) throw notFound('compressor model');
  if ((model.hiddenAt !== null) === hidden) {
    unchanged();
    return { id: modelId };
  }
  const at = ctx.now();
  const kind = hidden ? 'hide' : 'show';
  await updateModel(tx, of, { hiddenAt: hidden ? at : null, updatedAt: at });
  await insertRemoval(tx, { organisationId: of.organisationId, id: newId(at.getTime()), entity: 'compressor-model', entityId: modelId, kind, reason, personId: ctx.person.id, at });
  audit({ entity: 'compressor-model', entityId: modelId, changed: { hidden, reason } });
  return { id: modelId };
}
