/** Failures of one repaired system at ages t_i, watched until age T. */
export interface PowerLaw {
  /** beta by maximum likelihood: above 1 it wears out, below 1 it gets better. */
  readonly shape: number;
  /** (N - 1) / N beta, without the bias; undefined for one failure. */
  readonly unbiasedShape: number | undefined;
  /** Failures per unit of age at the end: N beta / T. */
  readonly intensity: number;
}

/**
 * The power-law process through the failures of a repaired system, watched for a fixed time: the sum of the bench's checks.
 * `recurrence/crow-amsaa.ts` gives limits, a test of fit and, of too few failures, a reason in place of a refusal.
 *
 * beta = N / sum ln(T / t_i)
 *
 * @param ages of the failures, each above 0 and below `until`, in any unit; at least one
 * @param until the age at which watching ended, in the same unit
 * @throws RangeError when there is no failure or one is not inside the time watched
 * @see IEC 61710, power law model (time-truncated; estimator from memory)
 * @example powerLaw([200, 450, 800, 1300, 1900], 2000).shape // 0.963
 */
export function powerLaw(ages: readonly number[], until: number): PowerLaw {
  const n = ages.length;
  if (n === 0 || !ages.every((age) => age > 0 && age < until)) throw new RangeError('A power law needs failures inside the time watched.');
  const shape = n / ages.reduce((sum, age) => sum + Math.log(until / age), 0);
  return { shape, unbiasedShape: n > 1 ? ((n - 1) / n) * shape : undefined, intensity: (n * shape) / until };
}
