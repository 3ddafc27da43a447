import { poissonRate } from '@/lib/reliability/poisson-rate';
import { cox } from '@/lib/reliability/practices/cox';
import { rateRatio } from '@/lib/reliability/practices/rate-ratio';
import { riskDifference } from '@/lib/reliability/practices/risk-difference';
import { crowAmsaa } from '@/lib/reliability/recurrence/crow-amsaa';
import { differenceOfMeans, meanAt, meanCumulative } from '@/lib/reliability/recurrence/mean-cumulative';
import { gammaPoisson } from '@/lib/reliability/repeats/gamma-poisson';
import { unitRate } from '@/lib/reliability/repeats/unit-rate';
import type { Limits } from '@/lib/reliability/result';
import { kaplanMeier, survivalAt } from '@/lib/reliability/spells/kaplan-meier';
import type { Spell } from '@/lib/reliability/spells/spell';
import { fitWeibull } from '@/lib/reliability/spells/weibull-fit';
import { lifeAtShare, shapeLimits } from '@/lib/reliability/spells/weibull-limits';
import { weibullLife, weibullReliability } from '@/lib/reliability/weibull';
import { wilson } from '@/lib/reliability/wilson';
import type { Random } from '@/tests/support/random';
import { exponentialDraw, gammaDraw, poissonDraw, weibullDraw } from '@/tests/support/reliability-draws';

/** A 95 % interval of one method at one size of fleet, whose truth is known. */
export interface CoverageMethod {
  readonly name: string;
  /** What is drawn: stated, since an interval is only as good as the fleet is large. */
  readonly size: string;
  /** Draws one fleet: whether the interval held the truth, or null when nothing was estimable. */
  readonly draw: (random: Random) => boolean | null;
}

/** At these sizes every method lies between. */
export const BAND = { least: 0.92, most: 0.98 } as const;

function holds(limits: Limits, truth: number): boolean | null {
  if (limits.kind === 'none') return null;
  return (!('lower' in limits) || limits.lower <= truth) && (!('upper' in limits) || truth <= limits.upper);
}

const LAW = { shape: 1.7, scale: 900 };
/** Fitted over the years, so that how long each was watched differs. */
const spells = (random: Random, count: number, law = LAW, watched: readonly [number, number] = [300, 1400]): Spell[] =>
  Array.from({ length: count }, () => {
    const [life, end] = [weibullDraw(random, law), random.between(...watched)];
    return { exitAge: Math.min(life, end), failed: life <= end };
  });

/** Repairs at a rate of the unit's own, steadily, over a time of its own. */
const histories = (random: Random, count: number, perYear: number) =>
  Array.from({ length: count }, () => {
    const rate = gammaDraw(random, { shape: 2, mean: perYear });
    const until = random.between(1, 3);
    const events: number[] = [];
    for (let age = exponentialDraw(random, rate); age < until; age += exponentialDraw(random, rate)) events.push(age);
    return { until, events };
  });

const binomial = (random: Random, of: number, p: number) => Array.from({ length: of }, () => random.chance(p)).filter(Boolean).length;
const weibull = (random: Random, count: number, limits: (fit: Extract<ReturnType<typeof fitWeibull>, { kind: 'estimated' }>) => Limits, truth: number) => {
  const fit = fitWeibull(spells(random, count));
  return fit.kind === 'estimated' ? holds(limits(fit), truth) : null;
};
const b10 = weibullLife(LAW, 0.1);

/** A power law watched to age 1: given how many, the failures are as many draws of u^(1 / beta). */
function growth(random: Random) {
  const events = Array.from({ length: poissonDraw(random, 25) }, () => (1 - random.unit()) ** (1 / 0.7));
  return crowAmsaa({ until: 1, events });
}

export const COVERAGE: readonly CoverageMethod[] = [
  { name: 'Kaplan-Meier, log-log', size: '60 components', draw: (random) => holds(survivalAt(kaplanMeier(spells(random, 60)), 500).limits, weibullReliability(LAW, 500)) },
  { name: 'Weibull shape, profile', size: '30 components', draw: (random) => weibull(random, 30, (fit) => shapeLimits(fit), LAW.shape) },
  { name: 'Weibull B10, profile', size: '30 components', draw: (random) => weibull(random, 30, (fit) => lifeAtShare(fit, 0.1).limits, b10) },
  { name: 'Weibull shape, Wald', size: '150 components', draw: (random) => weibull(random, 150, (fit) => shapeLimits(fit, { method: 'wald' }), LAW.shape) },
  { name: 'Weibull B10, Wald', size: '150 components', draw: (random) => weibull(random, 150, (fit) => lifeAtShare(fit, 0.1, { method: 'wald' }).limits, b10) },
  {
    name: 'rate, Garwood',
    size: '40 failures expected',
    draw: (random) => {
      const rate = poissonRate({ count: poissonDraw(random, 40), exposure: 1 });
      return rate.kind === 'estimated' ? holds(rate.limits, 40) : null;
    },
  },
  {
    name: 'share, Wilson',
    size: '60 fits, 15 % come back',
    draw: (random) => {
      const share = wilson(binomial(random, 60, 0.15), 60);
      return share.kind === 'estimated' ? holds(share.limits, 0.15) : null;
    },
  },
  {
    name: 'risk difference, Newcombe',
    size: '80 fits and 60 fits',
    draw: (random) => {
      const result = riskDifference({ count: binomial(random, 80, 0.1), of: 80 }, { count: binomial(random, 60, 0.25), of: 60 });
      return result.kind === 'estimated' ? holds(result.limits, -0.15) : null;
    },
  },
  { name: 'mean cumulative function', size: '60 units', draw: (random) => holds(meanAt(meanCumulative(histories(random, 60, 0.8)), 1.5).limits, 1.2) },
  {
    name: 'difference of two mean functions',
    size: '60 units and 60 units',
    draw: (random) => holds(differenceOfMeans(meanCumulative(histories(random, 60, 0.8)), meanCumulative(histories(random, 60, 1.2)), 1.5).limits, -0.6),
  },
  {
    name: 'power law, shape',
    size: '25 failures expected',
    draw: (random) => {
      const fit = growth(random);
      return fit.kind === 'estimated' ? holds(fit.shapeLimits, 0.7) : null;
    },
  },
  {
    name: 'power law, present time between failures',
    size: '25 failures expected',
    draw: (random) => {
      const fit = growth(random);
      return fit.kind === 'estimated' ? holds(fit.mtbfLimits, 1 / (25 * 0.7)) : null;
    },
  },
  {
    name: 'rate ratio, exact',
    size: '60 and 40 failures expected',
    draw: (random) => {
      const result = rateRatio({ count: poissonDraw(random, 60), exposure: 1 }, { count: poissonDraw(random, 40), exposure: 1 });
      return result.kind === 'estimated' ? holds(result.limits, 1.5) : null;
    },
  },
  {
    name: 'hazard ratio, Cox',
    size: '60 and 60 components',
    draw: (random) => {
      const treated = spells(random, 60, { ...LAW, scale: LAW.scale * 0.5 ** (-1 / LAW.shape) });
      const result = cox([{ treated, others: spells(random, 60) }]);
      return result.kind === 'estimated' ? holds(result.limits, 0.5) : null;
    },
  },
  {
    name: 'rate of a unit, empirical Bayes',
    size: '40 units, one of them asked for',
    draw: (random) => {
      const units = Array.from({ length: 40 }, () => {
        const [rate, exposure] = [gammaDraw(random, { shape: 2, mean: 1 }), random.between(1, 6)];
        return { rate, exposure, count: poissonDraw(random, rate * exposure) };
      });
      const [fleet, asked] = [gammaPoisson(units), units[0]];
      return fleet.kind === 'varied' && asked ? holds(unitRate(fleet, asked, { uncertainFleet: true }).limits, asked.rate) : null;
    },
  },
];

/** The share of fleets, of those that were estimable, whose interval held the truth. */
export function coverageOf({ draw }: CoverageMethod, fleets: number, randomOf: (seed: number) => Random): { share: number; estimable: number } {
  const outcomes = Array.from({ length: fleets }, (_, seed) => draw(randomOf(seed + 1))).filter((outcome) => outcome !== null);
  return { share: outcomes.filter(Boolean).length / outcomes.length, estimable: outcomes.length };
}
