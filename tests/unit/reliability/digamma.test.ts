import { describe, expect, it } from 'vitest';
import { digamma, trigamma } from '@/lib/reliability/special/digamma';

const EULER = 0.5772156649015329;

/** Abramowitz and Stegun, 6.3.2 to 6.3.4, 6.4.2 to 6.4.4: closed forms. */
describe('digamma and trigamma', () => {
  it.each([
    [1, -EULER, Math.PI ** 2 / 6],
    [0.5, -EULER - 2 * Math.LN2, Math.PI ** 2 / 2],
    [2, 1 - EULER, Math.PI ** 2 / 6 - 1],
    [5, 25 / 12 - EULER, Math.PI ** 2 / 6 - 205 / 144],
    [1.5, 2 - EULER - 2 * Math.LN2, Math.PI ** 2 / 2 - 4],
  ])('at %s are what their closed forms say', (x, psi, psi1) => {
    expect(digamma(x)).toBeCloseTo(psi, 13);
    expect(trigamma(x)).toBeCloseTo(psi1, 13);
  });

  it('keep their recurrences where series and sum meet, and for small and large arguments', () => {
    for (const x of [1e-6, 0.01, 0.3, 7.7, 13.9, 14.5, 15, 15.2, 400, 1e6]) {
      expect(digamma(x + 1) - digamma(x)).toBeCloseTo(1 / x, x < 0.001 ? 6 : 11);
      expect((trigamma(x) - trigamma(x + 1)) * x * x).toBeCloseTo(1, x > 1e5 ? 3 : 6);
    }
  });

  it.each([0, -1, NaN, Infinity])('are not taken at %s', (x) => {
    expect(() => digamma(x)).toThrow(RangeError);
    expect(() => trigamma(x)).toThrow(RangeError);
  });
});
