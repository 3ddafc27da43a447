import { selectBreakInEvents, selectBreakInRuns, type BreakInEventRow, type BreakInRunRow } from '@/db/queries/break-in';
import { PERMITTED } from '@/lib/auth/permissions';
import { unreadOf } from '@/lib/case/view/work-cautions';
import type { BreakInFigures } from '@/lib/break-in';
import { breakInInput, type BreakInRunView, type BreakInView } from '@/lib/schemas/break-in';
import { measureUnit } from '@/lib/schemas/measures';
import { formatQuantity, type UnitPreferences } from '@/lib/units';
import { workOn } from '../case/work-on';
import { defineRead } from '../define';
import { breakInWork, compressorOf, figuresFor } from './work';

/** The break-in runs of a case, and by which figures one begun now would go. */
export const readBreakIn = defineRead({
  name: 'read.break-in',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: breakInInput,
  run: async ({ tx, ctx, input: { caseId } }): Promise<BreakInView> => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const { caseHead, compiled, acknowledged } = await workOn(tx, ctx, caseId);
    const compressor = await compressorOf(tx, { ...of, unitId: caseHead.unitId });
    const figures = figuresFor(compiled, compressor?.model);
    const events = await selectBreakInEvents(tx, of);
    const { units } = ctx.person;
    return {
      caseId,
      ...unreadOf(compiled, breakInWork(compiled), acknowledged),
      figures,
      modelName: compressor?.model.name ?? null,
      bleed: figures ? bleedInputs(figures, compressor?.model ?? null) : {},
      runs: (await selectBreakInRuns(tx, of)).map((row) => runView(row, events.filter(({ runId }) => runId === row.id), units)),
    };
  },
});

function runView({ fitId: _, startedAt, endedAt, ...row }: BreakInRunRow, events: readonly BreakInEventRow[], units: UnitPreferences): BreakInRunView {
  return {
    ...row,
    startedAt: startedAt.toISOString(),
    endedAt: endedAt?.toISOString() ?? null,
    events: events.map(({ id, kind, at, reason, pressurePa, by }) => ({ id, kind, at: at.toISOString(), reason, pressure: pressurePa === null ? null : pressureText(pressurePa, units), pressurePa, by })),
  };
}

const pressureText = (pa: number, units: UnitPreferences) => formatQuantity(pa, { quantity: 'pressure', unit: measureUnit(units, { quantity: 'pressure' }) as 'psi' });

/** What the bench's sum of the bleed is opened with. */
function bleedInputs({ engineRpm, pressure }: BreakInFigures, model: { displacementM3: number | null; driveRatio: number | null } | null): Record<string, string> {
  return {
    engineSpeed: `${engineRpm} rpm`,
    holdPressure: formatQuantity(pressure.aim, { quantity: 'pressure', unit: 'psi' }),
    ...(model?.displacementM3 != null && { displacement: formatQuantity(model.displacementM3, { quantity: 'displacement', unit: 'in3' }) }),
    ...(model?.driveRatio != null && { driveRatio: String(model.driveRatio) }),
  };
}
