import { toMathml, type Letter } from '../formula/to-mathml';
import { toSpeech } from '../formula/to-speech';
import type { Sum, SumQuantity } from './sum';

/** Everything that a sum has a symbol for: inputs, outputs and what is worked out on the way. */
export function quantitiesOf({ inputs, outputs, formula }: Sum): SumQuantity[] {
  return [...inputs, ...outputs, ...formula.terms];
}

function lettersOf(sum: Sum): Record<string, Letter> {
  return Object.fromEntries(quantitiesOf(sum).map(({ id, letter }) => [id, letter]));
}

/** As in the middle of a sentence. A label that begins with a name or an abbreviation is none of these. */
function namesOf(sum: Sum): Record<string, string> {
  return Object.fromEntries(quantitiesOf(sum).map(({ id, label }) => [id, label.charAt(0).toLowerCase() + label.slice(1)]));
}

/**
 * The formula of a sum as MathML, with its words as `alttext`.
 *
 * @param values what to put in the place of symbols, by id, written with their units: { volume: '3 ft³' }
 * @example formulaMathml(sum)         // V (p2 - p1) / ((Q - QL) pa)
 * @example formulaMathml(sum, values) // the same with the numbers put in, and what it comes to
 */
export function formulaMathml(sum: Sum, values?: Readonly<Record<string, string | undefined>>): string {
  return toMathml(sum.formula.expression, { result: sum.main, letters: lettersOf(sum), values, alttext: formulaSpeech(sum, values) });
}

/**
 * The formula of a sum in words.
 *
 * @param values as for `formulaMathml`
 * @example formulaSpeech(sum) // 'time to build up equals the fraction ...'
 */
export function formulaSpeech(sum: Sum, values: Readonly<Record<string, string | undefined>> = {}): string {
  const names = namesOf(sum);
  const total = values[sum.main];
  return `${names[sum.main]} equals ${toSpeech(sum.formula.expression, { ...names, ...values })}${total === undefined ? '' : `, equals ${total}`}`;
}
