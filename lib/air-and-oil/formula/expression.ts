/**
 * A formula as a tree, so that one source draws it, speaks it and works it out. Built by the functions below, which read
 * like the formula: frac(times(symbol('volume'), minus(symbol('to'), symbol('from'))), symbol('delivery')).
 */
export type Expression =
  | { readonly kind: 'number'; readonly value: number }
  | { readonly kind: 'symbol'; readonly id: string }
  | { readonly kind: 'plus' | 'times'; readonly parts: readonly Expression[] }
  | { readonly kind: 'minus' | 'frac' | 'pow'; readonly left: Expression; readonly right: Expression }
  | { readonly kind: 'call'; readonly name: FunctionName; readonly of: readonly Expression[] };

/** Functions of one argument; the last of several. */
export type FunctionName = 'sqrt' | 'ln' | 'max';

export const number = (value: number): Expression => ({ kind: 'number', value });

/** A quantity of the sum: an input, an output or something worked out on the way. */
export const symbol = (id: string): Expression => ({ kind: 'symbol', id });

export const plus = (...parts: Expression[]): Expression => ({ kind: 'plus', parts });
export const times = (...parts: Expression[]): Expression => ({ kind: 'times', parts });
export const minus = (left: Expression, right: Expression): Expression => ({ kind: 'minus', left, right });
export const frac = (left: Expression, right: Expression): Expression => ({ kind: 'frac', left, right });
export const pow = (left: Expression, right: Expression): Expression => ({ kind: 'pow', left, right });
export const sqrt = (of: Expression): Expression => ({ kind: 'call', name: 'sqrt', of: [of] });
export const ln = (of: Expression): Expression => ({ kind: 'call', name: 'ln', of: [of] });
export const larger = (...of: Expression[]): Expression => ({ kind: 'call', name: 'max', of });

/** The symbols of a formula, each once, in the order in which they are read. */
export function symbolsIn(expression: Expression): string[] {
  return [...new Set(walk(expression))];
}

function walk(expression: Expression): string[] {
  switch (expression.kind) {
    case 'number':
      return [];
    case 'symbol':
      return [expression.id];
    case 'plus':
    case 'times':
      return expression.parts.flatMap(walk);
    case 'call':
      return expression.of.flatMap(walk);
    default:
      return [...walk(expression.left), ...walk(expression.right)];
  }
}
