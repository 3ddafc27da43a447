import { describe, expect, it } from 'vitest';
import { compileRulebook, type Rulebook } from '@/lib/diagnose';
import { posteriorOf } from '@/lib/diagnose/log-sum-exp';
import { compareEditions } from '@/lib/rulebook/back-test/compare-editions';
import { prepareCases } from '@/lib/rulebook/back-test/prepare';
import { fitSettings, FITTED_FROM } from '@/lib/rulebook/learning/fit-settings';
import type { ProvedCase } from '@/lib/rulebook/proved-case';
import { chanceBand } from '@/lib/rulebook/scores/chance-band';
import { randomProvedCases } from '@/tests/support/proved-cases';
import { caseOf } from '@/tests/support/random-rulebook';
import { seededRandom } from '@/tests/support/random';

describe('what chance does to a perfect engine', () => {
  // Of one bin the error is |observed - p|, which is about normal: median 0.6745 and 95th percentile 1.96 standard errors.
  it('is the error of a binomial share where all forecasts are equal', () => {
    const random = seededRandom(3);
    const band = chanceBand(Array.from({ length: 1000 }, () => ({ p: 0.65, happened: false })), () => random.unit(), { draws: 4000 });
    const standardError = Math.sqrt((0.65 * 0.35) / 1000);
    expect(band?.errorMedian).toBeCloseTo(0.6745 * standardError, 2);
    expect(band?.error95).toBeCloseTo(1.96 * standardError, 2);
  });

  it('is far from nothing over 30 cases, so that no error is to be shown bare', () => {
    const random = seededRandom(3);
    const forecasts = Array.from({ length: 30 }, () => ({ p: random.between(0.3, 1), happened: false }));
    expect(chanceBand(forecasts, () => random.unit())?.errorMedian).toBeGreaterThan(0.1);
  });

  it('is a band around each bin that holds about 95 % of what happens', () => {
    const random = seededRandom(4);
    const forecasts = Array.from({ length: 400 }, () => ({ p: 0.75, happened: false }));
    // 400 at 0.75: standard error 0.0217.
    const [bin] = chanceBand(forecasts, () => random.unit(), { draws: 4000 })?.bins ?? [];
    expect(bin?.observed.low).toBeCloseTo(0.75 - 1.96 * 0.0217, 2);
    expect(bin?.observed.high).toBeCloseTo(0.75 + 1.96 * 0.0217, 2);
    expect(chanceBand([], () => 0)).toBeUndefined();
  });
});

const shape = { seed: 21, causes: 4, checks: 9, compounds: 2, groups: 1, states: 4, split: 0, beta: 1, rho: 0.5 };

/** Cases whose truth is drawn from what the rulebook says with these settings. */
function drawnWith(rulebook: Rulebook, beta: number, defaultRho: number, count: number): ProvedCase[] {
  const random = seededRandom(9);
  const compiled = compileRulebook({ ...rulebook, settings: { ...rulebook.settings, beta, defaultRho } });
  const cases = randomProvedCases(rulebook, count, 8, 0);
  return prepareCases(compiled, cases).cases.map(({ scores }, index) => {
    let rest = random.unit();
    const truth = posteriorOf(scores).findIndex((p) => (rest -= p) < 0);
    return { id: `case-${index}`, truth: compiled.causeIds[truth] ?? '', findings: cases[index]?.findings ?? [] };
  });
}

describe('beta and rho', () => {
  const { rulebook } = caseOf(shape);
  const compiled = compileRulebook(rulebook);

  it('are not fitted below 50 proved cases', () => {
    expect(fitSettings(prepareCases(compiled, randomProvedCases(rulebook, FITTED_FROM - 1, 1)))).toEqual({ kind: 'too-few', cases: 49, needs: 50 });
    expect(fitSettings(prepareCases(compiled, randomProvedCases(rulebook, FITTED_FROM, 1))).kind).toBe('fitted');
  });

  it('come out near the settings that the truth was drawn with, and predict held-out cases better', () => {
    const fit = fitSettings(prepareCases(compiled, drawnWith(rulebook, 0.4, 0.5, 1500)));
    if (fit.kind !== 'fitted') throw new Error(fit.kind);
    expect(fit.now).toEqual({ beta: 1, rho: 0.5 });
    expect(Math.abs(fit.fitted.beta - 0.4)).toBeLessThan(0.15);
    expect(fit.better).toBe(true);
  });

  it('are left alone where they are true', () => {
    const fit = fitSettings(prepareCases(compiled, drawnWith(rulebook, 1, 0.5, 600)));
    expect(fit).toMatchObject({ kind: 'fitted', better: false });
  });

  it('mean to the fit what they mean to the ranking', () => {
    const cases = drawnWith(rulebook, 0.4, 0.5, 300);
    const fit = fitSettings(prepareCases(compiled, cases));
    if (fit.kind !== 'fitted') throw new Error(fit.kind);
    const { beta, rho } = fit.fitted;
    const at = (b: number, r: number) =>
      compareEditions(compiled, compileRulebook({ ...rulebook, settings: { ...rulebook.settings, beta: b, defaultRho: r } }), cases).logLoss.mean;
    const best = at(beta, rho);
    for (const [b, r] of [[beta + 0.1, rho], [Math.max(0.05, beta - 0.1), rho], [beta, Math.min(1, rho + 0.2)], [beta, Math.max(0, rho - 0.2)]] as const) {
      expect(best).toBeLessThanOrEqual(at(b, r) + 1e-12);
    }
  });
});
