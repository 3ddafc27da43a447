import type { Expression } from './expression';

type Kind = Expression['kind'];

/** What has an end of its own that can be heard. */
const CLOSED: readonly Kind[] = ['number', 'symbol', 'frac', 'call'];

/**
 * A formula in words, for a screen reader or where MathML cannot be drawn. What could be heard in two ways says where it
 * ends.
 *
 * @param names by symbol, as in the middle of a sentence: "reservoir volume". A symbol without is said by its id
 * @example toSpeech(frac(symbol('v'), symbol('t')), { v: 'the oil caught', t: 'the time' })
 * // 'the fraction the oil caught over the time, end of fraction'
 */
export function toSpeech(expression: Expression, names: Readonly<Record<string, string | undefined>>): string {
  const said = (part: Expression): string => toSpeech(part, names);
  const bracketed = (part: Expression, ...plain: readonly Kind[]): string =>
    [...CLOSED, ...plain].includes(part.kind) ? said(part) : `open bracket, ${said(part)}, close bracket`;
  switch (expression.kind) {
    case 'number':
      return expression.value === Math.PI ? 'pi' : String(Number(expression.value.toPrecision(6))).replace('-', 'minus ');
    case 'symbol':
      return names[expression.id] ?? expression.id;
    case 'plus':
      return expression.parts.map((part) => bracketed(part, 'times', 'pow')).join(' plus ');
    case 'times':
      return expression.parts.map((part) => bracketed(part, 'pow', 'times')).join(' times ');
    case 'minus':
      return `${bracketed(expression.left, 'times', 'pow', 'plus', 'minus')} minus ${bracketed(expression.right, 'times', 'pow')}`;
    case 'frac':
      return `the fraction ${said(expression.left)} over ${said(expression.right)}, end of fraction`;
    case 'pow':
      return expression.right.kind === 'number' && expression.right.value === 2
        ? `${bracketed(expression.left)} squared`
        : `${bracketed(expression.left)} to the power of ${bracketed(expression.right)}`;
    case 'call':
      return called(expression.name, expression.of.map(said));
  }
}

function called(name: Extract<Expression, { kind: 'call' }>['name'], parts: readonly string[]): string {
  switch (name) {
    case 'sqrt':
      return `the square root of ${parts.join(', ')}, end of root`;
    case 'ln':
      return `the natural logarithm of ${parts.join(', ')}, end of logarithm`;
    case 'max':
      return `the larger of ${parts.join(', and ')}, end of choice`;
  }
}
