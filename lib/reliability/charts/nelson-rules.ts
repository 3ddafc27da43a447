import { LEAST_CHART_POINTS } from '../honesty';
import { notEstimable, type NotEstimable } from '../result';

/** Does a rule hold for the window that ends with a point? */
interface Rule {
  readonly window: number;
  readonly holds: (zs: readonly number[]) => boolean;
}

const oneSide = (zs: readonly number[]) => zs.every((z) => z > 0) || zs.every((z) => z < 0);
const sameSide = (least: number, beyond: number) => (zs: readonly number[]) =>
  zs.filter((z) => z > beyond).length >= least || zs.filter((z) => z < -beyond).length >= least;
const steps = (zs: readonly number[]) => zs.slice(1).map((z, i) => z - (zs[i] ?? 0));

const RULES = {
  /** One beyond three standard errors. */
  R1: { window: 1, holds: ([z = 0]) => Math.abs(z) > 3 },
  /** Nine on one side of the centre. */
  R2: { window: 9, holds: oneSide },
  /** Six rising, or falling. */
  R3: { window: 6, holds: (zs) => steps(zs).every((step) => step > 0) || steps(zs).every((step) => step < 0) },
  /** Fourteen up and down by turns. */
  R4: { window: 14, holds: (zs) => steps(zs).every((step, i, all) => step !== 0 && (i === 0 || step > 0 !== (all[i - 1] ?? 0) > 0)) },
  /** Two of three beyond two, on the same side. */
  R5: { window: 3, holds: sameSide(2, 2) },
  /** Four of five beyond one, on the same side. */
  R6: { window: 5, holds: sameSide(4, 1) },
  /** Fifteen within one. */
  R7: { window: 15, holds: (zs) => zs.every((z) => Math.abs(z) < 1) },
  /** Eight beyond one, on either side. */
  R8: { window: 8, holds: (zs) => zs.every((z) => Math.abs(z) > 1) },
  /** Eight on one side: Western Electric's in place of R2. */
  WE: { window: 8, holds: oneSide },
} as const satisfies Record<string, Rule>;

export type RuleId = keyof typeof RULES;

/** On unless asked otherwise: all eight together raise an alarm too often. */
export const USUAL_RULES = ['R1', 'R2'] as const satisfies readonly RuleId[];

/**
 * Where rules for runs are met: 1-based places of the points that complete them.
 *
 * @param zs points in standard errors from the centre
 * @see L. S. Nelson, Journal of Quality Technology 16, 1984
 * @throws RangeError for a point that is no number
 * @example ruleEnds([0.2, 3.4], 'R1') // [2]
 */
export function ruleEnds(zs: readonly number[], id: RuleId): number[] {
  if (!zs.every(Number.isFinite)) throw new RangeError('A point of a chart is a finite number.');
  const { window, holds }: Rule = RULES[id];
  return zs.flatMap((_, i) => (i + 1 >= window && holds(zs.slice(i + 1 - window, i + 1)) ? [i + 1] : []));
}

/**
 * What rules say of a chart that has points enough to say anything.
 *
 * @returns not estimable below twenty points: show them without rules
 */
export function runRules(zs: readonly number[], ids: readonly RuleId[] = USUAL_RULES): { kind: 'estimated'; found: { rule: RuleId; at: number }[] } | NotEstimable<'too-few-points'> {
  if (zs.length < LEAST_CHART_POINTS) return notEstimable('too-few-points');
  return { kind: 'estimated', found: ids.flatMap((rule) => ruleEnds(zs, rule).map((at) => ({ rule, at }))) };
}
