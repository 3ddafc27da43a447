import { notEstimable, type NotEstimable } from '../result';
import { requirePositive, requireShare } from '../require';
import { gammaQuantile } from '../special/gamma-quantile';
import { everAtRisk, requireSpells, type Spell } from './spell';

export interface Weibayes {
  readonly kind: 'estimated';
  readonly failures: number;
  /** Likeliest scale; undefined without failures. */
  readonly scale: number | undefined;
  /** One-sided lower limit of the scale. */
  readonly atLeast: number;
}

/**
 * The scale of a Weibull law whose shape is assumed, from components that may not have failed at all.
 *
 * eta >= (2 sum t^b / chi2(confidence; 2 r + 2))^(1 / b)
 *
 * @param shape assumed, from the like; say so wherever the result is shown
 * @param confidence one-sided
 * @returns not estimable when nothing ran
 * @throws RangeError for illegal spells, shape or confidence
 * @see R. B. Abernethy, The New Weibull Handbook, chapter 6 (from memory); IEC 61649
 * @example weibayes([{ exitAge: 1000, failed: false }], { shape: 2 }) // atLeast 578
 */
export function weibayes(spells: readonly Spell[], { shape, confidence = 0.95 }: { shape: number; confidence?: number }): Weibayes | NotEstimable<'nothing-ran'> {
  requireSpells(spells);
  requirePositive(shape, 'A shape');
  requireShare(confidence, 'A confidence');
  const watched = spells.filter(everAtRisk);
  const furthest = watched.reduce((most, { exitAge }) => Math.max(most, exitAge), 0);
  if (furthest === 0) return notEstimable('nothing-ran');
  const run = watched.reduce((sum, { entryAge = 0, exitAge }) => sum + (exitAge / furthest) ** shape - (entryAge / furthest) ** shape, 0);
  const failures = watched.filter(({ failed }) => failed).length;
  const scaleFor = (expected: number) => furthest * (run / expected) ** (1 / shape);
  return {
    kind: 'estimated',
    failures,
    scale: failures > 0 ? scaleFor(failures) : undefined,
    atLeast: scaleFor(gammaQuantile(failures + 1, { above: 1 - confidence })),
  };
}
