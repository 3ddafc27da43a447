import { insertLimit, selectLimits } from '@/db/queries/limit';
import { selectModel } from '@/db/queries/compressor-model';
import { PERMITTED } from '@/lib/auth/permissions';
import { conflict, invalid } from '@/lib/errors';
import { adoptLimitInput } from '@/lib/schemas/limit';
import { measureOf } from '@/lib/case/view/measure';
import { defineWrite } from '../define';
import { readMeasures } from '../units-of-measure';
import { checkInForce } from './check-in-force';

/** Adopts a limit for a measured check. What was judged before stays as it was judged. */
export const adoptLimit = defineWrite({
  name: 'adopt.limit',
  doing: 'adopt limits',
  roles: PERMITTED['limit.adopt'],
  input: adoptLimitInput,
  run: async ({ tx, ctx, input, audit, unchanged }) => {
    const organisationId = ctx.organisation.id;
    const { id, checkId, modelId, least: _, most: __, ...rest } = input;
    if ((await selectLimits(tx, { organisationId, checkId })).some((limit) => limit.id === id)) {
      unchanged();
      return { id };
    }
    if (rest.builtFrom && rest.builtBefore && rest.builtFrom >= rest.builtBefore) throw invalid({ builtBefore: 'That is not after the first day.' });
    const check = await checkInForce(tx, { organisationId, checkId });
    const measure = check && measureOf(check, ctx.person.units);
    if (!check || !measure) throw invalid({ checkId: 'This check is not measured, or not in the rulebook.' });
    if (modelId && !(await selectModel(tx, { organisationId, modelId }))) throw invalid({ modelId: 'There is no such model.' });
    const like = { quantity: measure.quantity, like: measure.unit };
    const { columns, asTyped } = readMeasures(ctx, [{ field: 'least', column: 'leastSi', ...like }, { field: 'most', column: 'mostSi', ...like }], input);
    if (columns.leastSi === null && columns.mostSi === null) throw invalid({ most: 'Give the least, the most, or both.' });
    if (columns.leastSi !== null && columns.mostSi !== null && columns.leastSi >= columns.mostSi) throw invalid({ most: 'That is not more than the least.' });
    const row = { ...rest, ...columns, checkId, modelId, asTyped };
    const written = await insertLimit(tx, { ...row, organisationId, id, personId: ctx.person.id, createdAt: ctx.now() });
    if (!written) throw conflict('This id belongs to a limit that was withdrawn. Adopt another.');
    audit({ entity: 'limit', entityId: id, changed: { ...row, checkName: check.name } });
    return { id };
  },
});
