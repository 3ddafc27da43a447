import { describe, expect, it } from 'vitest';
import { evaluate } from '@/lib/air-and-oil/formula/evaluate';
import { frac, larger, ln, minus, number, plus, pow, sqrt, symbol, symbolsIn, times } from '@/lib/air-and-oil/formula/expression';
import { toMathml } from '@/lib/air-and-oil/formula/to-mathml';
import { toSpeech } from '@/lib/air-and-oil/formula/to-speech';
import { fixedPoint } from '@/lib/air-and-oil/solve/fixed-point';
import { findRoot } from '@/lib/air-and-oil/solve/find-root';

const [a, b, c] = [symbol('a'), symbol('b'), symbol('c')];
const letters = { a: { letter: 'a' }, b: { letter: 'b' }, c: { letter: 'c', sub: '1' } };

describe('a formula', () => {
  it('comes to what it says', () => {
    const whole = minus(plus(times(a, pow(b, number(2))), frac(number(1), c)), sqrt(larger(a, ln(b))));
    expect(evaluate(whole, { a: 2, b: 3, c: 4 })).toBeCloseTo(18 + 0.25 - Math.sqrt(2), 12);
    expect(symbolsIn(whole)).toEqual(['a', 'b', 'c']);
    expect(() => evaluate(a, {})).toThrow(RangeError);
    expect(() => evaluate(symbol('toString'), { a: 1 })).toThrow();
  });

  it.each([
    ['a fraction', frac(a, c), '<mfrac><mi>a</mi><msub><mi>c</mi><mtext>1</mtext></msub></mfrac>'],
    ['brackets where a sum is multiplied', times(a, plus(b, c)), '<mo>(</mo><mi>b</mi>'],
    ['brackets where a difference is taken away', minus(a, minus(b, c)), '<mo>−</mo><mrow><mo>(</mo>'],
    ['brackets where a fraction is raised', pow(frac(a, b), number(2)), '<msup><mrow><mo>(</mo><mfrac>'],
    ['a root', sqrt(a), '<msqrt><mi>a</mi></msqrt>'],
    ['pi by its letter', number(Math.PI), '<mi>π</mi>'],
    ['a negative number with a minus', number(-2), '<mn>−2</mn>'],
  ])('draws %s', (_, expression, drawn) => {
    expect(toMathml(expression, { letters })).toContain(drawn);
  });

  it('needs no brackets in a fraction', () => {
    expect(toMathml(frac(plus(a, b), minus(b, c)), { letters })).not.toContain('<mo>(</mo>');
  });

  it('puts numbers in with their units, escaped, and brackets them where they are raised', () => {
    const drawn = toMathml(times(a, pow(b, number(2))), { letters, result: 'c', values: { a: '3 < "4"', b: '5 ft', c: '75 ft²' }, alttext: 'a & b' });
    expect(drawn).toBe(
      '<math display="block" alttext="a &amp; b"><msub><mi>c</mi><mtext>1</mtext></msub><mo>=</mo><mrow><mtext>3 &lt; &quot;4&quot;</mtext><mo>×</mo>' +
        '<msup><mrow><mo>(</mo><mtext>5 ft</mtext><mo>)</mo></mrow><mn>2</mn></msup></mrow><mo>=</mo><mtext>75 ft²</mtext></math>',
    );
  });

  it.each([
    [frac(plus(a, b), c), 'the fraction a plus b over c, end of fraction'],
    [times(a, plus(b, c)), 'a times open bracket, b plus c, close bracket'],
    [pow(minus(a, b), number(2)), 'open bracket, a minus b, close bracket squared'],
    [minus(a, minus(b, c)), 'a minus open bracket, b minus c, close bracket'],
    [minus(minus(a, b), c), 'a minus b minus c'],
    [pow(a, frac(b, c)), 'a to the power of the fraction b over c, end of fraction'],
    [larger(a, ln(b)), 'the larger of a, and the natural logarithm of b, end of logarithm, end of choice'],
    [times(number(Math.PI), sqrt(a)), 'pi times the square root of a, end of root'],
  ])('is said so that its parts can be told apart: %#', (expression, said) => {
    expect(toSpeech(expression, {})).toBe(said);
  });
});

describe('iterations', () => {
  it('find a root to the last digits, or say why not', () => {
    expect(findRoot((x) => x * x - 2, { from: 0, to: 2 })).toMatchObject({ converged: true, root: expect.closeTo(Math.SQRT2, 13) });
    expect(findRoot((x) => x ** 9, { from: -1, to: 1.3 })).toMatchObject({ converged: true });
    expect(findRoot((x) => Math.exp(50 * x) - 1e10, { from: 0, to: 1 })).toMatchObject({ converged: true, root: expect.closeTo(Math.log(1e10) / 50, 13) });
    expect(findRoot((x) => x - 1, { from: 1, to: 2 })).toMatchObject({ converged: true, root: 1 });
    expect(findRoot((x) => x * x + 1, { from: -1, to: 1 })).toEqual({ converged: false, because: 'no change of sign' });
    expect(findRoot((x) => x - Math.PI, { from: 0, to: 1e9, mostIterations: 1 })).toEqual({ converged: false, because: 'too many iterations' });
  });

  it('come to rest at a fixed point, or say that they didn’t', () => {
    expect(fixedPoint(Math.cos, { from: 1 })).toMatchObject({ converged: true, value: expect.closeTo(0.7390851332, 10) });
    expect(fixedPoint((x) => 3 - 2 * x, { from: 1.1 }).converged).toBe(false);
  });
});
