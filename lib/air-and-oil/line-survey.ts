import type { Temperature } from '@/lib/units';
import { ABOVE_ZERO, requirePositive, requireWithin } from './out-of-range';

/** One reading along a discharge line. */
export interface SurveyPoint {
  /** m from the compressor's port, along the line. */
  readonly distanceM: number;
  readonly temperatureK: Temperature;
}

/** The line between two neighbouring readings. */
export interface Stretch {
  readonly fromM: number;
  readonly toM: number;
  /** K; less than 0 where it grows hotter. */
  readonly fallK: number;
  /** K/m. */
  readonly fallPerM: number;
  /** It falls much faster than beside it, in K/m: undefined where it doesn't. */
  readonly sudden: { readonly besideKPerM: number } | undefined;
}

/** How many times as fast as beside it is sudden. */
export const MUCH_FASTER = 2;
/** K beyond what the stretches beside it would have lost: less, two readings of a thermometer can be off. */
export const BEYOND_READING_K = 10;

/**
 * How a discharge line cools from reading to reading, and where it does so suddenly.
 *
 * fall per metre = (T_a - T_b) / (x_b - x_a)
 *
 * A line that is free gives off the less the cooler it already is, so that the fall per metre shrinks along it. A stretch
 * is sudden where it loses at least twice as much a metre as the faster of the stretches beside it, and 10 K more than
 * that one would have lost. The first stretch has nothing before it and is never called so.
 *
 * @param points in any order; m from 0, K above 0; no two at one distance
 * @returns one stretch fewer than points, from the port on; none for one point or none
 * @throws OutOfRange
 * @see common practice, no source
 * @example lineSurvey([at(0, 450), at(1, 440), at(2, 380), at(3, 375)])[1]?.sudden // { besideKPerM: 10 }
 */
export function lineSurvey(points: readonly SurveyPoint[]): Stretch[] {
  for (const { distanceM, temperatureK } of points) {
    requireWithin('distanceM', 'length', distanceM, { least: 0 });
    requirePositive('temperatureK', 'temperature', temperatureK);
  }
  const sorted = [...points].sort((a, b) => a.distanceM - b.distanceM);
  const falls = sorted.slice(1).map((end, index) => fallBetween(sorted[index] ?? end, end));
  return falls.map((fall, index) => ({ ...fall, sudden: suddenBeside(fall, falls[index - 1], falls[index + 1]) }));
}

type Fall = Omit<Stretch, 'sudden'>;

function fallBetween(start: SurveyPoint, end: SurveyPoint): Fall {
  const lengthM = end.distanceM - start.distanceM;
  requireWithin('distanceM', 'length', lengthM, { least: ABOVE_ZERO });
  const fallK = start.temperatureK - end.temperatureK;
  return { fromM: start.distanceM, toM: end.distanceM, fallK, fallPerM: fallK / lengthM };
}

function suddenBeside({ fromM, toM, fallK, fallPerM }: Fall, before: Fall | undefined, after: Fall | undefined): Stretch['sudden'] {
  if (!before) return undefined;
  const besideKPerM = Math.max(0, before.fallPerM, after?.fallPerM ?? 0);
  const beyondK = fallK - besideKPerM * (toM - fromM);
  return fallPerM >= MUCH_FASTER * besideKPerM && beyondK >= BEYOND_READING_K ? { besideKPerM } : undefined;
}
