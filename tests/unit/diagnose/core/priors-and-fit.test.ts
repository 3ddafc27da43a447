import { describe, expect, it } from 'vitest';
import { compileRulebook, priorsFor, rank } from '@/lib/diagnose';
import { book, cause, choice, finding, rule, somethingElse } from '@/tests/support/rulebook-parts';

const compiled = compileRulebook(
  book({
    causes: [somethingElse(0.2), cause('worn', 0.3, { station: 'cylinder-and-head' }), cause('choked', 0.5, { station: 'crankcase-and-drain' })],
    checks: [choice('noise', { knock: 0.2, none: 0.8 })],
    rules: [rule('knock', { noise: 'knock' }, { worn: 6, choked: -10 })],
    priorVariants: [
      { name: 'Just fitted', when: { milesSinceFit: { below: 1000 } }, priors: { worn: 0.1 } },
      { name: 'Long in service', when: { milesSinceFit: { atLeast: 1000, below: 5000 }, vocation: 'stop-start' }, priors: { worn: 0.6 } },
    ],
  }),
);
const priors = (facts: Record<string, string | number>) =>
  Object.fromEntries(compiled.causeIds.map((id, index) => [id, Number(priorsFor(compiled, facts)[index]?.toFixed(12))]));

describe('priors', () => {
  it('are the rulebook’s own when no variant holds', () => {
    const own = { choked: 0.5, 'something-else': 0.2, worn: 0.3 };
    expect(priors({})).toEqual(own);
    expect(priors({ milesSinceFit: 9000 })).toEqual(own);
    expect(priors({ milesSinceFit: '500' })).toEqual(own);
    expect(priors({ milesSinceFit: 2000 })).toEqual(own);
  });
  it('are those of the first variant that holds; the others share what is left as before', () => {
    expect(priors({ milesSinceFit: 500 })).toEqual({ worn: 0.1, choked: Number((0.9 * (5 / 7)).toFixed(12)), 'something-else': Number((0.9 * (2 / 7)).toFixed(12)) });
    expect(priors({ milesSinceFit: 1000, vocation: 'stop-start' }).worn).toBe(0.6);
    expect(priors({ milesSinceFit: 5000, vocation: 'stop-start' }).worn).toBe(0.3);
  });
  it('reach the ranking by its facts', () => {
    expect(rank(compiled, [], { facts: { milesSinceFit: 500 } }).causes.find(({ causeId }) => causeId === 'worn')?.p).toBeCloseTo(0.1, 12);
  });
});

describe('fit', () => {
  it('holds when the leader has evidence for it, or there is none at all', () => {
    expect(rank(compiled, []).fit).toEqual({ fits: true });
    expect(rank(compiled, [finding('noise', 'knock')]).fit).toEqual({ fits: true });
  });
  it('fails when the evidence is against the leader', () => {
    const fewer = compileRulebook(
      book({
        causes: [somethingElse(0.1), cause('worn', 0.9)],
        checks: [choice('noise', { knock: 0.5, none: 0.5 })],
        rules: [rule('knock', { noise: 'knock' }, { worn: -3 })],
      }),
    );
    expect(rank(fewer, [finding('noise', 'knock')]).fit).toEqual({ fits: false, reason: 'evidence-against-the-leader' });
  });
});

describe('suspicion', () => {
  it('is gathered by station, with what sits on no part under "none"', () => {
    const { suspicion } = rank(compiled, []);
    expect(suspicion['cylinder-and-head']).toBeCloseTo(0.3, 12);
    expect(suspicion['crankcase-and-drain']).toBeCloseTo(0.5, 12);
    expect(suspicion.none).toBeCloseTo(0.2, 12);
    expect(suspicion.dryer).toBe(0);
  });
});
