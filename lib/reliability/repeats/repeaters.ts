import type { NotEstimable } from '../result';
import { byChance, heterogeneity } from './chance';
import { expectedCounts, type Exposed } from './exposed';
import { falseDiscoveryRates } from './false-discovery';
import { gammaPoisson, type EvenFleet, type VariedFleet } from './gamma-poisson';
import { FLAG, unitRate, type UnitRate } from './unit-rate';

/** Discoveries are made up to this rate of false ones. */
export const FALSE_DISCOVERY_RATE = 0.05;
/**
 * Above this dispersion chance alone is no measure: ordinary units of a varied fleet would be flagged by the thousand. A
 * judgement of our own.
 */
export const GREATEST_DISPERSION = 2;

export interface Repeater extends UnitRate {
  readonly expected: number;
  /** P(so many or more) at the fleet's rate, and what it is worth among so many units. */
  readonly p: number;
  readonly q: number;
  /**
   * Why it is above what chance explains: its rate is above twice the fleet's with probability 0.9; or, in a fleet whose units
   * are otherwise alike, it is a discovery at 5 % and has more than twice what was expected.
   */
  readonly above: 'posterior' | 'discovery' | null;
}

export interface Repeaters {
  readonly kind: 'estimated';
  readonly fleet: VariedFleet | EvenFleet;
  readonly dispersion: number;
  /** One for each unit that was handed in, in order; null for one without exposure. */
  readonly units: readonly (Repeater | null)[];
}

/**
 * Which units repeat beyond chance. The posterior alone is not enough: in a fleet that is even but for a few bad units, these
 * few make the gamma distribution wide and are then explained by it; discoveries are.
 *
 * @returns not estimable from fewer than two units that ran, or without any failure
 * @throws RangeError
 * @example const found = repeaters(units); if (found.kind === 'estimated') found.units[0]?.above // 'discovery'
 */
export function repeaters(units: readonly Exposed[]): Repeaters | NotEstimable<'too-few-units' | 'no-failures'> {
  const fleet = gammaPoisson(units);
  const spread = heterogeneity(units);
  if (fleet.kind === 'not-estimable') return fleet;
  if (spread.kind === 'not-estimable') return spread;
  const expected = expectedCounts(units, { leaveOneOut: true });
  // A unit that is a large part of a fleet without other failures has nothing to be compared with.
  const ps = units.map(({ count, exposure }, i) => (exposure > 0 && (expected[i] ?? 0) > 0 ? byChance(count, expected[i] ?? 0).p : 1));
  const ran = units.flatMap(({ exposure }, i) => (exposure > 0 ? [i] : []));
  const qs = new Map(falseDiscoveryRates(ran.map((i) => ps[i] ?? 1)).map((q, place) => [ran[place], q]));
  const alike = spread.dispersion <= GREATEST_DISPERSION;
  return {
    kind: 'estimated',
    fleet,
    dispersion: spread.dispersion,
    units: units.map((unit, i): Repeater | null => {
      const q = qs.get(i);
      if (q === undefined) return null;
      const rate = unitRate(fleet, unit);
      const discovered = alike && q <= FALSE_DISCOVERY_RATE && unit.count > FLAG.times * (expected[i] ?? 0);
      return { ...rate, expected: expected[i] ?? 0, p: ps[i] ?? 1, q, above: rate.flagged ? 'posterior' : discovered ? 'discovery' : null };
    }),
  };
}
