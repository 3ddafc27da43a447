import { LEAST_FAILURES } from '../honesty';
import { notEstimable, type NotEstimable } from '../result';
import { rootBeyond } from '../special/root';
import { everAtRisk, type Spell } from './spell';
import { weibullLikelihood, type WeibullLikelihood } from './weibull-likelihood';

export interface WeibullFit {
  readonly kind: 'estimated';
  /** beta: above 1 it wears out, below 1 it fails early. */
  readonly shape: number;
  /** eta, in the unit of the ages. */
  readonly scale: number;
  readonly failures: number;
  readonly logLikelihood: number;
  /** Of ln eta and of ln(1 / beta), by observed information; undefined where that has no inverse. */
  readonly covariance: { readonly logScale: number; readonly logSpread: number; readonly both: number } | undefined;
  /** What profile limits are found from. */
  readonly likelihood: WeibullLikelihood;
}

export type WeibullWhy = 'no-failures' | 'too-few-failures' | 'failure-at-age-zero' | 'failures-at-one-age' | 'no-likeliest-shape';

/**
 * The Weibull law that is likeliest after spells, some of which are still running.
 *
 * @param leastFailures below which no law is fitted: show the Kaplan-Meier curve alone
 * @returns not estimable without failures (offer `weibayes`), or when all failed at one age and none ran on, so that the
 *   shape would be without end
 * @throws RangeError for illegal spells
 * @see IEC 61649; NIST/SEMATECH e-Handbook 8.4.1.3
 * @example const fit = fitWeibull(spells); if (fit.kind === 'estimated') fit.shape // 1.72
 */
export function fitWeibull(spells: readonly Spell[], { leastFailures = LEAST_FAILURES }: { leastFailures?: number } = {}): WeibullFit | NotEstimable<WeibullWhy> {
  const likelihood = weibullLikelihood(spells);
  const failed = spells.filter((spell) => spell.failed && everAtRisk(spell));
  if (failed.length === 0) return notEstimable('no-failures');
  if (!likelihood) return notEstimable('failure-at-age-zero');
  const age = failed[0]?.exitAge ?? 0;
  if (failed.every(({ exitAge }) => exitAge === age) && spells.every(({ exitAge }) => exitAge <= age)) return notEstimable('failures-at-one-age');
  if (failed.length < leastFailures) return notEstimable('too-few-failures');

  const slope = (logShape: number) => likelihood.slope(Math.exp(logShape));
  // Shapes below 0.02 are no law of lifetimes: with late entries alone the likelihood can rise towards 0 without end.
  const rising = slope(0) > 0;
  const logShape = rootBeyond(slope, 0, rising ? 0.25 : -0.25, rising ? 6 : 4);
  if (logShape === undefined) return notEstimable('no-likeliest-shape');
  const shape = Math.exp(logShape);
  const scale = likelihood.scaleAt(shape);
  if (!(scale > 0 && scale < Infinity)) return notEstimable('no-likeliest-shape');
  return {
    kind: 'estimated',
    shape,
    scale,
    failures: likelihood.failures,
    logLikelihood: likelihood.atShape(shape),
    covariance: covarianceOf(spells.filter((spell) => everAtRisk(spell) && spell.exitAge > 0), shape, scale),
    likelihood,
  };
}

/** Inverse of the observed information in (ln eta, ln sigma), sigma = 1 / beta. */
function covarianceOf(spells: readonly Spell[], shape: number, scale: number): WeibullFit['covariance'] {
  let [i11, i12, i22] = [0, 0, 0];
  const add = (age: number, sign: 1 | -1, failed: boolean) => {
    const z = shape * Math.log(age / scale);
    const e = Math.exp(z) * sign;
    i11 += e * shape * shape;
    i12 += (e + z * e - (failed ? 1 : 0)) * shape;
    i22 += z * e + z * z * e - (failed ? z : 0);
  };
  for (const { entryAge = 0, exitAge, failed } of spells) {
    add(exitAge, 1, failed);
    if (entryAge > 0) add(entryAge, -1, false);
  }
  const determinant = i11 * i22 - i12 * i12;
  return determinant > 0 && i11 > 0 ? { logScale: i22 / determinant, logSpread: i11 / determinant, both: -i12 / determinant } : undefined;
}
