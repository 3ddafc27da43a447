import type { Transaction } from '@/db/connect';
import { selectBreakInRuns, type BreakInEventRow, type BreakInRunRow } from '@/db/queries/break-in';
import { selectModel } from '@/db/queries/compressor-model';
import { selectFit, selectFitsOfUnit } from '@/db/queries/fit';
import { selectFittings } from '@/db/queries/fitting';
import type { BreakInFigures, Run } from '@/lib/break-in';
import type { CompiledRulebook } from '@/lib/diagnose';
import type { Check } from '@/lib/diagnose/types';
import { notFound } from '@/lib/errors';

interface OfCase {
  organisationId: string;
  caseId: string;
}

/** A run as its cautions see it: the engine runs. */
export const breakInWork = ({ rulebook }: Pick<CompiledRulebook, 'rulebook'>): Pick<Check, 'cautions' | 'setUp'> => ({ cautions: rulebook.proof?.breakIn.cautions ?? [], setUp: { engine: 'idle' } });

type Model = NonNullable<Awaited<ReturnType<typeof selectModel>>>;

/** The compressor that is run in: the one fitted in this case, else the one on the unit. */
export async function compressorOf(tx: Transaction, { unitId, ...of }: OfCase & { unitId: string }): Promise<{ fitId: string; model: Model } | null> {
  const fitted = (await selectFittings(tx, of)).at(-1)?.fitId;
  const fit = fitted ? await selectFit(tx, { ...of, fitId: fitted }) : (await selectFitsOfUnit(tx, { ...of, unitId })).find(({ removedOn }) => removedOn === null);
  const model = fit && (await selectModel(tx, { ...of, modelId: fit.modelId }));
  return fit && model ? { fitId: fit.id, model } : null;
}

/** The figures that hold for a compressor: its model's own where they are recorded, or the edition's. */
export function figuresFor({ rulebook }: Pick<CompiledRulebook, 'rulebook'>, model: Model | undefined): BreakInFigures | null {
  const edition = rulebook.proof?.breakIn;
  if (!edition) return null;
  const { engineRpm, pressure, duration, source } = edition;
  if (!model || model.breakInSource === null) return { engineRpm, pressure, duration, from: 'edition', source: source ?? null };
  const aim = model.breakInPressurePa ?? pressure.aim;
  return {
    engineRpm: model.breakInEngineRpm ?? engineRpm,
    // Another pressure to hold keeps the width of the band.
    pressure: { aim, low: aim - (pressure.aim - pressure.low), high: aim + (pressure.high - pressure.aim) },
    duration: { least: model.breakInLeastS ?? duration.least, most: Math.max(model.breakInMostS ?? duration.most, model.breakInLeastS ?? duration.least) },
    from: 'model',
    source: model.breakInSource,
  };
}

export async function breakInRunOf(tx: Transaction, { runId, ...of }: OfCase & { runId: string }): Promise<BreakInRunRow> {
  const row = (await selectBreakInRuns(tx, of)).find(({ id }) => id === runId);
  if (!row) throw notFound('break-in run');
  return row;
}

/** A run as the arithmetic of its time takes it. */
export const runOf = ({ id, startedAt, endedAt }: Pick<BreakInRunRow, 'id' | 'startedAt' | 'endedAt'>, events: readonly BreakInEventRow[]): Run => ({
  startedAt: startedAt.getTime(),
  endedAt: endedAt?.getTime() ?? null,
  events: events.filter(({ runId }) => runId === id).map((event) => ({ ...event, at: event.at.getTime() })),
});
