import type { Expression, FunctionName } from './expression';

/**
 * What a formula comes to.
 *
 * @param values by symbol, in SI
 * @throws RangeError where a symbol has no value
 * @example evaluate(frac(symbol('a'), number(2)), { a: 3 }) // 1.5
 */
export function evaluate(expression: Expression, values: Readonly<Record<string, number | undefined>>): number {
  const value = (part: Expression): number => evaluate(part, values);
  switch (expression.kind) {
    case 'number':
      return expression.value;
    case 'symbol': {
      const known = Object.hasOwn(values, expression.id) ? values[expression.id] : undefined;
      if (known === undefined) throw new RangeError(`'${expression.id}' has no value`);
      return known;
    }
    case 'plus':
      return expression.parts.reduce((sum, part) => sum + value(part), 0);
    case 'times':
      return expression.parts.reduce((product, part) => product * value(part), 1);
    case 'minus':
      return value(expression.left) - value(expression.right);
    case 'frac':
      return value(expression.left) / value(expression.right);
    case 'pow':
      return value(expression.left) ** value(expression.right);
    case 'call':
      return called(expression.name, expression.of.map(value));
  }
}

function called(name: FunctionName, [first = NaN, ...rest]: number[]): number {
  switch (name) {
    case 'sqrt':
      return Math.sqrt(first);
    case 'ln':
      return Math.log(first);
    case 'max':
      return Math.max(first, ...rest);
  }
}
