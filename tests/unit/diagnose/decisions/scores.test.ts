import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { brierScore, logLoss, multiClassBrier, topClass, topShare } from '@/lib/diagnose/scores';
import { brierParts, expectedCalibrationError, largestCalibrationError, reliabilityBins } from '@/lib/diagnose/scores-reliability';

const forecasts = fc.array(fc.record({ p: fc.double({ min: 0, max: 1, noNaN: true }), happened: fc.boolean() }), { minLength: 1, maxLength: 60 });

describe('scores of predictions', () => {
  it('over two classes the multi-class Brier score is twice the score of the event', () => {
    fc.assert(fc.property(forecasts, (list) => {
      const predictions = list.map(({ p, happened }) => ({ p: [p, 1 - p], truth: happened ? 0 : 1 }));
      expect(multiClassBrier(predictions)).toBeCloseTo(2 * brierScore(list), 12);
    }));
  });

  it('a truth called impossible costs everything', () => {
    expect(logLoss([{ p: [1, 0], truth: 1 }])).toBe(Infinity);
  });

  it('counts the truth among the first n, a tie going to the class listed first', () => {
    const predictions = [{ p: [0.4, 0.4, 0.2], truth: 1 }, { p: [0.4, 0.4, 0.2], truth: 0 }];
    expect(topShare(predictions, 1)).toBe(0.5);
    expect(topShare(predictions, 2)).toBe(1);
    expect(topClass(predictions)).toEqual([{ p: 0.4, happened: false }, { p: 0.4, happened: true }]);
  });

  it('are undefined over nothing, and say so', () => {
    expect(() => logLoss([])).toThrow(/got none/);
    expect(expectedCalibrationError([])).toBeUndefined();
    expect(largestCalibrationError([])).toBeUndefined();
    expect(brierParts([])).toBeUndefined();
  });
});

describe('reliability bins', () => {
  it('are half-open, the last one closed', () => {
    const bins = reliabilityBins([0, 0.5, 1].map((p) => ({ p, happened: true })), 2);
    expect(bins.map(({ low, high, count }) => [low, high, count])).toEqual([[0, 0.5, 1], [0.5, 1, 2]]);
  });

  it('refuse what is no probability, and no bins', () => {
    expect(() => reliabilityBins([{ p: 1.1, happened: true }])).toThrow(RangeError);
    expect(() => reliabilityBins([{ p: NaN, happened: true }])).toThrow(RangeError);
    expect(() => reliabilityBins([], 0)).toThrow(RangeError);
  });

  it('hold every forecast once, and the widest gap is never under the mean gap', () => {
    fc.assert(fc.property(forecasts, fc.integer({ min: 1, max: 20 }), (list, count) => {
      const bins = reliabilityBins(list, count);
      expect(bins.reduce((sum, bin) => sum + bin.count, 0)).toBe(list.length);
      expect(largestCalibrationError(bins)).toBeGreaterThanOrEqual((expectedCalibrationError(bins) ?? NaN) - 1e-12);
    }));
  });

  it('split the Brier score without a rest', () => {
    fc.assert(fc.property(forecasts, fc.integer({ min: 1, max: 20 }), (list, count) => {
      const parts = brierParts(reliabilityBins(list, count));
      if (!parts) throw new Error('no parts');
      const { brier, reliability, resolution, uncertainty, withinVariance, withinCovariance } = parts;
      expect(reliability - resolution + uncertainty + withinVariance - withinCovariance).toBeCloseTo(brier, 12);
    }));
  });

  it('have nothing within where all forecasts of a bin are equal', () => {
    const parts = brierParts(reliabilityBins([{ p: 0.3, happened: true }, { p: 0.3, happened: false }, { p: 0.8, happened: true }]));
    expect(parts?.withinVariance).toBeCloseTo(0, 15);
    expect(parts?.withinCovariance).toBeCloseTo(0, 15);
  });
});
