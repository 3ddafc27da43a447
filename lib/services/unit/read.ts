import { selectCasesOfUnit } from '@/db/queries/case-of-unit';
import { selectFitsOfUnit, type FitRow } from '@/db/queries/fit';
import { selectLastRemoval } from '@/db/queries/removal';
import { selectUnit } from '@/db/queries/unit';
import { selectReadings, type ReadingRow } from '@/db/queries/unit-reading';
import type { Transaction } from '@/db/connect';
import { may, PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { unitIdInput } from '@/lib/schemas/unit';
import { siteDay } from '@/lib/case/site-day';
import { standingHolds } from '../case/holds-of-unit';
import type { Ctx } from '../context';
import { defineRead } from '../define';
import { liftedHolds } from '../unit-hold/list';
import { versionOf } from '../editing';
import { compiledEdition } from '../edition/compiled';
import { textsOf } from '../form-value';
import { unitFormValues } from './form-values';
import { currentFitOn } from './record-facts';
import { runSince } from './run-since';

/** A unit with all that happened to it: fits, readings and, for those who see cases, its cases. */
export const readUnit = defineRead({
  name: 'read.unit',
  doing: 'see units',
  roles: PERMITTED['unit.see'],
  input: unitIdInput,
  run: async ({ tx, ctx, input }) => {
    const of = { organisationId: ctx.organisation.id, unitId: input.unitId };
    const unit = await selectUnit(tx, of);
    if (!unit) throw notFound('unit');
    const today = siteDay(ctx.now(), unit.timeZone);
    const fits = await selectFitsOfUnit(tx, of);
    const readings = await selectReadings(tx, of);
    return {
      unit,
      today,
      fits: fits.map((fit) => ({ ...fit, ranM: ranSince(fit, readings, today) })),
      currentFit: currentFitOn(fits, today) ?? null,
      holds: await standingHolds(tx, of),
      lifted: await liftedHolds(tx, of),
      readings,
      cases: may(ctx.roles, 'case.see') ? await casesOf(tx, ctx, { unitId: of.unitId, timeZone: unit.timeZone }) : [],
      hidden: unit.hiddenAt ? await selectLastRemoval(tx, { ...of, entity: 'unit', entityId: of.unitId }) : undefined,
    };
  },
});
export type UnitPage = Awaited<ReturnType<typeof readUnit>>;

/** How far a compressor ran, up to its coming out or the last reading; null when the record can't tell. */
function ranSince({ installedOn, installedOdometerM, removedOn }: FitRow, readings: readonly ReadingRow[], today: string): number | null {
  if (installedOdometerM === null) return null;
  const series = readings.map(({ readOn, odometerM, odometerReplaced }) => ({ readOn, value: odometerM, replaced: odometerReplaced }));
  const { sum, lastReadOn } = runSince({ readOn: installedOn, value: installedOdometerM }, series, removedOn ?? today);
  return lastReadOn > installedOn ? sum : null;
}

/** The cases with their complaints and cause in the words of their edition. */
async function casesOf(tx: Transaction, ctx: Ctx, { unitId, timeZone }: { unitId: string; timeZone: string }) {
  const organisationId = ctx.organisation.id;
  const rows = await selectCasesOfUnit(tx, { organisationId, unitId });
  return Promise.all(
    rows.map(async ({ editionId, complaints, mainCause, openedAt, closedAt, ...row }) => {
      const { rulebook, checks } = await compiledEdition(tx, { organisationId, editionId });
      return {
        ...row,
        openedOn: siteDay(openedAt, timeZone),
        closedOn: closedAt && siteDay(closedAt, timeZone),
        complaints: complaints.map((id) => checks.get(id)?.check.name ?? id),
        cause: mainCause && (rulebook.causes.find((cause) => cause.id === mainCause)?.name ?? mainCause),
      };
    }),
  );
}

/** What the form of a unit is opened with. */
export const readUnitForm = defineRead({
  name: 'read.unit-form',
  doing: 'change units',
  roles: PERMITTED['unit.edit'],
  input: unitIdInput,
  run: async ({ tx, ctx, input }) => {
    const unit = await selectUnit(tx, { organisationId: ctx.organisation.id, unitId: input.unitId });
    if (!unit) throw notFound('unit');
    return { fleetNumber: unit.fleetNumber, version: versionOf(unit), values: textsOf(unitFormValues(unit, ctx.person.units)) };
  },
});
