import { notEstimable, onLogScale, twoSided, Z_95, type Limits, type NotEstimable, type OneSided, type TwoSided } from '../result';
import { requirePositive, requireShare } from '../require';
import { betaQuantile } from '../special/incomplete-beta';
import { binomialTerm } from '../special/log-gamma';
import { requireExposed, type Exposed } from '../repeats/exposed';

export interface RateRatio {
  readonly kind: 'estimated';
  /** First to second; undefined when the second had no failures, so that it has no end. */
  readonly ratio: number | undefined;
  /** Exact, given how many failed in all. */
  readonly limits: Limits<never>;
  /** On the logarithm; undefined when one had no failures. */
  readonly wald: TwoSided | OneSided | undefined;
  /** Exact, two-sided: of every split that is no likelier. */
  readonly p: number;
}

/**
 * Ratio of two rates: of failures over exposure.
 *
 * Given d1 + d2, d1 is binomial with share p = r e1 / (r e1 + e2): Clopper and Pearson's limits of p give those of r.
 *
 * @returns not estimable when neither had failures
 * @throws RangeError for counts or exposures that cannot be
 * @example rateRatio({ count: 11, exposure: 800 }, { count: 21, exposure: 3011 }) // 1.97, 0.86 to 4.28, p 0.080
 */
export function rateRatio(first: Exposed, second: Exposed, { confidence = 0.95, z = Z_95 } = {}): RateRatio | NotEstimable<'no-failures'> {
  requireExposed([first, second]);
  requirePositive(first.exposure, 'An exposure');
  requirePositive(second.exposure, 'An exposure');
  requireShare(confidence, 'A confidence');
  const [d1, d2] = [first.count, second.count];
  if (d1 + d2 === 0) return notEstimable('no-failures');
  const perShare = second.exposure / first.exposure;
  const tail = (1 - confidence) / 2;
  const asRatio = (share: number) => (share / (1 - share)) * perShare;
  const lower = d1 === 0 ? 0 : asRatio(betaQuantile(d1, d2 + 1, tail));
  const ratio = d2 === 0 ? undefined : (d1 / d2) * perShare;
  return {
    kind: 'estimated',
    ratio,
    limits: d2 === 0 ? { kind: 'at-least', lower } : twoSided(lower, asRatio(betaQuantile(d1 + 1, d2, 1 - tail))),
    wald: ratio && d1 > 0 ? onLogScale(ratio, Math.sqrt(1 / d1 + 1 / d2), z) : undefined,
    p: splitP(d1, d1 + d2, first.exposure / (first.exposure + second.exposure)),
  };
}

/** Rounding of a probability must not part it from its equal on the other side. */
const AS_LIKELY = 1 + 1e-7;

function splitP(count: number, of: number, share: number): number {
  const seen = binomialTerm(count, of, share, 1 - share);
  let p = 0;
  for (let k = 0; k <= of; k += 1) {
    const each = binomialTerm(k, of, share, 1 - share);
    if (each <= seen * AS_LIKELY) p += each;
  }
  return Math.min(1, p);
}
