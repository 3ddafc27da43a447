import { brierScore, logLoss, type Forecasted } from '@/lib/diagnose/scores';
import { brierParts, expectedCalibrationError, largestCalibrationError, reliabilityBins } from '@/lib/diagnose/scores-reliability';
import type { Proofs } from '../../support/outside-values';

const forecasts = (p: number[], happened: number[]): Forecasted[] => p.map((each, i) => ({ p: each, happened: happened[i] === 1 }));

const curve = reliabilityBins(forecasts([0.1, 0.2, 0.3, 0.4, 0.65, 0.7, 0.8, 0.9, 1], [0, 0, 0, 0, 1, 1, 1, 1, 1]), 3);
const two = reliabilityBins(forecasts([0.25, 0.25, 0.55, 0.75, 0.75], [0, 0, 1, 1, 1]), 2);
const HITS: [p: number, hits: number][] = [[0.1, 1], [0.3, 2], [0.5, 6], [0.7, 7], [0.9, 10]];
const murphy = brierParts(reliabilityBins(HITS.flatMap(([p, hits]) =>
  forecasts(Array<number>(10).fill(p), Array.from({ length: 10 }, (_, i) => (i < hits ? 1 : 0)))), 5));

/** Largest residual of the five-part identity over forecasts that differ inside their bins. */
function residual(): number {
  let seed = 1;
  const random = () => (seed = (seed * 48271) % 2147483647) / 2147483647;
  let worst = 0;
  for (let trial = 0; trial < 200; trial += 1) {
    const parts = brierParts(reliabilityBins(Array.from({ length: 60 }, () => ({ p: random(), happened: random() < 0.4 })), 10));
    if (!parts) throw new Error('no forecasts');
    const sum = parts.reliability - parts.resolution + parts.uncertainty + parts.withinVariance - parts.withinCovariance;
    worst = Math.max(worst, Math.abs(parts.brier - sum));
  }
  return worst;
}

export const scores: Proofs = {
  M01: () => brierScore(forecasts([0.1, 0.9, 0.8, 0.3], [0, 1, 1, 0])),
  M02: () => logLoss([
    { p: [0.1, 0.9], truth: 1 }, { p: [0.9, 0.1], truth: 0 }, { p: [0.8, 0.2], truth: 0 }, { p: [0.35, 0.65], truth: 1 },
  ]),
  M04: () => curve[0]?.observed ?? NaN,
  M05: () => curve[1]?.observed ?? NaN,
  M06: () => curve[2]?.observed ?? NaN,
  M07: () => curve[0]?.meanForecast ?? NaN,
  M09: () => curve[2]?.meanForecast ?? NaN,
  M10: () => expectedCalibrationError(two) ?? NaN,
  M12: () => largestCalibrationError(two) ?? NaN,
  M13: () => murphy?.brier ?? NaN,
  M14: () => murphy?.reliability ?? NaN,
  M16: () => murphy?.uncertainty ?? NaN,
  M17: residual,
};
