import { ruleEnds, type RuleId } from '@/lib/reliability/charts/nelson-rules';
import { pareto } from '@/lib/reliability/charts/pareto';
import { gChart, tChart } from '@/lib/reliability/charts/rare-events';
import { season } from '@/lib/reliability/charts/season';
import { outsideLimits, uChart } from '@/lib/reliability/charts/u-chart';
import { dataSet, estimated, readFleetRows, type FleetProofs, type Got } from './rows';

const wafers = () => estimated(uChart(dataSet('nist-wafers.csv').map(({ number }) => ({ count: number('defects'), exposure: 1 })), { widen: 'never' }));
const cloth = () => estimated(uChart(dataSet('textile-u.csv').map(({ number }) => ({ count: number('defects'), exposure: number('units') }))));
const coal = dataSet('coal-dates.csv').map(({ number }) => number('date'));
const gaps = coal.slice(1).map((date, i) => (date - (coal[i] ?? NaN)) * 365.25);
const between = () => estimated(gChart([34, 12, 5, 61, 28, 9, 44, 3, 17, 52, 8, 26, 71, 15, 39, 0, 22, 11, 31, 48]));
const defects = pareto(dataSet('pareto-defects.csv').map(({ text, number }) => ({ cause: text('cause'), count: number('count') })));
const year = () =>
  estimated(season(dataSet('us-accidents.csv').map(({ number }) => ({ year: number('year'), month: number('month'), count: number('count'), exposure: number('days') }))));

const RULES: RuleId[] = ['R1', 'R2', 'R3', 'R4', 'R5', 'R6', 'R7', 'R8', 'WE'];
/** The series that a row states, and where each rule ends in it. */
function rules(id: string): Got {
  const stated = /z=([-\d.,]+)/.exec(readFleetRows().find((row) => row.id === id)?.inputs ?? '')?.[1] ?? '';
  const zs = stated.split(',').map(Number);
  return [RULES.map((rule) => ruleEnds(zs, rule).join(' ') || 'none').join('|')];
}

export const chartProofs: FleetProofs = {
  'FLT-UCHART-01': () => [wafers().centre, wafers().points[0]?.upper, wafers().points[0]?.lower],
  'FLT-UCHART-02': () => outsideLimits(wafers()),
  'FLT-UCHART-03': () => [cloth().centre],
  'FLT-UCHART-04': () => [cloth().points[2]?.rate, cloth().points[2]?.upper, cloth().points[2]?.lower],
  'FLT-UCHART-05': () => cloth().points.map(({ z }) => z),
  'FLT-UCHART-06': () => [cloth().spread],
  'FLT-TCHART-01': () => [estimated(tChart(gaps)).mean],
  'FLT-TCHART-02': () => {
    const { lower, centre, upper } = estimated(tChart(gaps));
    return [lower, centre, upper];
  },
  'FLT-TCHART-03': () => {
    const { lower, upper } = estimated(tChart(gaps));
    return [gaps.filter((gap) => gap > upper).length, gaps.filter((gap) => gap < lower).length];
  },
  'FLT-GCHART-01': () => [between().mean, between().threeSigma],
  'FLT-GCHART-02': () => [between().lower, between().centre, between().upper],
  'FLT-RULES-01': () => rules('FLT-RULES-01'),
  'FLT-RULES-02': () => rules('FLT-RULES-02'),
  'FLT-PARETO-01': () => defects.map(({ count }) => count),
  'FLT-PARETO-02': () => defects.map(({ cumulativePercent }) => cumulativePercent),
  'FLT-PARETO-03': () => [defects[0]?.limits.lower, defects[0]?.limits.upper],
  'FLT-SEASON-01': () => [year().chiSquared],
  'FLT-SEASON-02': () => [year().indices[0], year().indices[6]],
  'FLT-SEASON-03': () => [...year().harmonic.coefficients],
  'FLT-SEASON-04': () => [year().peakToTrough, year().peakMonth],
  'FLT-SEASON-05': () => [year().harmonic.likelihoodRatio, year().harmonic.dispersion],
};
