import { requireAmount, requireCount } from '../require';
import type { TwoSided } from '../result';
import { wilson } from '../wilson';

export interface CauseCount {
  readonly cause: string;
  readonly count: number;
  /** Of all its failures together, in one currency. */
  readonly cost?: number;
  /** What all that could fail of it ran; absent where the fleet's counts. */
  readonly miles?: number;
}

export interface ParetoBar extends CauseCount {
  readonly share: number;
  readonly limits: TwoSided;
  readonly cumulativePercent: number;
}

/**
 * Causes by count, the most frequent first, then by name; each share with Wilson's limits.
 *
 * @returns [] when nothing was counted
 * @throws RangeError for what is no count
 * @example pareto([{ cause: 'oil', count: 3 }, { cause: 'air', count: 1 }])[0]?.cumulativePercent // 75
 */
export function pareto(causes: readonly CauseCount[]): ParetoBar[] {
  for (const { count } of causes) requireCount(count);
  const total = causes.reduce((sum, { count }) => sum + count, 0);
  let running = 0;
  return causes.toSorted((a, b) => b.count - a.count || byName(a, b)).flatMap((cause) => {
    running += cause.count;
    const share = wilson(cause.count, total);
    return share.kind === 'estimated' ? [{ ...cause, share: share.share, limits: share.limits, cumulativePercent: (100 * running) / total }] : [];
  });
}

const byName = (a: Pick<CauseCount, 'cause'>, b: Pick<CauseCount, 'cause'>) => (a.cause < b.cause ? -1 : a.cause > b.cause ? 1 : 0);

/**
 * The same causes by cost, or by failures per million miles: the order often turns around. Causes of which that is not known
 * are left out.
 *
 * @throws RangeError for a negative cost or distance
 */
export function rankedBy(causes: readonly CauseCount[], by: 'cost' | 'rate'): { cause: string; value: number }[] {
  return causes
    .flatMap((cause) => {
      const { count, cost, miles } = cause;
      if (cost !== undefined) requireAmount(cost, 'A cost');
      if (miles !== undefined) requireAmount(miles, 'A distance');
      const value = by === 'cost' ? cost : miles ? (1e6 * count) / miles : undefined;
      return value === undefined ? [] : [{ cause: cause.cause, value }];
    })
    .sort((a, b) => b.value - a.value || byName(a, b));
}
