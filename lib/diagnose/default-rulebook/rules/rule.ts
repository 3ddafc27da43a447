import { SOMETHING_ELSE, type RootCondition } from '../../types';
import { causes } from '../causes';

/** Holds when a check was answered so. */
export function answer(check: string, state: string): RootCondition {
  return { all: [{ fact: check, operator: 'equal', value: state }] };
}

/** Holds when what was measured lies in a band, half-open, in SI. */
export function band(check: string, { from, below }: { from?: number; below?: number }): RootCondition {
  return {
    all: [
      ...(from === undefined ? [] : [{ fact: check, operator: 'greaterThanInclusive' as const, value: from }]),
      ...(below === undefined ? [] : [{ fact: check, operator: 'lessThan' as const, value: below }]),
    ],
  };
}

/** Holds when all of these do. */
export function together(...conditions: RootCondition[]): RootCondition {
  return { all: conditions };
}

/**
 * The same weight for every listed cause; spread first, with the causes that differ after it. What is common with one
 * cause is rarer with the others than in all cases, and has to count against them.
 */
export function others(weight: number, { except = [] }: { except?: string[] } = {}): Record<string, number> {
  const ids = causes.map((cause) => cause.id).filter((id) => id !== SOMETHING_ELSE && !except.includes(id));
  return Object.fromEntries(ids.map((id) => [id, weight]));
}
