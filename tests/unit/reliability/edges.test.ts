import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { runRules } from '@/lib/reliability/charts/nelson-rules';
import { pareto, rankedBy } from '@/lib/reliability/charts/pareto';
import { gChart, tChart } from '@/lib/reliability/charts/rare-events';
import { season } from '@/lib/reliability/charts/season';
import { uChart } from '@/lib/reliability/charts/u-chart';
import { compared, honestShare } from '@/lib/reliability/honesty';
import { poissonRate } from '@/lib/reliability/poisson-rate';
import { comebacks } from '@/lib/reliability/practices/comebacks';
import { cox } from '@/lib/reliability/practices/cox';
import { fisher } from '@/lib/reliability/practices/fisher';
import { logRank } from '@/lib/reliability/practices/log-rank';
import { mantelHaenszel } from '@/lib/reliability/practices/mantel-haenszel';
import { rateRatio } from '@/lib/reliability/practices/rate-ratio';
import { riskDifference } from '@/lib/reliability/practices/risk-difference';
import { crowAmsaa } from '@/lib/reliability/recurrence/crow-amsaa';
import { meanAt, meanCumulative } from '@/lib/reliability/recurrence/mean-cumulative';
import { powerLawOfIntervals, powerLawOfUnits } from '@/lib/reliability/recurrence/power-law-units';
import { laplace, lewisRobinson, milHandbookTrend, reverseArrangements } from '@/lib/reliability/recurrence/trend';
import { repeaters } from '@/lib/reliability/repeats/repeaters';
import { ageAtShareFailed, kaplanMeier } from '@/lib/reliability/spells/kaplan-meier';
import { weibayes } from '@/lib/reliability/spells/weibayes';
import { fitWeibull } from '@/lib/reliability/spells/weibull-fit';
import { lifeAtShare, shapeLimits } from '@/lib/reliability/spells/weibull-limits';
import { cumulativeHazard } from '@/lib/reliability/spells/cumulative-hazard';
import { wilson } from '@/lib/reliability/wilson';

const failed = (exitAge: number, entryAge = 0) => ({ entryAge, exitAge, failed: true });
const running = (exitAge: number, entryAge = 0) => ({ entryAge, exitAge, failed: false });

describe('what legal data cannot answer is said in words', () => {
  it.each([
    ['no failures', fitWeibull([running(5)]), 'no-failures'],
    ['fewer than five', fitWeibull([failed(5), failed(9), running(12)]), 'too-few-failures'],
    ['all at one age, none ran on', fitWeibull([failed(5), failed(5), running(4)]), 'failures-at-one-age'],
    ['one failed when new', fitWeibull([failed(0), failed(5)]), 'failure-at-age-zero'],
    ['a median that was not reached', ageAtShareFailed(kaplanMeier([failed(5), running(9), running(9)]), 0.5).estimate, undefined],
    ['no events', laplace([{ until: 10, events: [] }]), 'too-few-events'],
    ['two failures', crowAmsaa({ until: 10, events: [1, 2] }), 'too-few-failures'],
    ['all at the end', crowAmsaa({ until: 10, events: [10, 10, 10] }), 'failures-at-the-end'],
    ['one gap', reverseArrangements([4]), 'too-few-events'],
    ['gaps all alike', lewisRobinson({ until: 35, events: [10, 20, 30] }), 'no-spread'],
    ['no failures in one group', cox([{ treated: [running(5)], others: [failed(3)] }]), 'no-failures-in-one-group'],
    ['one group alone', logRank([{ treated: [], others: [failed(3)] }]), 'nothing-to-compare'],
    ['no exposure', poissonRate({ count: 0, exposure: 0 }), 'no-exposure'],
    ['nobody counted', wilson(0, 0), 'nothing-counted'],
    ['nobody counted in one', riskDifference({ count: 1, of: 2 }, { count: 0, of: 0 }), 'nothing-counted'],
    ['an empty margin', fisher([[0, 0], [1, 2]]), 'empty-margin'],
    ['no stratum with both', mantelHaenszel([{ treated: { count: 1, of: 2 }, others: { count: 0, of: 0 } }]), 'nothing-to-compare'],
    ['no failures at all', rateRatio({ count: 0, exposure: 2 }, { count: 0, exposure: 3 }), 'no-failures'],
    ['nineteen points', runRules(Array.from({ length: 19 }, () => 4)), 'too-few-points'],
    ['under two years', season([{ year: 2025, month: 1, count: 100, exposure: 31 }]), 'under-two-years'],
    ['no failures on a chart', uChart([{ count: 0, exposure: 2 }]), 'no-failures'],
    ['no gaps', tChart([]), 'nothing-counted'],
  ])('%s', (_, result, why) => {
    expect(result).toMatchObject(why === undefined ? { kind: 'not-reached', watchedTo: 9 } : { kind: 'not-estimable', why });
  });

  it('gives limits on one side where data bound one side', () => {
    expect(poissonRate({ count: 0, exposure: 2 })).toMatchObject({ rate: 0, limits: { kind: 'at-most' } });
    expect(rateRatio({ count: 4, exposure: 1 }, { count: 0, exposure: 1 })).toMatchObject({ ratio: undefined, limits: { kind: 'at-least' } });
    expect(fisher([[4, 0], [0, 4]])).toMatchObject({ oddsRatio: undefined, limits: { kind: 'at-least' } });
    expect(weibayes([running(100)], { shape: 2 })).toMatchObject({ scale: undefined, failures: 0 });
  });

  it('shows a share as a count alone below five, and as an upper limit of none', () => {
    expect(honestShare(3, 8)).toEqual({ kind: 'count-alone', count: 3, of: 8 });
    expect(honestShare(0, 58)).toMatchObject({ kind: 'at-most', of: 58 });
    expect(honestShare(0, 0)).toEqual({ kind: 'nothing-counted' });
    expect(honestShare(5, 20)).toMatchObject({ kind: 'estimated', share: 0.25 });
    expect(compared({ p: 0.3, limits: null, comparisons: 6 }).adjustedP).toBe(1);
  });
});

describe('order of what happens on one day', () => {
  it('has a failure before what left that day, and who entered that day after it', () => {
    const [row] = kaplanMeier([failed(10), running(10), running(20), running(30, 10)]).steps;
    expect(row).toMatchObject({ age: 10, atRisk: 3, failed: 1, censored: 1 });
  });

  it('has a repair before the end of watching, and two at one visit as two', () => {
    expect(meanCumulative([{ until: 10, events: [10, 10] }, { until: 20, events: [] }])).toMatchObject([{ atRisk: 2, events: 2, mean: 1 }]);
  });

  it('starts a curve later where early ages were hardly watched', () => {
    const spells = [failed(3), ...[20, 30, 40].map((age) => failed(age, 10)), running(50, 10)];
    expect(kaplanMeier(spells).steps.at(-1)?.survival).toBe(0);
    expect(kaplanMeier(spells, { startAge: 10 }).steps.at(-1)?.survival).toBeCloseTo(0.25, 12);
  });

  it('counts a spell nowhere that was watched for no time', () => {
    expect(kaplanMeier([failed(10, 10), running(20)])).toMatchObject({ failures: 0, spells: 1 });
  });

  it('says no spread of one unit, nor of units that do exactly alike', () => {
    expect(meanAt(meanCumulative([{ until: 9, events: [2] }]), 5).limits).toEqual({ kind: 'none', why: 'one-unit' });
    const alike = Array.from({ length: 3 }, () => ({ until: 9, events: [2] }));
    expect(meanAt(meanCumulative(alike), 5).limits).toEqual({ kind: 'none', why: 'no-spread' });
    expect(meanAt(meanCumulative(alike), 1)).toMatchObject({ mean: 0, limits: { why: 'no-events-yet' } });
  });
});

describe('comebacks', () => {
  it('counts only fits that the calendar lets follow, whatever happened to them', () => {
    const fits = [
      { fittedOn: 0, cameBackOn: 90, lostOn: null },
      { fittedOn: 0, cameBackOn: 91, lostOn: null },
      { fittedOn: 5, cameBackOn: null, lostOn: 40 },
      { fittedOn: 60, cameBackOn: 61, lostOn: null },
    ];
    expect(comebacks(fits, { today: 100 })).toEqual({ horizonDays: 90, of: 3, count: 1, lost: 1, tooRecent: 1 });
  });
});

describe('Pareto', () => {
  it('turns around by cost and rate, and parts equals by name', () => {
    const causes = [{ cause: 'b', count: 3, cost: 10, miles: 3e6 }, { cause: 'a', count: 3, cost: 90, miles: 1e6 }, { cause: 'c', count: 1 }];
    expect(pareto(causes).map(({ cause }) => cause)).toEqual(['a', 'b', 'c']);
    expect(rankedBy(causes, 'cost').map(({ cause }) => cause)).toEqual(['a', 'b']);
    expect(rankedBy(causes, 'rate')).toEqual([{ cause: 'a', value: 3 }, { cause: 'b', value: 1 }]);
    expect(pareto([{ cause: 'a', count: 0 }])).toEqual([]);
  });
});

describe('illegal data', () => {
  it.each([
    () => kaplanMeier([failed(-1)]),
    () => kaplanMeier([failed(5, 6)]),
    () => kaplanMeier([failed(Infinity)]),
    () => fitWeibull([failed(NaN)]),
    () => meanCumulative([{ until: 5, events: [6] }]),
    () => meanCumulative([{ from: 5, until: 9, events: [5] }]),
    () => laplace([{ from: 9, until: 5, events: [] }]),
    () => crowAmsaa({ until: 5, events: [-1] }),
    () => powerLawOfIntervals([{ from: 0, to: 5, failures: 1 }, { from: 6, to: 7, failures: 2 }]),
    () => poissonRate({ count: 1.5, exposure: 1 }),
    () => poissonRate({ count: 1, exposure: 0 }),
    () => wilson(3, 2),
    () => fisher([[1, -1], [2, 3]]),
    () => comebacks([{ fittedOn: 10, cameBackOn: 5, lostOn: null }], { today: 100 }),
    () => season([{ year: 2025, month: 13, count: 0, exposure: 1 }]),
    () => gChart([-1]),
    () => honestShare(2, 1),
  ])('is refused: %s', (nonsense) => {
    expect(nonsense).toThrow(RangeError);
  });
});

/** Every number in a result, however deep. */
function* numbersOf(value: unknown): Generator<number> {
  if (typeof value === 'number') yield value;
  else if (value && typeof value === 'object') for (const each of Object.values(value)) yield* numbersOf(each);
}
const allFinite = (...results: unknown[]) => {
  for (const number of numbersOf(results)) expect(Number.isFinite(number)).toBe(true);
};

describe('whatever the legal data, no number is without end or none', () => {
  const age = fc.integer({ min: 0, max: 40 });
  const spells = fc.array(fc.tuple(age, age, fc.boolean()).map(([entryAge, ran, hasFailed]) => ({ entryAge, exitAge: entryAge + ran, failed: hasFailed })), { maxLength: 14 });
  const histories = fc.array(
    fc.tuple(age, age, fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { maxLength: 5 })).map(([from, ran, at]) => ({
      from,
      until: from + ran,
      events: ran === 0 ? [] : at.map((share) => (share === 0 ? from + ran : from + ran * share)).filter((event) => event > from),
    })),
    { maxLength: 8 },
  );
  const units = fc.array(fc.record({ count: fc.integer({ min: 0, max: 30 }), exposure: fc.integer({ min: 1, max: 50 }) }), { maxLength: 12 });

  it('of spells', () => {
    fc.assert(fc.property(spells, spells, (one, two) => {
      const fit = fitWeibull(one, { leastFailures: 1 });
      if (fit.kind === 'estimated') {
        for (const method of ['wald', 'profile'] as const) allFinite(shapeLimits(fit, { method }), lifeAtShare(fit, 0.1, { method }));
      }
      allFinite(kaplanMeier(one), cumulativeHazard(one), fit, weibayes(one, { shape: 2 }));
      allFinite(logRank([{ treated: one, others: two }]), cox([{ treated: one, others: two }]));
    }), { numRuns: 300 });
  });

  it('of repaired units', () => {
    fc.assert(fc.property(histories, (list) => {
      allFinite(meanCumulative(list), laplace(list), powerLawOfUnits(list));
      for (const { from, until, events } of list) {
        allFinite(milHandbookTrend({ from, until, events }), lewisRobinson({ from, until, events }));
        for (const ending of ['time', 'failure'] as const) allFinite(crowAmsaa({ until, events, ending }));
      }
    }), { numRuns: 300 });
  });

  it('of counts', () => {
    fc.assert(fc.property(units, (list) => {
      allFinite(repeaters(list), uChart(list));
      const [one, two] = list;
      if (one && two) allFinite(rateRatio(one, two), fisher([[one.count, two.count], [one.exposure, two.exposure]]));
    }), { numRuns: 300 });
  });
});
