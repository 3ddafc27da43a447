import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bayesUpdate } from '@/lib/reliability/bayes-update';
import { medianRank } from '@/lib/reliability/median-rank';
import { orGate } from '@/lib/reliability/or-gate';
import { poissonUpperBound } from '@/lib/reliability/poisson-upper-bound';
import { powerLaw } from '@/lib/reliability/power-law';
import { riskPriorityNumber } from '@/lib/reliability/risk-priority-number';
import { weibullLife, weibullReliability } from '@/lib/reliability/weibull';

const probability = fc.double({ min: 0.001, max: 0.999, noNaN: true });

describe('small laws of reliability', () => {
  it('give the age at which a share has failed, and the share that is left at that age', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.3, max: 6, noNaN: true }), fc.double({ min: 1, max: 1e6, noNaN: true }), probability, (shape, scale, share) => {
        expect(weibullReliability({ shape, scale }, weibullLife({ shape, scale }, share))).toBeCloseTo(1 - share, 9);
      }),
    );
  });

  it('bound a rate by what few failures allow, as printed tables of chi-squared have it (from memory)', () => {
    // chi2(0.90; 4) = 7.779, chi2(0.90; 8) = 13.362, chi2(0.90; 22) = 30.813.
    expect(poissonUpperBound({ count: 1, exposure: 1, confidence: 0.9 })).toBeCloseTo(7.779 / 2, 3);
    expect(poissonUpperBound({ count: 3, exposure: 1, confidence: 0.9 })).toBeCloseTo(13.362 / 2, 3);
    expect(poissonUpperBound({ count: 10, exposure: 1, confidence: 0.9 })).toBeCloseTo(30.813 / 2, 3);
  });

  it('never make a cause likelier by a sign that tells nothing', () => {
    fc.assert(
      fc.property(probability, probability, (prior, seen) => {
        expect(bayesUpdate({ prior, ifSo: seen, ifNot: seen })).toBeCloseTo(prior, 9);
      }),
    );
  });

  it('find no shape without bias from one failure', () => {
    expect(powerLaw([500], 1000).unbiasedShape).toBeUndefined();
  });

  it.each([
    () => powerLaw([], 1000),
    () => powerLaw([1200], 1000),
    () => medianRank(6, 5),
    () => weibullReliability({ shape: 0, scale: 1 }, 1),
    () => weibullReliability({ shape: 1, scale: 1 }, -1),
    () => weibullLife({ shape: 1, scale: 1 }, 1),
    () => orGate([0.5, 1.5]),
    () => riskPriorityNumber({ severity: 11, occurrence: 1, detection: 1 }),
    () => bayesUpdate({ prior: 0.5, ifSo: 0, ifNot: 0 }),
    () => bayesUpdate({ prior: 2, ifSo: 0.5, ifNot: 0.5 }),
    () => poissonUpperBound({ count: -1, exposure: 1, confidence: 0.9 }),
    () => poissonUpperBound({ count: 1, exposure: 0, confidence: 0.9 }),
    () => poissonUpperBound({ count: 1, exposure: 1, confidence: 1 }),
  ])('refuse what makes no sense: %s', (nonsense) => {
    expect(nonsense).toThrow(RangeError);
  });
});
