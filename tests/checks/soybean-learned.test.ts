import { describe, expect, it } from 'vitest';
import { compileRulebook, type Rulebook } from '@/lib/diagnose';
import { logLoss, multiClassBrier, topShare } from '@/lib/diagnose/scores';
import { prepareCases } from '@/lib/rulebook/back-test/prepare';
import { learnWeights } from '@/lib/rulebook/learning/learn-weights';
import { errors, judge, learnedCases, soybeanRulebook, uniform } from './diagnosis/soybean';

/**
 * The same data and figures as `soybean.test.ts`, with every weight learned by the production estimator: a rulebook that
 * holds each value of a symptom for equally common with every disease, and believes it as if it had seen one case of each
 * (m = number of answers), learns from the 307 rows with no gate.
 */
function learnedBook(rho: number): ReturnType<typeof soybeanRulebook> {
  const ignorant = soybeanRulebook(rho, uniform);
  const weights = learnWeights(prepareCases(ignorant, learnedCases()), { strength: (check) => check.stateIds.length });
  const byRule = new Map<string, Record<string, number>>();
  for (const { rule, causeId, learned } of weights) byRule.set(rule, { ...byRule.get(rule), [causeId]: learned });
  const rulebook: Rulebook = {
    ...ignorant.rulebook,
    rules: ignorant.rulebook.rules.map((rule) => ({
      ...rule,
      weights: byRule.get(rule.name) ?? {},
    })),
  };
  return compileRulebook(rulebook);
}

describe('weights learned from the 307 soybean rows', () => {
  it('are 1,900 weights, one for each value of a symptom and disease', () => {
    const prepared = prepareCases(soybeanRulebook(1, uniform), learnedCases());
    expect(prepared).toMatchObject({ unknownCause: [], unknownFindings: [] });
    expect(learnWeights(prepared)).toHaveLength(100 * 19);
  });

  it('judge the 376 rows as the design says: 45 errors, log loss 0.48517, Brier 0.18111, top-3 0.9495', async () => {
    const { predictions, agreed } = await judge(learnedBook(1));
    expect(agreed).toBe(376);
    expect(errors(predictions)).toBe(45);
    expect(logLoss(predictions)).toBeCloseTo(0.48517, 5);
    expect(multiClassBrier(predictions)).toBeCloseTo(0.18111, 5);
    expect(topShare(predictions, 3)).toBeCloseTo(0.9495, 4);
  });

  it('and with rho = 0.5 over the five groups a log loss of 0.394', async () => {
    const { predictions } = await judge(learnedBook(0.5));
    expect(logLoss(predictions)).toBeCloseTo(0.394, 3);
  });
});
