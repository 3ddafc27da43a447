import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compileRulebook, createWhatIf, rank, type Remedy } from '@/lib/diagnose';
import { entropyBits } from '@/lib/diagnose/information';
import { nextChecks } from '@/lib/diagnose/next-checks';
import { openChecks, openPairs } from '@/lib/diagnose/next-checks-open';
import { finding } from '../../../support/rulebook-parts';
import { randomCases, type RandomCase } from '../../../support/random-rulebook';
import { seededRandom } from '../../../support/random';

function opened({ rulebook, findings }: RandomCase) {
  const compiled = compileRulebook(rulebook);
  return openChecks(createWhatIf(compiled, findings), findings);
}

/** Remedies for most causes, some for two of them. */
function withRemedies(given: RandomCase, seed: number): RandomCase {
  const random = seededRandom(seed);
  const ids = given.rulebook.causes.map(({ id }) => id).filter((id) => id !== 'something-else');
  const remedies = ids.flatMap((id): Remedy[] => random.chance(0.2) ? [] : [{
    id: `remedy-${id}`, station: null, name: `remedy ${id}`, causes: [...new Set([id, ...(random.chance(0.3) ? [random.pick(ids)] : [])])],
    look: { minutes: random.below(120) }, fix: { minutes: random.below(3) * 40 }, parts: [{ name: 'part', cost: random.below(500) }],
    seenInBay: random.chance(0.6), steps: [], cautions: [], basis: 'judgement',
  }]);
  return { ...given, rulebook: { ...given.rulebook, remedies } };
}

describe('over random rulebooks', () => {
  it('forecasts average to what is known now, and tell 0 bits or more, at most what is left', () => {
    fc.assert(fc.property(randomCases(), (given) => {
      const open = opened(given);
      const p = open.whatIf.posterior;
      for (const { forecast: { chances, posteriors, bits } } of [...open.checks.values(), ...openPairs(open)]) {
        p.forEach((now, c) => expect(posteriors.reduce((sum, posterior, v) => sum + (chances[v] ?? 0) * (posterior[c] ?? 0), 0)).toBeCloseTo(now, 10));
        expect(bits).toBeGreaterThanOrEqual(0);
        expect(bits).toBeLessThanOrEqual(entropyBits(p) + 1e-9);
      }
    }), { numRuns: 60 });
  });

  it('with rho = 1, beta = 1 and no compound rules the ranking after each answer averages to the ranking now', () => {
    fc.assert(fc.property(randomCases({ rho: 1, beta: 1, compounds: 0, groups: 0 }), ({ rulebook, findings }) => {
      const compiled = compileRulebook(rulebook);
      const open = openChecks(createWhatIf(compiled, findings), findings);
      const byCause = (list: typeof findings) => new Map(rank(compiled, list).causes.map(({ causeId, p }) => [causeId, p]));
      const now = byCause(findings);
      for (const [checkId, { check, forecast }] of open.checks) {
        const after = check.states.map(({ id }) => byCause([...findings, finding(checkId, id)]));
        for (const [causeId, p] of now) {
          expect(after.reduce((sum, ranking, v) => sum + (forecast.chances[v] ?? 0) * (ranking.get(causeId) ?? NaN), 0)).toBeCloseTo(p, 9);
        }
      }
    }), { numRuns: 60 });
  });

  it('no check is priced at less than nothing, and none after enough is known more than it costs', () => {
    fc.assert(fc.property(randomCases(), fc.nat(), (given, seed) => {
      const { suggestions, enoughIsKnown, repair } = nextChecks(opened(withRemedies(given, seed)));
      for (const { saving, cost, bits, bitsPerMinute } of suggestions) {
        // Priced where something hangs on it; before "enough is known" is said, every one.
        if (saving !== undefined) expect(saving).toBeGreaterThanOrEqual(0);
        if (enoughIsKnown) expect(saving).toBeDefined();
        expect(bits).toBeGreaterThanOrEqual(0);
        expect(bitsPerMinute).toBeGreaterThanOrEqual(0);
        if (enoughIsKnown) expect(saving).toBeLessThanOrEqual(cost);
      }
      expect(repair.expectedCost).toBeLessThanOrEqual(repair.costOfLeaving + 1e-9);
    }), { numRuns: 60 });
  });

  it('lists each open check once, or through its better pair as well', () => {
    fc.assert(fc.property(randomCases(), (given) => {
      const open = opened(given);
      const alone = nextChecks(open).suggestions.filter(({ checkIds }) => checkIds.length === 1).flatMap(({ checkIds }) => checkIds);
      expect([...alone].sort()).toEqual([...open.checks.keys()].sort());
    }), { numRuns: 40 });
  });
});
