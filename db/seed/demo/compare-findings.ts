import { baselineFor } from '@/lib/baseline/baseline-for';
import { isFigureId, type FigureId } from '@/lib/baseline/figures';
import { pool } from '@/lib/baseline/pool';
import type { BaselineSet } from '@/lib/baseline/set';
import type { CompiledRulebook } from '@/lib/diagnose';
import type { DemoRows, Row } from './rows';

/** Keeps with each measured answer what counted when it was given, as the service does: only sets that were there then. */
export function compareFindings(rows: DemoRows, { checks }: CompiledRulebook): void {
  const sets = rows.baselineSet.map((set) => ({ ...set, figures: figuresOf(rows.baselineFigure.filter(({ setId }) => setId === set.id)) }));
  const cases = new Map(rows.cases.map((row) => [row.id, row]));
  const fits = new Map(rows.fit.map((row) => [row.id, row]));
  for (const finding of rows.finding) {
    const figure = checks.get(finding.checkId)?.check.compares;
    const { unitId, fitId } = cases.get(finding.caseId) ?? {};
    if (!figure || !isFigureId(figure) || typeof finding.valueSi !== 'number') continue;
    const fit = fits.get(fitId ?? '');
    const then = sets.filter(({ createdAt }) => createdAt && createdAt < finding.receivedAt);
    const own = then.filter((set) => set.unitId === unitId);
    const pooled = fit ? pool(then.filter(({ modelId }) => modelId === fit.modelId)) : {};
    finding.baseline = baselineFor({ own, since: fit?.installedOn ?? null, pooled })[figure] ?? null;
  }
}

const figuresOf = (rows: readonly Row<'baselineFigure'>[]): BaselineSet['figures'] =>
  Object.fromEntries(rows.map(({ figure, valueSi, errorSi }): [FigureId, { si: number; errorSi: number }] => [figure, { si: valueSi, errorSi }]));
