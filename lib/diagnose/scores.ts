/** How good were the probabilities? Scores of predictions whose truth has since been proved. */
import { mean } from 'simple-statistics';

/** What was said before the cause was proved, and the cause that was proved. */
export interface Prediction {
  /** Probability of each class, summing to 1. */
  p: ArrayLike<number>;
  /** Index into p of the truth. */
  truth: number;
}

const needSome = (predictions: readonly unknown[]): void => {
  if (predictions.length === 0) throw new RangeError('a score expects at least one prediction, got none');
};

/**
 * Brier score over all classes: the mean of sum_c (p_c - [c is the truth])^2.
 *
 * @returns score in [0, 2]; 0 is perfect. Over two classes it is twice {@link brierScore}.
 * @throws RangeError without predictions
 * @see Brier (1950), Verification of forecasts expressed in terms of probability
 * @example multiClassBrier([{ p: [0.8, 0.2], truth: 0 }]); // 0.08
 */
export function multiClassBrier(predictions: readonly Prediction[]): number {
  needSome(predictions);
  return mean(predictions.map(({ p, truth }) => {
    let sum = 0;
    for (let c = 0; c < p.length; c += 1) sum += (p[c]! - (c === truth ? 1 : 0)) ** 2;
    return sum;
  }));
}

/**
 * Log loss: the mean of -ln p(truth).
 *
 * @returns nats, 0 or more; Infinity when a truth had been called impossible
 * @throws RangeError without predictions
 * @see Good (1952), Rational decisions
 * @example logLoss([{ p: [0.5, 0.5], truth: 0 }]); // 0.6931
 */
export function logLoss(predictions: readonly Prediction[]): number {
  needSome(predictions);
  return mean(predictions.map(({ p, truth }) => -Math.log(p[truth]!)));
}

/**
 * Share of predictions whose truth is among the n most probable classes. A tie goes to the class that is listed first.
 *
 * @param n how many count, 1 or more
 * @returns share in [0, 1]
 * @throws RangeError without predictions
 * @example topShare([{ p: [0.5, 0.3, 0.2], truth: 1 }], 2); // 1
 */
export function topShare(predictions: readonly Prediction[], n: number): number {
  needSome(predictions);
  return mean(predictions.map(({ p, truth }) => {
    let ahead = 0;
    for (let c = 0; c < p.length; c += 1) if (p[c]! > p[truth]! || (p[c] === p[truth] && c < truth)) ahead += 1;
    return ahead < n ? 1 : 0;
  }));
}

/** A probability that was given to one event, and whether it came true. */
export interface Forecasted {
  p: number;
  happened: boolean;
}

/**
 * The most probable class of each prediction as a yes/no event: its probability, and whether it was the truth. This is
 * what reliability of a ranking is drawn over.
 *
 * @example topClass([{ p: [0.3, 0.7], truth: 1 }]); // [{ p: 0.7, happened: true }]
 */
export function topClass(predictions: readonly Prediction[]): Forecasted[] {
  return predictions.map(({ p, truth }) => {
    let best = 0;
    for (let c = 1; c < p.length; c += 1) if (p[c]! > p[best]!) best = c;
    return { p: p[best]!, happened: best === truth };
  });
}

/**
 * Brier score of a yes/no event: the mean of (p - y)^2.
 *
 * @returns score in [0, 1]; 0 is perfect
 * @throws RangeError without forecasts
 * @example brierScore([{ p: 0.9, happened: true }]); // 0.01
 */
export function brierScore(forecasts: readonly Forecasted[]): number {
  needSome(forecasts);
  return mean(forecasts.map(({ p, happened }) => (p - (happened ? 1 : 0)) ** 2));
}
