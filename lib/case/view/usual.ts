import { usualOf, type Baseline } from '@/lib/baseline/baseline-for';
import { figureOf } from '@/lib/baseline/figures';
import { comparisonText, figureText, usualText } from '@/lib/baseline/words';
import type { Check } from '@/lib/diagnose/types';
import type { UnitPreferences } from '@/lib/units';

/** What is usual, by the checks that compare with it. */
export const usualViews = (baselines: Readonly<Record<string, Baseline>>, units: UnitPreferences): Record<string, string> =>
  Object.fromEntries(Object.entries(baselines).map(([checkId, baseline]) => [checkId, usualText(baseline, units)]));

interface Answered {
  valueSi: number | null;
  baseline: Baseline | null;
}

/**
 * How an answer stands to what was usual when it was given, with both; null where nothing was compared. Some checks ask
 * for the difference itself: then what was read is what was usual and the difference.
 */
export function comparedText(check: Check | undefined, { valueSi, baseline }: Answered, units: UnitPreferences): string | null {
  if (!check || valueSi === null || !baseline) return null;
  const { figure } = baseline;
  if (check.quantity === figureOf(figure).quantity) return comparisonText(valueSi, baseline, units);
  const read = usualOf(baseline) + valueSi;
  return `${figureText(figure, read, units)}: ${comparisonText(read, baseline, units)}`;
}

/** What an answer was compared with is kept with it: what was measured, or worked out. */
export const comparedWith = (checkId: string, { valueSi }: Pick<Answered, 'valueSi'>, baselines: Readonly<Record<string, Baseline>> = {}): Baseline | null =>
  valueSi === null ? null : (baselines[checkId] ?? null);
