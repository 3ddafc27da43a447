import { describe, expect, it } from 'vitest';
import { REPAIR_SET_UP, repairPlanView } from '@/lib/case/view/repair-plan';
import { compileRulebook } from '@/lib/diagnose';
import { dangersOf } from '@/lib/diagnose/cautions';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';

const compiled = compileRulebook(defaultRulebook);

/** A posterior with so much on some causes and the rest on "something else". */
function posterior(p: Record<string, number>) {
  const rest = 1 - Object.values(p).reduce((sum, share) => sum + share, 0);
  return compiled.causeIds.map((causeId) => ({ causeId, p: p[causeId] ?? (causeId === 'something-else' ? rest : 0) }));
}

const planOf = (p: Record<string, number>, more: Partial<Parameters<typeof repairPlanView>[0]> = {}) =>
  repairPlanView({ caseId: 'a', compiled, causes: posterior(p), currency: 'USD', labourRatePerHour: null, called: [], acknowledged: [], ...more });

describe('the repair plan of a case', () => {
  it('begins with what is likeliest for its cost, and says so in words', () => {
    const [first] = planOf({ 'discharge-line-carboned': 0.62, 'dryer-overdue': 0.2 }).remedies;
    expect(first).toMatchObject({ remedyId: 'replace-discharge-line', p: 0.62, pWhenReached: 0.62 });
    expect(first?.why).toBe('Do this first: 62% likely, 25 min to look.');
  });

  it('says of a later one how likely it is once those before it were not the one', () => {
    const { remedies } = planOf({ 'discharge-line-carboned': 0.5, 'drain-choked-by-sealant': 0.4 });
    const [first, second] = remedies;
    expect(second?.pWhenReached).toBeCloseTo((second?.p ?? NaN) / (1 - (first?.p ?? NaN)), 12);
    expect(second?.why).toMatch(/^If none before it was the one: \d+% likely then, \d+ min to look\./);
  });

  it('counts work at the organisation’s labour rate, and at the rulebook’s until it has one', () => {
    const own = planOf({ 'discharge-line-carboned': 0.9 }, { labourRatePerHour: 60 });
    const rulebooks = planOf({ 'discharge-line-carboned': 0.9 });
    expect(own).toMatchObject({ labourRatePerHour: 60, rateFrom: 'organisation' });
    expect(rulebooks).toMatchObject({ labourRatePerHour: defaultRulebook.settings.labourRatePerHour, rateFrom: 'rulebook' });
    // 25 minutes at 60 an hour.
    expect(own.remedies[0]?.lookCost).toBeCloseTo(25, 9);
  });

  it('never costs more than leaving everything as it is', () => {
    const plan = planOf({ 'rings-worn': 0.3, 'discharge-line-carboned': 0.3, 'dryer-overdue': 0.2 });
    expect(plan.expectedCost).toBeLessThanOrEqual(plan.costOfLeaving);
    expect(plan.left.map(({ causeId }) => causeId)).toContain('something-else');
  });

  it('marks what removes the cause that was called', () => {
    const { remedies } = planOf({ 'discharge-line-carboned': 0.5, 'dryer-overdue': 0.4 }, { called: ['discharge-line-carboned'] });
    expect(remedies.filter(({ called }) => called).map(({ remedyId }) => remedyId)).toEqual(['replace-discharge-line']);
  });

  it('asks again for a caution that was read for a closed system, where an opened one is worse', () => {
    const worse = defaultRulebook.cautions.find(({ worseWhen }) => worseWhen.includes('system-opened'))?.id ?? '';
    const remedyId = defaultRulebook.remedies.find(({ cautions, causes }) => cautions.includes(worse) && causes.length > 0)?.id;
    const cause = defaultRulebook.remedies.find(({ id }) => id === remedyId)?.causes[0] ?? '';
    const toRead = (dangers: string[]) => planOf({ [cause]: 0.95 }, { acknowledged: [{ cautionId: worse, dangers }] }).remedies.find((remedy) => remedy.remedyId === remedyId)?.toRead;
    expect(toRead([])).toContain(worse);
    expect(toRead(dangersOf(REPAIR_SET_UP))).not.toContain(worse);
  });
});
