import { selectCurrentFits } from '@/db/queries/fit';
import { selectUnits } from '@/db/queries/unit';
import { selectLatestOdometers } from '@/db/queries/unit-reading';
import { PERMITTED } from '@/lib/auth/permissions';
import { ROWS_A_PAGE } from '@/lib/schemas/list';
import { listUnitsInput } from '@/lib/schemas/unit';
import { holdsByUnit } from '../case/holds-of-unit';
import { defineRead } from '../define';

/** Units by filter, each with the compressor that is on it and its last odometer. */
export const listUnits = defineRead({
  name: 'list.unit',
  doing: 'see units',
  roles: PERMITTED['unit.see'],
  input: listUnitsInput,
  run: async ({ tx, ctx, input }) => {
    const organisationId = ctx.organisation.id;
    const { rows, total } = await selectUnits(tx, {
      organisationId,
      text: input.q || undefined,
      siteId: input.site,
      vocation: input.vocation,
      vehicleKind: input.kind,
      hidden: input.hidden === 'yes',
      sort: input.sort,
      direction: input.direction,
      limit: ROWS_A_PAGE,
      offset: (input.page - 1) * ROWS_A_PAGE,
    });
    const unitIds = rows.map((row) => row.id);
    const fits = new Map((await selectCurrentFits(tx, { organisationId, unitIds })).map((fit) => [fit.unitId, fit]));
    const odometers = new Map((await selectLatestOdometers(tx, { organisationId, unitIds })).map((reading) => [reading.unitId, reading]));
    const holds = await holdsByUnit(tx, { organisationId, unitIds });
    return {
      units: rows.map((row) => ({
        ...row,
        /** Names of the checks that forbid its release. */
        holds: holds.get(row.id) ?? [],
        modelName: fits.get(row.id)?.modelName ?? null,
        installedOn: fits.get(row.id)?.installedOn ?? null,
        odometerM: odometers.get(row.id)?.odometerM ?? null,
        readOn: odometers.get(row.id)?.readOn ?? null,
      })),
      query: input,
      total,
      pages: Math.max(1, Math.ceil(total / ROWS_A_PAGE)),
    };
  },
});
export type UnitList = Awaited<ReturnType<typeof listUnits>>;
