import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import { limitText, type Limit } from '@/lib/limits';
import type { CaseView } from '@/lib/schemas/case-view';
import type { UnitPreferences } from '@/lib/units';
import { measureOf } from './measure';

/** The limits that a case's measured values are judged by, in words. */
export function limitViews(limits: ReadonlyMap<string, Limit>, { checks }: Pick<CompiledRulebook, 'checks'>, units: UnitPreferences): CaseView['limits'] {
  return Object.fromEntries(
    [...limits].flatMap(([checkId, limit]) => {
      const check = checks.get(checkId)?.check;
      const measure = check && measureOf(check, units);
      return measure ? [[checkId, { text: limitText(limit, measure), source: limit.source }]] : [];
    }),
  );
}
