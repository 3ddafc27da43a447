import { describe, expect, it, vi } from 'vitest';
import { compareCauses, compileRulebook, compileTrusted, explain, natsOf, rank, strengthOf } from '@/lib/diagnose';
import { book, cause, choice, finding, rule, somethingElse } from '@/tests/support/rulebook-parts';
import { forAllCases } from './for-all-cases';

vi.setConfig({ testTimeout: 60_000 });

describe('an explanation', () => {
  it('splits ln(pA / pB) into prior and groups, exactly', () =>
    forAllCases(({ rulebook, findings }) => {
      const ranking = rank(compileTrusted(rulebook), findings);
      for (const a of ranking.causes) {
        for (const b of ranking.causes) {
          const { logRatioNats, priorNats, groups } = compareCauses(ranking, a.causeId, b.causeId);
          expect(logRatioNats).toBeCloseTo(Math.log(a.p / b.p), 9);
          expect(groups.reduce((sum, { nats }) => sum + nats, priorNats)).toBeCloseTo(logRatioNats, 12);
        }
      }
    }));

  it('gives the change in p of leaving each finding out', () =>
    forAllCases(({ rulebook, findings }) => {
      const compiled = compileTrusted(rulebook);
      const { ranking, causes } = explain(compiled, findings);
      for (const { id: findingId, shares } of findings) {
        const without = new Map(rank(compiled, findings.filter(({ id }) => id !== findingId)).causes.map(({ causeId, p }) => [causeId, p]));
        for (const { causeId, p, withoutFinding } of causes) {
          const told = withoutFinding.find((each) => each.findingId === findingId)?.changeInP;
          if (shares.length === 0) expect(told).toBeUndefined();
          else expect(told).toBe(p - (without.get(causeId) ?? NaN));
        }
      }
      expect(causes.map(({ causeId }) => causeId)).toEqual(ranking.causes.map(({ causeId }) => causeId));
    }, { runs: 100 }));

  const compiled = compileRulebook(
    book({
      causes: [somethingElse(0.2), cause('worn', 0.3), cause('choked', 0.5)],
      checks: [choice('noise', { knock: 0.2, none: 0.8 }), choice('colour', { black: 0.5, clean: 0.5 })],
      evidenceGroups: [{ id: 'heard-and-seen', name: 'Heard and seen', rho: 0.5 }],
      rules: [
        rule('knock', { noise: 'knock' }, { worn: 6 }, { group: 'heard-and-seen', note: 'A worn bearing knocks.', basis: 'regulation', source: 'paragraph 1' }),
        rule('black oil', { colour: 'black' }, { worn: 2.5 }, { group: 'heard-and-seen' }),
      ],
    }),
  );

  it('tells notes, bases and sources of the rules behind a reason, and the weight that counted', () => {
    const worn = explain(compiled, [finding('noise', 'knock'), finding('colour', 'black')]).causes.find(({ causeId }) => causeId === 'worn');
    expect(worn?.reasons.map(({ weightDecibans, countedDecibans }) => [weightDecibans, countedDecibans].map((each) => Number(each.toFixed(9))))).toEqual([
      [6, 6],
      [2.5, 1.25],
    ]);
    expect(worn?.reasons.map(({ strength }) => strength)).toEqual([
      { direction: 'for', word: 'clearly' },
      { direction: 'for', word: 'barely' },
    ]);
    expect(worn?.reasons[0]?.rules).toEqual([{ name: 'knock', note: 'A worn bearing knocks.', basis: 'regulation', source: 'paragraph 1' }]);
  });

  it('has a reason without a rule where the compiler filled the weight in', () => {
    const worn = explain(compiled, [finding('noise', 'none')]).causes.find(({ causeId }) => causeId === 'worn');
    expect(worn?.reasons).toHaveLength(1);
    expect(worn?.reasons[0]?.rules).toEqual([]);
    expect(worn?.reasons[0]?.strength?.direction).toBe('against');
  });

  it('refuses to compare a cause that was not ranked', () => {
    expect(() => compareCauses(rank(compiled, []), 'worn', 'nothing')).toThrow(RangeError);
  });
});

describe('strength words', () => {
  it.each([
    [0.01, 'barely'],
    [1.99, 'barely'],
    [2, 'a little'],
    [4.99, 'a little'],
    [5, 'clearly'],
    [9.99, 'clearly'],
    [10, 'strongly'],
    [19.99, 'strongly'],
    [20, 'almost by itself'],
    [300, 'almost by itself'],
  ])('%d dB is %s, either way', (decibans, word) => {
    expect(strengthOf(natsOf(decibans))).toEqual({ direction: 'for', word });
    expect(strengthOf(natsOf(-decibans))).toEqual({ direction: 'against', word });
  });
  it('are none for a weight of nothing', () => {
    expect(strengthOf(0)).toBeUndefined();
  });
});
