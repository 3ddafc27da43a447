import { outsideFunnel, funnelLimits } from '@/lib/reliability/charts/funnel';
import { garwood, poissonRate, ratePerMillionMiles } from '@/lib/reliability/poisson-rate';
import { byChance, heterogeneity } from '@/lib/reliability/repeats/chance';
import { expectedCounts, fleetRate } from '@/lib/reliability/repeats/exposed';
import { falseDiscoveryRates } from '@/lib/reliability/repeats/false-discovery';
import { gammaPoisson } from '@/lib/reliability/repeats/gamma-poisson';
import { unitRate } from '@/lib/reliability/repeats/unit-rate';
import { dataSet, ends, estimated, type FleetProofs } from './rows';

const pumps = dataSet('pumps.csv').map(({ number }) => ({ count: number('failures'), exposure: number('khours') }));
const tenth = { count: 22, exposure: 10.48 };
const expected = expectedCounts(pumps);
const tails = pumps.map(({ count }, i) => byChance(count, expected[i] ?? NaN));
const rate = () => {
  const all = fleetRate(pumps);
  return typeof all === 'number' ? all : NaN;
};
const fleet = () => {
  const varied = gammaPoisson(pumps);
  if (varied.kind !== 'varied') throw new Error(varied.kind);
  return varied;
};
const ps = dataSet('bh1995.csv').map(({ number }) => number('p'));
const rejected = (adjusted: readonly number[]) => adjusted.filter((q) => q <= 0.05).length;

export const repeatProofs: FleetProofs = {
  'FLT-EXPOSURE-01': () => [rate()],
  'FLT-EXPOSURE-02': () => {
    const first = estimated(poissonRate({ count: 5, exposure: 94.32 }));
    return [first.rate, ...ends(first.limits)];
  },
  'FLT-POISSON-01': () => tails.map(({ p }) => p),
  'FLT-POISSON-02': () => [tails[3]?.midP],
  'FLT-BH-01': () => falseDiscoveryRates(tails.map(({ p }) => p)),
  'FLT-POISSON-03': () => [estimated(heterogeneity(pumps)).pearson],
  'FLT-POISSON-04': () => [estimated(heterogeneity(pumps)).deviance],
  'FLT-FUNNEL-01': () => pumps.flatMap((pump, i) => (outsideFunnel(pump, { rate: rate() }) ? [i + 1] : [])),
  'FLT-FUNNEL-02': () => {
    const { outer } = funnelLimits({ rate: rate(), exposure: tenth.exposure });
    return [outer.lower, outer.upper];
  },
  'FLT-EB-01': () => [fleet().shape, fleet().shape / fleet().mean],
  'FLT-EB-02': () => pumps.map((pump) => unitRate(fleet(), pump).rate),
  'FLT-EB-03': () => ends(unitRate(fleet(), tenth).limits),
  'FLT-EB-04': () => [fleet().logLikelihood],
  'FLT-EB-05': () => [unitRate(fleet(), tenth).aboveTwice],
  'FLT-NEGBIN-01': () => [unitRate(fleet(), tenth).predictive],
  'FLT-BH-02': () => [rejected(falseDiscoveryRates(ps))],
  'FLT-BH-03': () => falseDiscoveryRates(ps).slice(0, 5),
  'FLT-BH-04': () => [ps.filter((p) => p <= 0.05 / ps.length).length],
  'FLT-EDGE-01': () => [garwood(0).upper / 0.25],
  'FLT-EDGE-02': () => [ends(estimated(ratePerMillionMiles({ count: 0, miles: 250_000 })).limits)[1]],
};
