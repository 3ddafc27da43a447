import { selectModelByName } from '@/db/queries/compressor-model';
import { conflict } from '@/lib/errors';
import type { Work } from '../define';

/** @throws AppError "conflict" beside `name` when another model has it */
export async function refuseTakenName({ tx, ctx }: Pick<Work<unknown>, 'tx' | 'ctx'>, { name, modelId }: { name: string; modelId: string }): Promise<void> {
  const other = await selectModelByName(tx, { organisationId: ctx.organisation.id, name });
  if (other && other.id !== modelId) throw taken(other.name, other.hiddenAt !== null);
}

export function taken(name: string, hidden = false) {
  const message = hidden ? `${name} is in the list of hidden models. Show it again, or choose another name.` : `There is a model ${name} already.`;
  return conflict(message, { name: message });
}
