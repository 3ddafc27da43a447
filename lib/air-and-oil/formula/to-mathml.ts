import type { Expression } from './expression';

/** How a symbol is written: one letter, and what tells it from others of that letter. */
export interface Letter {
  readonly letter: string;
  readonly sub?: string;
}

interface Drawing {
  readonly letters: Readonly<Record<string, Letter | undefined>>;
  /** What to put in the place of symbols: "120 psi". A symbol without stays a letter. */
  readonly values?: Readonly<Record<string, string | undefined>>;
}

/** How tightly an expression holds together: what is looser than its place needs brackets. */
const LOOSE = 1;
const PRODUCT = 2;
const TIGHT = 3;

/**
 * A formula in MathML Core, for a page to show as it is; for what a screen reader should say, see `toSpeech`.
 *
 * @param result the letter before the equals sign, and with numbers put in, what the formula comes to
 * @returns a `math` element as a string; every text in it is escaped
 * @example toMathml(frac(symbol('v'), symbol('t')), { letters: { v: { letter: 'V' }, t: { letter: 't' } } })
 * // '<math display="block"><mfrac><mi>V</mi><mi>t</mi></mfrac></math>'
 */
export function toMathml(expression: Expression, { result, alttext, ...drawing }: Drawing & { readonly result?: string; readonly alttext?: string }): string {
  const left = result === undefined ? '' : `${drawn({ kind: 'symbol', id: result }, { letters: drawing.letters }, LOOSE)}<mo>=</mo>`;
  const right = drawn(expression, drawing, LOOSE);
  const value = result === undefined ? undefined : drawing.values?.[result];
  const total = value === undefined ? '' : `<mo>=</mo><mtext>${escaped(value)}</mtext>`;
  const label = alttext === undefined ? '' : ` alttext="${escaped(alttext)}"`;
  return `<math display="block"${label}>${left}${right}${total}</math>`;
}

function drawn(expression: Expression, drawing: Drawing, place: number): string {
  const part = (of: Expression, needs: number) => drawn(of, drawing, needs);
  const row = (content: string, holds: number) => (holds < place ? `<mrow><mo>(</mo>${content}<mo>)</mo></mrow>` : `<mrow>${content}</mrow>`);
  switch (expression.kind) {
    case 'number':
      return expression.value === Math.PI ? '<mi>π</mi>' : `<mn>${plainNumber(expression.value)}</mn>`;
    case 'symbol':
      return drawnSymbol(expression.id, drawing, place);
    case 'plus':
      return row(expression.parts.map((each) => part(each, LOOSE)).join('<mo>+</mo>'), LOOSE);
    case 'times':
      return row(expression.parts.map((each) => part(each, PRODUCT)).join(multiplied(drawing)), PRODUCT);
    case 'minus':
      return row(`${part(expression.left, LOOSE)}<mo>−</mo>${part(expression.right, PRODUCT)}`, LOOSE);
    case 'frac': {
      const fraction = `<mfrac>${part(expression.left, LOOSE)}${part(expression.right, LOOSE)}</mfrac>`;
      return place === TIGHT ? `<mrow><mo>(</mo>${fraction}<mo>)</mo></mrow>` : fraction;
    }
    case 'pow':
      return `<msup>${part(expression.left, TIGHT)}${part(expression.right, LOOSE)}</msup>`;
    case 'call': {
      if (expression.name === 'sqrt') return `<msqrt>${expression.of.map((each) => part(each, LOOSE)).join('')}</msqrt>`;
      const inside = expression.of.map((each) => part(each, LOOSE)).join('<mo>,</mo>');
      return `<mrow><mi>${expression.name}</mi><mo>&#8289;</mo><mrow><mo>(</mo>${inside}<mo>)</mo></mrow></mrow>`;
    }
  }
}

/** Letters stand side by side; values with units need a sign between them. */
const multiplied = ({ values }: Drawing) => (values === undefined ? '<mo>&#8290;</mo>' : '<mo>×</mo>');

function drawnSymbol(id: string, { letters, values }: Drawing, place: number): string {
  const value = values?.[id];
  if (value !== undefined) {
    const text = `<mtext>${escaped(value)}</mtext>`;
    return place === TIGHT ? `<mrow><mo>(</mo>${text}<mo>)</mo></mrow>` : text;
  }
  const { letter, sub } = letters[id] ?? { letter: id, sub: undefined };
  return sub === undefined ? `<mi>${escaped(letter)}</mi>` : `<msub><mi>${escaped(letter)}</mi><mtext>${escaped(sub)}</mtext></msub>`;
}

/** Up to six figures: constants of a formula are known to no more. */
function plainNumber(value: number): string {
  return String(Number(value.toPrecision(6))).replace('-', '−');
}

function escaped(text: string): string {
  return text.replace(/&/g, '&amp;').replace(/</g, '&lt;').replace(/>/g, '&gt;').replace(/"/g, '&quot;');
}
