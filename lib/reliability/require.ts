/** Illegal data are refused with one error; what legal data cannot answer is a result (`result.ts`). */

export function requireCount(value: number, what = 'A count'): void {
  if (!(Number.isSafeInteger(value) && value >= 0)) throw new RangeError(`${what} is a whole number, 0 or more.`);
}

export function requireShare(value: number, what = 'A share'): void {
  if (!(value > 0 && value < 1)) throw new RangeError(`${what} is above 0 and below 1.`);
}

export function requireProbability(value: number): void {
  if (!(value >= 0 && value <= 1)) throw new RangeError('A probability is from 0 to 1.');
}

/** Finite and not negative: an age, an exposure. */
export function requireAmount(value: number, what: string): void {
  if (!(value >= 0 && value < Infinity)) throw new RangeError(`${what} is a finite number, 0 or more.`);
}

export function requirePositive(value: number, what: string): void {
  if (!(value > 0 && value < Infinity)) throw new RangeError(`${what} is a finite number above 0.`);
}
