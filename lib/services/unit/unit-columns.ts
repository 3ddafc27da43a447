import type { z } from 'zod';
import type { UnitRow } from '@/db/queries/unit';
import { UNIT_MEASURES } from '@/lib/schemas/measures';
import type { changeUnitInput } from '@/lib/schemas/unit';
import type { Ctx } from '../context';
import { latestToday, refuseFutureDay } from '../days';
import { readMeasures } from '../units-of-measure';

type Facts = Omit<z.output<typeof changeUnitInput>, 'unitId' | 'version'>;

/** The columns of a unit from what its form holds; `before` is the row that is being changed. */
export function unitColumns(ctx: Ctx, { reservoirs, requiredReservoirs, country, ...plain }: Facts, before?: UnitRow) {
  const { columns, asTyped } = readMeasures(ctx, UNIT_MEASURES, { reservoirs, requiredReservoirs }, before);
  refuseFutureDay({ builtOn: plain.builtOn, dryerCartridgeChangedOn: plain.dryerCartridgeChangedOn }, latestToday(ctx.now()));
  return { ...plain, ...columns, country: country ?? before?.country ?? ctx.organisation.country, asTyped };
}
