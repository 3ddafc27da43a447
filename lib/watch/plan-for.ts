import type { Proof, WatchPlan } from '@/lib/diagnose/types';

/**
 * How a repair of a cause is watched: by the plan that names it, else by the one for all others.
 *
 * @returns undefined when the rulebook says nothing of watching
 */
export function planFor(proof: Pick<Proof, 'watch'> | undefined, causeId: string): WatchPlan | undefined {
  const plans = proof?.watch.plans ?? [];
  return plans.find(({ causes }) => causes.includes(causeId)) ?? plans.find(({ causes }) => causes.length === 0);
}
