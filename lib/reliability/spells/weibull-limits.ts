import { noLimits, onLogScale, twoSided, Z_95, type Limits } from '../result';
import { requireShare } from '../require';
import { logGamma } from '../special/log-gamma';
import { rootBeyond } from '../special/root';
import { weibullLife } from '../weibull';
import type { WeibullFit } from './weibull-fit';

/** Share failed by the scale. */
export const SHARE_BY_SCALE = 1 - Math.exp(-1);

/** Wald's are quick and good with many failures; those of the profile likelihood are better below about 15. */
export type Method = 'profile' | 'wald';

export type WeibullLimits = Limits<'no-information' | 'no-bound'>;

/**
 * Limits of the shape, 95 % unless another z is given.
 *
 * Wald: beta exp(±z se of ln beta). Profile: where 2 (l_max - l) = z^2.
 *
 * @returns one-sided where the likelihood never falls far enough on a side
 * @example shapeLimits(fit) // { kind: 'two-sided', lower: 0.91, upper: 2.89 }
 */
export function shapeLimits(fit: WeibullFit, { method = 'profile', z = Z_95 }: { method?: Method; z?: number } = {}): WeibullLimits {
  if (method === 'wald') return fit.covariance ? onLogScale(fit.shape, Math.sqrt(fit.covariance.logSpread), z) : noLimits('no-information');
  return profile(fit, (logShape) => fit.likelihood.atShape(Math.exp(logShape)), Math.log(fit.shape), z);
}

/**
 * The age by which a share has failed (0.1: B10), with limits.
 *
 * @param share above 0 and below 1
 * @throws RangeError
 * @example lifeAtShare(fit, 0.1) // { age: 164, limits: { kind: 'two-sided', lower: 60, upper: 272 } }
 */
export function lifeAtShare(
  fit: WeibullFit,
  share: number,
  { method = 'profile', z = Z_95 }: { method?: Method; z?: number } = {},
): { age: number; limits: WeibullLimits } {
  requireShare(share);
  const age = weibullLife(fit, share);
  if (method === 'profile') return { age, limits: profile(fit, (logLife) => fit.likelihood.atLife(Math.exp(logLife), share) ?? NaN, Math.log(age), z) };
  if (!fit.covariance) return { age, limits: noLimits('no-information') };
  const { logScale, logSpread, both } = fit.covariance;
  const along = Math.log(-Math.log1p(-share)) / fit.shape;
  return { age, limits: onLogScale(age, Math.sqrt(logScale + 2 * along * both + along * along * logSpread), z) };
}

/** Limits of the scale: the age by which 63.2 % have failed. */
export const scaleLimits = (fit: WeibullFit, options: { method?: Method; z?: number } = {}): WeibullLimits =>
  lifeAtShare(fit, SHARE_BY_SCALE, options).limits;

/** Where twice the fall of the log-likelihood comes to z squared, on either side; all on the logarithm. */
function profile(fit: WeibullFit, at: (logarithm: number) => number, likeliest: number, z: number): WeibullLimits {
  const beyond = (logarithm: number) => fit.logLikelihood - at(logarithm) - (z * z) / 2;
  const step = z / Math.sqrt(fit.failures) / 4;
  const [below, above] = [-step, step].map((by) => {
    const value = Math.exp(rootBeyond(beyond, likeliest, by, 12) ?? NaN);
    return value > 0 && value < Infinity ? value : undefined;
  });
  if (below === undefined) return above === undefined ? noLimits('no-bound') : { kind: 'at-most', upper: above };
  return above === undefined ? { kind: 'at-least', lower: below } : twoSided(below, above);
}

/** Mean and standard deviation of a law. @example weibullMoments({ shape: 1.72, scale: 606.5 }).mean // 540.7 */
export function weibullMoments({ shape, scale }: { shape: number; scale: number }): { mean: number; standardDeviation: number } {
  const [first, second] = [logGamma(1 + 1 / shape), logGamma(1 + 2 / shape)];
  return { mean: scale * Math.exp(first), standardDeviation: scale * Math.sqrt(Math.exp(second) - Math.exp(2 * first)) };
}
