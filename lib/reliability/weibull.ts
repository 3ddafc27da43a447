interface Weibull {
  /** beta. */
  readonly shape: number;
  /** eta: the age by which 63.2 % have failed. */
  readonly scale: number;
}

function requireWeibull({ shape, scale }: Weibull): void {
  if (!(shape > 0 && scale > 0)) throw new RangeError('A Weibull distribution needs a shape and a scale above zero.');
}

/**
 * The share that is still working at an age: exp(-(t / eta)^beta).
 *
 * @param age 0 or more, in the unit of the scale
 * @throws RangeError
 * @see IEC 61649
 * @example weibullReliability({ shape: 2, scale: 1000 }, 500) // 0.7788
 */
export function weibullReliability(law: Weibull, age: number): number {
  requireWeibull(law);
  if (!(age >= 0)) throw new RangeError('An age is not negative.');
  return Math.exp(-((age / law.scale) ** law.shape));
}

/**
 * The age by which a share has failed: eta (-ln(1 - share))^(1 / beta). A share of 0.1 is the B10 life.
 *
 * @param share 0 to below 1
 * @throws RangeError
 * @example weibullLife({ shape: 2, scale: 1000 }, 0.1) // 324.6
 */
export function weibullLife(law: Weibull, share: number): number {
  requireWeibull(law);
  if (!(share >= 0 && share < 1)) throw new RangeError('A share is from 0 to below 1.');
  return law.scale * (-Math.log1p(-share)) ** (1 / law.shape);
}
