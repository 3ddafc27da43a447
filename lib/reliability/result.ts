/** Why nothing can be said, in place of a number that would be NaN or infinite. */
export interface NotEstimable<Why extends string> {
  readonly kind: 'not-estimable';
  readonly why: Why;
}

/** @example notEstimable('no-failures') // { kind: 'not-estimable', why: 'no-failures' } */
export const notEstimable = <Why extends string>(why: Why): NotEstimable<Why> => ({ kind: 'not-estimable', why });

export interface TwoSided {
  readonly kind: 'two-sided';
  readonly lower: number;
  readonly upper: number;
}

/** What data that bound a value from one side alone still say. */
export type OneSided = { readonly kind: 'at-most'; readonly upper: number } | { readonly kind: 'at-least'; readonly lower: number };

export interface NoLimits<Why extends string = string> {
  readonly kind: 'none';
  readonly why: Why;
}

/** Confidence limits of an estimate, as far as there are any. */
export type Limits<Why extends string = string> = TwoSided | OneSided | NoLimits<Why>;

/** @example twoSided(0.2, 0.4) // { kind: 'two-sided', lower: 0.2, upper: 0.4 } */
export const twoSided = (lower: number, upper: number): TwoSided => ({ kind: 'two-sided', lower, upper });

export const noLimits = <Why extends string>(why: Why): NoLimits<Why> => ({ kind: 'none', why });

/** An age, or how far was watched without reaching it: never extrapolated. */
export type Reached = { readonly kind: 'reached'; readonly age: number } | { readonly kind: 'not-reached'; readonly watchedTo: number };

/** Standard normal deviate of two-sided 95 % limits. */
export const Z_95 = 1.959963984540054;

/** Limits of a positive value whose logarithm is taken as normal; from below alone where the upper is past all numbers. */
export function onLogScale(value: number, standardErrorOfLog: number, z = Z_95): TwoSided | OneSided {
  const factor = Math.exp(z * standardErrorOfLog);
  const lower = value / factor;
  return value * factor < Infinity ? twoSided(lower, value * factor) : { kind: 'at-least', lower };
}
