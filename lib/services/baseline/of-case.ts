import type { Executor } from '@/db/connect';
import type { Baseline } from '@/lib/baseline/baseline-for';
import { isFigureId } from '@/lib/baseline/figures';
import { siteDay } from '@/lib/case/site-day';
import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import { gatherBaseline } from './gather';

interface Of {
  organisationId: string;
  head: { unitId: string; timeZone: string };
  compiled: CompiledRulebook;
  now: Date;
}

/** What counts, by the checks of a case that compare with something. */
export async function baselinesOfCase(tx: Executor, { organisationId, head, compiled, now }: Of): Promise<Record<string, Baseline>> {
  const comparing = compiled.rulebook.checks.flatMap(({ id, compares }) => (compares && isFigureId(compares) ? [{ id, compares }] : []));
  if (comparing.length === 0) return {};
  const { counts } = await gatherBaseline(tx, { organisationId, unitId: head.unitId, on: siteDay(now, head.timeZone) });
  return Object.fromEntries(comparing.flatMap(({ id, compares }) => (counts[compares] ? [[id, counts[compares]]] : [])));
}
