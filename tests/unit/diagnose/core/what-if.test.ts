import { describe, expect, it, vi } from 'vitest';
import { attenuatedGain, attenuationFactors } from '@/lib/diagnose/attenuation';
import { compileTrusted, createWhatIf, rank, FindingError } from '@/lib/diagnose';
import { finding } from '@/tests/support/rulebook-parts';
import { forAllCases } from './for-all-cases';

vi.setConfig({ testTimeout: 60_000 });

describe('a what-if', () => {
  it('changes the scores as a full ranking with that answer does, for every check and answer still open', () =>
    forAllCases(({ rulebook, findings }) => {
      const compiled = compileTrusted(rulebook);
      const whatIf = createWhatIf(compiled, findings);
      for (const check of compiled.checks.values()) {
        if (whatIf.answered.has(check.id)) continue;
        for (const state of check.stateIds) {
          const change = whatIf.logWeights(check.id, state);
          for (const { causeId, scoreNats } of rank(compiled, [...findings, finding(check.id, state)]).causes) {
            const cause = compiled.causeIds.indexOf(causeId);
            expect((whatIf.scores[cause] ?? NaN) + (change[cause] ?? NaN)).toBeCloseTo(scoreNats, 10);
          }
        }
      }
    }));

  it('does so for two checks at once', () =>
    forAllCases(({ rulebook, findings }) => {
      const compiled = compileTrusted(rulebook);
      const few = findings.slice(0, 2);
      const whatIf = createWhatIf(compiled, few);
      const [a, b] = [...compiled.checks.values()].filter(({ id }) => !whatIf.answered.has(id));
      if (!a || !b) return;
      for (const stateA of a.stateIds) {
        for (const stateB of b.stateIds) {
          const change = whatIf.logWeightsPair(a.id, stateA, b.id, stateB);
          for (const { causeId, scoreNats } of rank(compiled, [...few, finding(a.id, stateA), finding(b.id, stateB)]).causes) {
            const cause = compiled.causeIds.indexOf(causeId);
            expect((whatIf.scores[cause] ?? NaN) + (change[cause] ?? NaN)).toBeCloseTo(scoreNats, 10);
          }
        }
      }
    }, { except: ['splitAnswers'] }));

  it('leaves what it was prepared from as it was', () =>
    forAllCases(({ rulebook, findings }) => {
      const compiled = compileTrusted(rulebook);
      const whatIf = createWhatIf(compiled, findings);
      const open = [...compiled.checks.values()].filter(({ id }) => !whatIf.answered.has(id));
      const all = () => open.flatMap(({ id, stateIds }) => stateIds.map((state) => [...whatIf.logWeights(id, state)]));
      expect(all()).toEqual(all());
    }, { runs: 60, except: ['splitAnswers', 'groupOfThree'] }));

  it('is refused for a check that is answered, or that is not there', () =>
    forAllCases(({ rulebook, findings }) => {
      const whatIf = createWhatIf(compileTrusted(rulebook), findings);
      for (const id of whatIf.answered) expect(() => whatIf.logWeights(id, 'state-0')).toThrow(FindingError);
      expect(() => whatIf.logWeights('nothing', 'state-0')).toThrow(FindingError);
      expect(() => whatIf.logWeightsPair('check-0', 'state-0', 'check-0', 'state-0')).toThrow(FindingError);
    }, { runs: 40, except: ['splitAnswers', 'groupOfThree'] }));
});

describe('the gain of one more weight in a group', () => {
  it.each([
    [[], 2, 0.5],
    [[3, 1], 2, 0.5],
    [[3, 2, 1], 2, 0.5],
    [[3, 2, 1], 5, 0],
    [[3, 2, 1], 0.5, 0],
    [[2, 2, 2], 2, 0.3],
    [[3, 2, 1], 2.5, 1],
  ])('of %j and %d at rho %d is the difference of the attenuated sums', (sizes, size, rho) => {
    const sum = (weights: readonly number[]) => attenuationFactors(weights, rho).reduce((total, factor, i) => total + factor * (weights[i] ?? 0), 0);
    expect(attenuatedGain(sizes, size, rho)).toBeCloseTo(sum([...sizes, size]) - sum(sizes), 12);
  });
});
