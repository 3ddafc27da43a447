import { describe, expect, it } from 'vitest';
import { NORMAL_CARRYOVER, rank, SOMETHING_ELSE } from '@/lib/diagnose';
import { compiled, findingsOf, reads, says } from './findings';
import { otherCauses } from './other-causes';
import { teachingCases } from './teaching-cases';
import { mm, psiPerMinute } from '@/lib/diagnose/default-rulebook/si';

describe('a short case', () => {
  it.each(otherCauses)('of $expected puts it first: $told', ({ expected, findings }) => {
    const { causes, fit } = rank(compiled, findingsOf(findings));
    expect(causes[0]?.causeId).toBe(expected);
    expect(fit).toEqual({ fits: true });
  });

  it('is there for every cause, here or among the teaching cases', () => {
    const named = new Set([...otherCauses.map(({ expected }) => expected), ...teachingCases.flatMap(({ expected }) => expected)]);
    expect(compiled.causeIds.filter((id) => !named.has(id))).toEqual([SOMETHING_ELSE]);
  });
});

describe('a film of oil', () => {
  it('is not called normal where the air system is out of its limits', () => {
    const { causes } = rank(compiled, findingsOf([says('oil-amount', 'film'), reads('leak-down-released', psiPerMinute(8)), reads('line-bore', mm(4))]));
    expect(causes[0]?.causeId).not.toBe(NORMAL_CARRYOVER);
  });
});
