import { poissonRate } from '@/lib/reliability/poisson-rate';
import type { Reached } from '@/lib/reliability/result';
import { cumulativeHazard, hazardAt } from '@/lib/reliability/spells/cumulative-hazard';
import { ageAtShareFailed, differenceInShareFailed, kaplanMeier, survivalAt } from '@/lib/reliability/spells/kaplan-meier';
import { totals, type Spell } from '@/lib/reliability/spells/spell';
import { weibayes } from '@/lib/reliability/spells/weibayes';
import { fitWeibull } from '@/lib/reliability/spells/weibull-fit';
import { lifeAtShare, scaleLimits, shapeLimits, weibullMoments } from '@/lib/reliability/spells/weibull-limits';
import { dataSet, ends, estimated, type FleetProofs, type Got } from './rows';

const spellsOf = (name: string, age: string): Spell[] =>
  dataSet(name).flatMap(({ text, number }) =>
    Array.from({ length: text('count') === '' ? 1 : number('count') }, () => ({ exitAge: number(age), failed: number('event') === 1 })));

const nist = spellsOf('nist-km.csv', 'time');
const gehan = (group: string): Spell[] =>
  dataSet('gehan-6mp.csv').flatMap(({ text, number }) => (text('group') === group ? [{ exitAge: number('time'), failed: number('event') === 1 }] : []));
export const [sixMp, control] = [gehan('6-MP'), gehan('control')];
const fan = spellsOf('diesel-fan.csv', 'hours');
const shock = spellsOf('shock-absorber.csv', 'km');
const late: Spell[] = dataSet('left-truncated.csv').map(({ number }) => ({ entryAge: number('entry'), exitAge: number('exit'), failed: number('event') === 1 }));

const at = (spells: readonly Spell[], age: number): Got => {
  const { survival, standardError } = survivalAt(kaplanMeier(spells), age);
  return [survival, standardError];
};
const limitsAt = (spells: readonly Spell[], age: number): Got => ends(survivalAt(kaplanMeier(spells), age).limits);
const hazard = (spells: readonly Spell[], age: number): Got => {
  const { hazard: met, standardError } = hazardAt(cumulativeHazard(spells), age);
  return [met, standardError];
};
const reached = (age: Reached) => (age.kind === 'reached' ? age.age : 'NA');
const median = (spells: readonly Spell[]): Got => {
  const { estimate, lower, upper } = ageAtShareFailed(kaplanMeier(spells), 0.5);
  return [estimate, lower, upper].map(reached);
};
const total = totals(fan);
const fanRate = () => estimated(poissonRate({ count: total.failures, exposure: total.exposure }));

const weibullNist = spellsOf('nist-weibull.csv', 'time');
const bearing = spellsOf('ball-bearing.csv', 'time');
const laterBearing = bearing.map((spell) => (spell.exitAge === 48.4 ? { ...spell, exitAge: 48.48 } : spell));
const fit = (spells: readonly Spell[]) => estimated(fitWeibull(spells));
const life = (spells: readonly Spell[], method: 'wald' | 'profile') => lifeAtShare(fit(spells), 0.1, { method });

/** Seven rows of each data set, in the same order. */
const weibullRows = (spells: readonly Spell[], [shape, scale, likelihood, shapeWald, scaleWald, b10Wald, shapeProfile, b10Profile]: string[]): FleetProofs => ({
  [`FLT-WEIBULL-${shape}`]: () => [fit(spells).shape],
  [`FLT-WEIBULL-${scale}`]: () => [fit(spells).scale],
  [`FLT-WEIBULL-${likelihood}`]: () => [fit(spells).logLikelihood],
  [`FLT-WEIBULL-${shapeWald}`]: () => ends(shapeLimits(fit(spells), { method: 'wald' })),
  [`FLT-WEIBULL-${scaleWald}`]: () => ends(scaleLimits(fit(spells), { method: 'wald' })),
  [`FLT-B10-${b10Wald}`]: () => [life(spells, 'wald').age, ...ends(life(spells, 'wald').limits)],
  [`FLT-WEIBULL-${shapeProfile}`]: () => ends(shapeLimits(fit(spells))),
  [`FLT-B10-${b10Profile}`]: () => ends(life(spells, 'profile').limits),
});

export const spellProofs: FleetProofs = {
  'FLT-KM-01': () => at(nist, 56),
  'FLT-KM-02': () => limitsAt(nist, 56),
  'FLT-NELSONAALEN-01': () => hazard(nist, 56),
  'FLT-KM-03': () => at(nist, 181),
  'FLT-KM-04': () => limitsAt(nist, 181),
  'FLT-NELSONAALEN-02': () => hazard(nist, 181),
  'FLT-KM-05': () => median(nist),
  'FLT-KM-06': () => at(sixMp, 6),
  'FLT-KM-07': () => limitsAt(sixMp, 6),
  'FLT-NELSONAALEN-03': () => hazard(sixMp, 6),
  'FLT-KM-08': () => at(sixMp, 10),
  'FLT-KM-09': () => limitsAt(sixMp, 10),
  'FLT-NELSONAALEN-04': () => hazard(sixMp, 10),
  'FLT-KM-10': () => at(sixMp, 23),
  'FLT-KM-11': () => limitsAt(sixMp, 23),
  'FLT-NELSONAALEN-05': () => hazard(sixMp, 23),
  'FLT-KM-12': () => median(sixMp),
  'FLT-KM-13': () => {
    const { survival, limits } = survivalAt(kaplanMeier(control), 23);
    return limits.kind === 'none' && limits.why === 'none-left' ? [survival] : [];
  },
  'FLT-KM-14': () => at(fan, 3100),
  'FLT-KM-15': () => limitsAt(fan, 3100),
  'FLT-NELSONAALEN-06': () => hazard(fan, 3100),
  'FLT-KM-16': () => at(fan, 8750),
  'FLT-KM-17': () => limitsAt(fan, 8750),
  'FLT-NELSONAALEN-07': () => hazard(fan, 8750),
  'FLT-KM-18': () => median(fan),
  'FLT-KM-19': () => at(shock, 20100),
  'FLT-KM-20': () => limitsAt(shock, 20100),
  'FLT-NELSONAALEN-09': () => hazard(shock, 20100),
  'FLT-KM-21': () => median(shock),
  'FLT-EXPONENTIAL-01': () => [1 / fanRate().rate],
  'FLT-EXPONENTIAL-02': () => ends(fanRate().limits).map((end) => 1000 * Number(end)),
  'FLT-KMTRUNC-01': () => [...at(late, 47), ...limitsAt(late, 47)],
  'FLT-KMTRUNC-02': () => [...at(late, 101), ...limitsAt(late, 101)],
  'FLT-NELSONAALEN-08': () => [hazardAt(cumulativeHazard(control), 5).hazard, hazardAt(cumulativeHazard(control, { ties: 'one-after-another' }), 5).hazard],
  'FLT-RISKDIFF-01': () => {
    const { difference, standardError, limits } = differenceInShareFailed(kaplanMeier(sixMp), kaplanMeier(control), 10);
    return [difference, standardError, ...ends(limits)];
  },
  ...weibullRows(weibullNist, ['01', '02', '03', '04', '05', '01', '06', '02']),
  'FLT-WEIBULL-07': () => {
    const { mean, standardDeviation } = weibullMoments(fit(weibullNist));
    return [mean, standardDeviation];
  },
  ...weibullRows(bearing, ['08', '09', '10', '11', '12', '03', '13', '04']),
  'FLT-WEIBULL-14': () => [fit(laterBearing).shape, fit(laterBearing).scale],
  ...weibullRows(shock, ['15', '16', '17', '18', '19', '05', '20', '06']),
  'FLT-EDGE-03': () => {
    const curve = kaplanMeier(Array.from({ length: 8 }, (_, i) => ({ exitAge: 10 * (i + 1), failed: false })));
    const { survival, standardError, limits } = survivalAt(curve, 80);
    const none = limits.kind === 'none' && limits.why === 'no-failures-yet';
    return [survival, standardError, none ? 'no failures' : 'failures', limits.kind === 'none' ? 'report no CI' : 'limits'];
  },
  'FLT-EDGE-05': () => {
    const none = fitWeibull([{ exitAge: 10, failed: false }, { exitAge: 20, failed: false }]);
    const alike = fitWeibull(Array.from({ length: 6 }, () => ({ exitAge: 10, failed: true })));
    return [none.kind === 'not-estimable' && alike.kind === 'not-estimable' ? 'not estimable' : 'estimated'];
  },
  'FLT-EDGE-06': () => [estimated(weibayes(Array.from({ length: 3 }, () => ({ exitAge: 1000, failed: false })), { shape: 2 })).atLeast],
};
