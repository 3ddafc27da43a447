import { usualOf, type Baseline } from './baseline-for';

export interface Comparison {
  /** Value less what is usual, SI, as a difference. */
  differenceSi: number;
  /** Past what the baseline itself can be off (a set's error, the middle half of a model), and on which side. */
  outside: 'above' | 'below' | null;
}

/**
 * A value against what is usual.
 *
 * @param value SI, of the baseline's quantity
 * @throws RangeError when the value is not finite
 * @example compare(31, { from: 'own', figure: 'build-up-time', si: 24, errorSi: 1, … }) // { differenceSi: 7, outside: 'above' }
 */
export function compare(value: number, baseline: Baseline): Comparison {
  if (!Number.isFinite(value)) throw new RangeError(`${value} can't be compared`);
  const [low, high] = baseline.from === 'own' ? [baseline.si - baseline.errorSi, baseline.si + baseline.errorSi] : [baseline.lower, baseline.upper];
  return { differenceSi: value - usualOf(baseline), outside: value > high ? 'above' : value < low ? 'below' : null };
}
