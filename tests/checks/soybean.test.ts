import { describe, expect, it } from 'vitest';
import { logLoss, multiClassBrier, topShare } from '@/lib/diagnose/scores';
import { errors, judged, judgement, soybeanRulebook } from './diagnosis/soybean';

/**
 * UCI Machine Learning Repository, Soybean (Large), Michalski and Chilausky 1980 (CC BY 4.0; see data/SOURCES.md). The
 * figures are those of two reference naive Bayes programs, Weka 3.6.14's among them; the log loss at rho = 0.5 is
 * computed from the formulas of our own design.
 */
describe('soybean diseases through the run of record', () => {
  it('is one rule for each of the 100 symptom values', () => {
    expect(soybeanRulebook(1).rules.size).toBe(100);
    expect(judged).toHaveLength(376);
  });

  it('rho = 1 gives naive Bayes: 45 errors of 376, log loss 0.48517, Brier 0.18111, top-3 0.9495', async () => {
    const { predictions, agreed } = await judgement(1);
    expect(agreed).toBe(376);
    expect(errors(predictions)).toBe(45);
    expect(100 * topShare(predictions, 1)).toBeCloseTo(88.03, 2);
    expect(logLoss(predictions)).toBeCloseTo(0.48517, 5);
    expect(multiClassBrier(predictions)).toBeCloseTo(0.18111, 5);
    expect(topShare(predictions, 3)).toBeCloseTo(0.9495, 4);
  });

  it('rho = 0.5 over the five groups of symptoms brings log loss to 0.394', async () => {
    const { predictions, agreed } = await judgement(0.5);
    expect(agreed).toBe(376);
    expect(logLoss(predictions)).toBeCloseTo(0.394, 3);
  });
});
