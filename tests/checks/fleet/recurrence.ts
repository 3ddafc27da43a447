import { crowAmsaa } from '@/lib/reliability/recurrence/crow-amsaa';
import type { History } from '@/lib/reliability/recurrence/history';
import { differenceOfMeans, meanAt, meanCumulative, unitsAtRisk } from '@/lib/reliability/recurrence/mean-cumulative';
import { powerLawOfIntervals } from '@/lib/reliability/recurrence/power-law-units';
import { gapsOf, laplace, lewisRobinson, milHandbookTrend, reverseArrangements } from '@/lib/reliability/recurrence/trend';
import { dataSet, ends, estimated, type FleetProofs, type Got } from './rows';

/** Each unit's last row is the end of its watching. */
function historiesOf(name: string, only: (row: ReturnType<typeof dataSet>[number]) => boolean = () => true): History[] {
  const rows = dataSet(name).filter(only);
  return [...new Set(rows.map(({ text }) => text('unit')))].map((unit) => {
    const own = rows.filter(({ text }) => text('unit') === unit);
    return {
      until: own.find(({ number }) => number('event') === 0)?.number('day') ?? NaN,
      events: own.flatMap(({ number }) => (number('event') === 1 ? [number('day')] : [])),
    };
  });
}

const seats = historiesOf('valve-seat.csv');
const batch = (which: string) => historiesOf('braking-grids.csv', ({ text }) => text('batch') === which);
const at = (histories: readonly History[], age: number): Got => {
  const { mean, standardError } = meanAt(meanCumulative(histories), age);
  return [mean, standardError];
};
const limitsAt = (age: number): Got => ends(meanAt(meanCumulative(seats), age).limits);
const difference = (age: number): Got => {
  const { difference: gap, standardError, limits } = differenceOfMeans(meanCumulative(batch('2')), meanCumulative(batch('1')), age);
  return [gap, standardError, ...ends(limits)];
};

const prototype = { until: 300, events: dataSet('mil189-prototype.csv').map(({ number }) => number('hour')) };
const crow = (confidence = 0.95) => estimated(crowAmsaa({ ...prototype, confidence }));
const repairs = { until: 1500, events: dataSet('nist-repairs.csv').map(({ number }) => number('hour')) };
const nist = () => estimated(crowAmsaa(repairs));
const grouped = () => estimated(powerLawOfIntervals(dataSet('mil189-grouped.csv').map(({ number }) => ({ from: number('from'), to: number('to'), failures: number('failures') }))));
const halfbeakEvents = dataSet('halfbeak.csv').flatMap(({ number }) => (number('event') === 1 ? [number('khour')] : []));
const halfbeak = { until: Math.max(...halfbeakEvents), events: halfbeakEvents, ending: 'failure' } as const;
const engine = (confidence = 0.95) => estimated(crowAmsaa({ ...halfbeak, confidence }));
const coal = dataSet('coal-dates.csv').map(({ number }) => number('date'));
const [firstCoal = 0, ...laterCoal] = coal;

export const recurrenceProofs: FleetProofs = {
  'FLT-MCF-01': () => at(seats, 61),
  'FLT-MCF-02': () => limitsAt(61),
  'FLT-MCF-03': () => at(seats, 139),
  'FLT-MCF-04': () => limitsAt(139),
  'FLT-MCF-05': () => at(seats, 404),
  'FLT-MCF-06': () => limitsAt(404),
  'FLT-MCF-07': () => at(seats, 586),
  'FLT-MCF-08': () => limitsAt(586),
  'FLT-MCF-09': () => at(seats, 653),
  'FLT-MCF-10': () => limitsAt(653),
  'FLT-MCF-11': () => [61, 404, 653].map((age) => unitsAtRisk(seats, age)),
  'FLT-MCFDIFF-01': () => difference(300),
  'FLT-MCFDIFF-02': () => difference(500),
  'FLT-MCF-12': () => at(batch('1'), 650),
  'FLT-MCF-13': () => at(batch('2'), 382),
  'FLT-CROW-01': () => [crow().shape],
  'FLT-CROW-02': () => [crow().rate],
  'FLT-CROW-03': () => [crow().unbiasedShape],
  'FLT-CROW-04': () => [crow().intensity, crow().mtbf],
  'FLT-CROW-05': () => ends(crow().shapeLimits),
  'FLT-CROW-06': () => [crow().fit.statistic],
  'FLT-CROW-07': () => ends(crow(0.9).mtbfLimits),
  'FLT-TREND-01': () => {
    const { statistic, p } = estimated(milHandbookTrend(prototype));
    return [statistic, p];
  },
  'FLT-TREND-02': () => {
    const { statistic, p } = estimated(laplace([prototype]));
    return [statistic, p];
  },
  'FLT-CROW-08': () => [nist().unbiasedShape],
  'FLT-CROW-09': () => [10 / 1500 ** nist().unbiasedShape, 1500 / (10 * nist().unbiasedShape)],
  'FLT-TREND-03': () => [estimated(laplace([repairs])).statistic, estimated(milHandbookTrend(repairs)).statistic],
  'FLT-TREND-04': () => [estimated(reverseArrangements(gapsOf(repairs))).arrangements],
  'FLT-CROW-10': () => [grouped().shape, grouped().rate],
  'FLT-CROW-11': () => [engine().shape],
  'FLT-CROW-12': () => [engine().unbiasedShape, ...ends(engine().shapeLimits)],
  'FLT-CROW-13': () => [engine(0.9).mtbf, ...ends(engine(0.9).mtbfLimits)],
  'FLT-CROW-14': () => [engine().scale],
  'FLT-TREND-05': () => [estimated(laplace([halfbeak])).statistic, estimated(milHandbookTrend(halfbeak)).statistic],
  'FLT-TREND-06': () => [estimated(lewisRobinson(halfbeak)).statistic],
  'FLT-TREND-07': () => [estimated(laplace([{ from: firstCoal, until: Math.max(...laterCoal), events: laterCoal, ending: 'failure' }])).statistic],
  'FLT-EDGE-04': () => {
    const { standardError, limits } = meanAt(meanCumulative([{ until: 100, events: [10, 50] }]), 60);
    return [standardError === undefined && limits.kind === 'none' ? 'undefined (report none)' : 'stated'];
  },
};
