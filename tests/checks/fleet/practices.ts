import { cox } from '@/lib/reliability/practices/cox';
import { fisher } from '@/lib/reliability/practices/fisher';
import { logRank } from '@/lib/reliability/practices/log-rank';
import { rateRatio } from '@/lib/reliability/practices/rate-ratio';
import { riskDifference } from '@/lib/reliability/practices/risk-difference';
import { wilson } from '@/lib/reliability/wilson';
import { ends, estimated, type FleetProofs, type Got } from './rows';
import { control, sixMp } from './spells';

const groups = [{ treated: sixMp, others: control }];
const rank = () => estimated(logRank(groups));
const hazards = () => estimated(cox(groups));
const gehanRates = () => estimated(rateRatio({ count: 9, exposure: 359 }, { count: 21, exposure: 182 }));
const score = (count: number, of: number): Got => ends(estimated(wilson(count, of)).limits);
const newcombe = (first: [number, number], second: [number, number]): Got => {
  const { difference, limits } = estimated(riskDifference({ count: first[0], of: first[1] }, { count: second[0], of: second[1] }));
  return [difference, ...ends(limits)];
};
const twins = () => estimated(fisher([[2, 15], [10, 3]]));

export const practiceProofs: FleetProofs = {
  'FLT-LOGRANK-01': () => [rank().chiSquared],
  'FLT-LOGRANK-02': () => [rank().observed, rank().expected],
  'FLT-LOGRANK-03': () => [rank().p],
  'FLT-COX-01': () => [hazards().logRatio],
  'FLT-COX-02': () => [hazards().standardError],
  'FLT-COX-03': () => [hazards().hazardRatio, ...ends(hazards().limits)],
  'FLT-COX-04': () => [estimated(cox(groups, { ties: 'breslow' })).logRatio],
  'FLT-COX-05': () => [hazards().chiSquared],
  'FLT-RATERATIO-01': () => [gehanRates().ratio, ...ends(gehanRates().wald ?? { kind: 'none' })],
  'FLT-RATERATIO-02': () => ends(gehanRates().limits),
  'FLT-RATERATIO-03': () => {
    const { p, ratio, limits } = estimated(rateRatio({ count: 11, exposure: 800 }, { count: 21, exposure: 3011 }));
    return [p, ratio, ...ends(limits)];
  },
  'FLT-WILSON-01': () => score(81, 263),
  'FLT-WILSON-02': () => score(15, 148),
  'FLT-WILSON-03': () => score(0, 20),
  'FLT-WILSON-04': () => score(1, 29),
  'FLT-RISKDIFF-02': () => newcombe([56, 70], [48, 80]),
  'FLT-RISKDIFF-03': () => newcombe([9, 10], [3, 10]),
  'FLT-FISHER-01': () => [twins().twoSidedP],
  'FLT-FISHER-02': () => [twins().lessP],
  'FLT-FISHER-03': () => [twins().sampleOddsRatio, twins().oddsRatio],
  'FLT-FISHER-04': () => ends(twins().limits),
};
