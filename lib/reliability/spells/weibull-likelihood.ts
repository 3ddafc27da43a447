import { mean } from 'simple-statistics';
import { rootBeyond } from '../special/root';
import { everAtRisk, requireSpells, type Spell } from './spell';

/**
 * The likelihood of a Weibull law over spells, on ages that are divided by their geometric mean, so that powers stay small.
 * Spells that were watched from a later age give sum (exit^b - entry^b) in place of sum exit^b.
 */
export interface WeibullLikelihood {
  readonly failures: number;
  /** Geometric mean of the exit ages. */
  readonly unit: number;
  /** Maximum over the scale, at a shape. */
  readonly atShape: (shape: number) => number;
  /** Its slope in the shape. */
  readonly slope: (shape: number) => number;
  /** The scale that is likeliest at a shape, in the spells' own unit. */
  readonly scaleAt: (shape: number) => number;
  /** Maximum over the shape where a share is to have failed by an age; undefined where there is none. */
  readonly atLife: (life: number, share: number) => number | undefined;
}

const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);

/** @returns undefined where a failure at age 0 or no failure leaves nothing to fit */
export function weibullLikelihood(spells: readonly Spell[]): WeibullLikelihood | undefined {
  requireSpells(spells);
  // What left at age 0 without failing tells nothing.
  const watched = spells.filter((spell) => everAtRisk(spell) && (spell.failed || spell.exitAge > 0));
  const failures = watched.filter(({ failed }) => failed).length;
  if (failures === 0 || watched.some(({ exitAge }) => exitAge === 0)) return undefined;
  const unit = Math.exp(mean(watched.map(({ exitAge }) => Math.log(exitAge))));
  const exits = watched.map(({ exitAge }) => Math.log(exitAge / unit));
  const entries = watched.flatMap(({ entryAge = 0 }) => (entryAge > 0 ? [Math.log(entryAge / unit)] : []));
  const failedLogs = sum(watched.flatMap(({ failed }, i) => (failed ? [exits[i] ?? 0] : [])));
  const furthest = exits.reduce((most, x) => Math.max(most, x), -Infinity);

  /** ln of sum (x / pivot)^b, and the mean of ln x under those weights; large powers are divided out. */
  const powers = (shape: number, pivot = 0): { log: number; meanLog: number } => {
    const shift = shape * furthest;
    let [total, weighted] = [0, 0];
    for (const x of exits) {
      const power = Math.exp(shape * x - shift);
      total += power;
      weighted += power * x;
    }
    for (const x of entries) {
      const power = Math.exp(shape * x - shift);
      total -= power;
      weighted -= power * x;
    }
    return { log: Math.log(total) + shift - shape * pivot, meanLog: weighted / total };
  };
  const constant = -failures * Math.log(unit);
  return {
    failures,
    unit,
    atShape: (shape) =>
      failures * (Math.log(shape) - powers(shape).log + Math.log(failures) - 1) + (shape - 1) * failedLogs + constant,
    slope: (shape) => failures / shape + failedLogs - failures * powers(shape).meanLog,
    scaleAt: (shape) => unit * Math.exp((powers(shape).log - Math.log(failures)) / shape),
    atLife: (life, share) => {
      const [hazard, pivot] = [-Math.log1p(-share), Math.log(life / unit)];
      const distance = failedLogs - failures * pivot;
      const slope = (logShape: number) => {
        const shape = Math.exp(logShape);
        const { log, meanLog } = powers(shape, pivot);
        return failures + shape * distance - hazard * shape * Math.exp(log) * (meanLog - pivot);
      };
      const logShape = rootBeyond(slope, 0, slope(0) > 0 ? 0.25 : -0.25, 12);
      if (logShape === undefined) return undefined;
      const shape = Math.exp(logShape);
      const { log } = powers(shape, pivot);
      return failures * (Math.log(hazard) + logShape) + shape * distance - failedLogs - hazard * Math.exp(log) + constant;
    },
  };
}
