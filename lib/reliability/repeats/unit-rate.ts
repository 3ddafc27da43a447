import { twoSided, type TwoSided } from '../result';
import { requireAmount, requireCount, requireShare } from '../require';
import { negativeBinomialAtLeast, poissonAtLeast } from '../special/counts';
import { incompleteGamma } from '../special/incomplete-gamma';
import { gammaQuantile } from '../special/gamma-quantile';
import { rootBetween } from '../special/root';
import type { Exposed } from './exposed';
import type { EvenFleet, VariedFleet } from './gamma-poisson';

/** A unit is flagged when its rate is above twice the fleet's with this probability. */
export const FLAG = { times: 2, probability: 0.9 } as const;

export interface UnitRate {
  /** Drawn towards the fleet's mean, the more the less the unit ran: (a + x) / (b + e). */
  readonly rate: number;
  readonly limits: TwoSided;
  /** P(rate > twice the mean of the fleet). */
  readonly aboveTwice: number;
  readonly flagged: boolean;
  /** P(so many failures or more) of a unit drawn from this fleet: how odd it is among its like. */
  readonly predictive: number;
}

interface Part {
  readonly weight: number;
  readonly shape: number;
  readonly mean: number;
}

/** Nodes and weights of Gauss and Hermite for a normal variable, five: exact to the ninth power. */
const HERMITE = [
  { at: 0, weight: 8 / 15 },
  ...[1, -1].flatMap((sign) => [
    { at: sign * 1.3556261799742659, weight: 0.2220759220056126 },
    { at: sign * 2.8569700138728056, weight: 0.011257411327720688 },
  ]),
];

/** The fleet as it is estimated, or as a mixture of what it may be. */
function parts(fleet: VariedFleet, uncertainFleet: boolean): Part[] {
  const { shape, mean, covariance } = fleet;
  if (!uncertainFleet || !covariance) return [{ weight: 1, shape, mean }];
  const inMean = Math.sqrt(covariance.logMean);
  const tilt = covariance.both / inMean;
  const rest = Math.sqrt(Math.max(0, covariance.logShape - tilt * tilt));
  return HERMITE.flatMap((first) =>
    HERMITE.map((second) => ({
      weight: first.weight * second.weight,
      mean: mean * Math.exp(inMean * first.at),
      shape: shape * Math.exp(tilt * first.at + rest * second.at),
    })),
  );
}

/**
 * What a unit's failures say of its rate, among units whose rates vary as the fleet's do.
 *
 * @param uncertainFleet counts how far shape and mean of the fleet can be off; needed in fleets of few units
 * @returns in an even fleet, the one rate, without width, and nothing flagged
 * @throws RangeError
 * @example unitRate(fleet, { count: 22, exposure: 10.48 }) // rate 1.94, aboveTwice 0.956, flagged
 */
export function unitRate(
  fleet: VariedFleet | EvenFleet,
  { count, exposure }: Exposed,
  { confidence = 0.95, uncertainFleet = false }: { confidence?: number; uncertainFleet?: boolean } = {},
): UnitRate {
  requireCount(count);
  requireAmount(exposure, 'An exposure');
  requireShare(confidence, 'A confidence');
  if (fleet.kind === 'even') {
    const { mean } = fleet;
    return { rate: mean, limits: twoSided(mean, mean), aboveTwice: 0, flagged: false, predictive: poissonAtLeast(count, mean * exposure) };
  }
  const posterior = parts(fleet, uncertainFleet).map(({ weight, shape, mean }) => ({ weight, shape: shape + count, run: shape / mean + exposure, mean, prior: shape }));
  const over = (of: (part: (typeof posterior)[number]) => number) => posterior.reduce((sum, part) => sum + part.weight * of(part), 0);
  const quantile = (below: number) => {
    const each = posterior.map(({ shape, run }) => gammaQuantile(shape, { below }) / run);
    const [least, most] = [Math.min(...each), Math.max(...each)];
    return least === most ? least : (rootBetween((rate) => over(({ shape, run }) => incompleteGamma(shape, rate * run).lower) - below, least, most) ?? least);
  };
  const aboveTwice = over(({ shape, run, mean }) => incompleteGamma(shape, FLAG.times * mean * run).upper);
  const tail = (1 - confidence) / 2;
  return {
    rate: over(({ shape, run }) => shape / run),
    limits: twoSided(quantile(tail), quantile(1 - tail)),
    aboveTwice,
    flagged: aboveTwice > FLAG.probability,
    predictive: over(({ prior, mean }) => negativeBinomialAtLeast(count, { shape: prior, mean: mean * exposure })),
  };
}
