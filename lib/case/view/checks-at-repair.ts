import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import { dangersOf } from '@/lib/diagnose/cautions';
import type { Condition, Remedy, RootCondition } from '@/lib/diagnose/types';

/** From this weight on an answer speaks strongly: decibans. */
const STRONGLY = 10;

/** More than this is a list to read. */
const MOST = 8;

/**
 * What to look at when something is opened for a remedy: the checks that speak strongly for or against one of its causes,
 * those first that can be seen only with something open.
 *
 * @returns ids of checks
 */
export function checksAtRepair({ rulebook }: Pick<CompiledRulebook, 'rulebook'>, remedy: Pick<Remedy, 'causes'>): string[] {
  const weights = new Map<string, number>();
  for (const rule of rulebook.rules) {
    const [checkId, ...others] = new Set(factsIn(rule.conditions));
    if (checkId === undefined || others.length > 0) continue;
    const weight = Math.max(0, ...remedy.causes.map((cause) => Math.abs(rule.weights[cause] ?? 0)));
    weights.set(checkId, Math.max(weights.get(checkId) ?? 0, weight));
  }
  const opened = new Set(rulebook.checks.filter(({ setUp }) => dangersOf(setUp).includes('system-opened')).map(({ id }) => id));
  return [...weights]
    .filter(([, weight]) => weight >= STRONGLY)
    .sort(([a, weightA], [b, weightB]) => Number(opened.has(b)) - Number(opened.has(a)) || weightB - weightA || (a < b ? -1 : 1))
    .slice(0, MOST)
    .map(([checkId]) => checkId);
}

function factsIn(condition: RootCondition | Condition): string[] {
  if ('fact' in condition) return [condition.fact];
  return ('all' in condition ? condition.all : condition.any).flatMap(factsIn);
}
