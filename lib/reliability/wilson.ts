import { notEstimable, twoSided, Z_95, type NotEstimable, type TwoSided } from './result';
import { requireCount } from './require';

export interface Proportion {
  readonly kind: 'estimated';
  readonly share: number;
  readonly count: number;
  readonly of: number;
  readonly limits: TwoSided;
}

/**
 * A share with Wilson's score limits: (p + z^2/2n ± z sqrt(p (1-p) / n + z^2/4n^2)) / (1 + z^2/n).
 *
 * @returns not estimable of none
 * @throws RangeError when counts cannot be
 * @see E. B. Wilson 1927; R. G. Newcombe, Statistics in Medicine 17, 1998, method 3
 * @example wilson(0, 20) // share 0, limits 0 to 0.161
 */
export function wilson(count: number, of: number, z = Z_95): Proportion | NotEstimable<'nothing-counted'> {
  requireCount(count);
  requireCount(of);
  if (count > of) throw new RangeError('A share is not of fewer than were counted.');
  if (of === 0) return notEstimable('nothing-counted');
  const share = count / of;
  const centre = share + (z * z) / (2 * of);
  const reach = z * Math.sqrt((share * (1 - share)) / of + (z * z) / (4 * of * of));
  const over = 1 + (z * z) / of;
  // The formula gives the ends exactly, save for rounding.
  const limits = twoSided(count === 0 ? 0 : Math.max(0, (centre - reach) / over), count === of ? 1 : Math.min(1, (centre + reach) / over));
  return { kind: 'estimated', share, count, of, limits };
}
