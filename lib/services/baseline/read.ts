import { selectUnit } from '@/db/queries/unit';
import { FIGURE_IDS } from '@/lib/baseline/figures';
import { PERMITTED } from '@/lib/auth/permissions';
import { siteDay } from '@/lib/case/site-day';
import { notFound } from '@/lib/errors';
import { unitIdInput } from '@/lib/schemas/unit';
import { defineRead } from '../define';
import { gatherBaseline } from './gather';

/** What a unit is compared with, figure by figure, and where that comes from. Measures are SI. */
export const readBaseline = defineRead({
  name: 'read.baseline',
  doing: 'see units',
  roles: PERMITTED['unit.see'],
  input: unitIdInput,
  run: async ({ tx, ctx, input: { unitId } }) => {
    const of = { organisationId: ctx.organisation.id, unitId };
    const unit = await selectUnit(tx, of);
    if (!unit) throw notFound('unit');
    const { sets, pooled, since, model, counts } = await gatherBaseline(tx, { ...of, on: siteDay(ctx.now(), unit.timeZone) });
    return {
      unitId,
      model,
      since,
      figures: FIGURE_IDS.map((figure) => ({ figure, counts: counts[figure] ?? null, pooled: pooled[figure] ?? null })),
      sets,
    };
  },
});
export type UnitBaseline = Awaited<ReturnType<typeof readBaseline>>;
