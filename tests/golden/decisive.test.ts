import { describe, expect, it } from 'vitest';
import { rank } from '@/lib/diagnose';
import { decisiveAnswers } from '@/lib/diagnose/default-rulebook/decisive-answers';
import { compiled } from './findings';

describe('an answer by itself', () => {
  it('lifts a cause over one half only where the list of decisive answers says so, and why', () => {
    const found = [...compiled.checks.values()].flatMap((check) =>
      check.stateIds.flatMap((state) => {
        const finding = { id: check.id, checkId: check.id, stage: { kind: 'diagnosis' as const }, shares: [{ state, share: 1 }], reliability: 1 };
        return rank(compiled, [finding])
          .causes.filter(({ p }) => p > 0.5)
          .map(({ causeId }) => ({ check: check.id, state, cause: causeId }));
      }),
    );
    const listed = decisiveAnswers.map(({ check, state, cause }) => ({ check, state, cause }));
    const inOrder = (list: typeof listed) => list.map((each) => Object.values(each).join(' ')).sort();
    expect(inOrder(found)).toEqual(inOrder(listed));
  });
});
