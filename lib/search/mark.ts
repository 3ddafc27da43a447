import { fleetKey, fold } from './fold';

/** A piece of a text, and whether it is what was looked for. Data, never HTML: whoever shows it marks it in his own way. */
export interface Segment {
  text: string;
  hit: boolean;
}

/** As long as two lines on a phone. */
const LONGEST_EXCERPT = 160;
/** What is shown before the first word found, so that it has its sentence around it. */
const BEFORE = 40;

const WORD = /[\p{L}\p{N}\p{M}]+/gu;

/** A text with the words marked that begin as one looked for. The pieces, put together, are the text. */
export function markWords(text: string, words: readonly string[]): Segment[] {
  const ranges = [...text.matchAll(WORD)]
    // Folding may part a word (½ does): then each part may be the one.
    .filter(([word]) => fold(word).split(' ').some((part) => part !== '' && words.some((wanted) => part.startsWith(wanted))))
    .map(({ 0: word, index }) => ({ from: index, to: index + word.length }));
  return cut(text, ranges);
}

/** A fleet number with what was typed of it marked, however either is written. */
export function markFleetNumber(fleetNumber: string, typedKey: string): Segment[] {
  // Where each character of the key stands in the number.
  const places: number[] = [];
  let key = '';
  let at = 0;
  for (const char of fleetNumber) {
    const longer = fleetKey(fleetNumber.slice(0, at + char.length));
    // A nought counts once a digit before it does; a digit after noughts takes the place of those that were dropped.
    if (longer.length > key.length) for (let i = key.length; i < longer.length; i++) places.push(at);
    else if (longer !== key && longer !== '') places[longer.length - 1] = at;
    key = longer;
    at += char.length;
  }
  const start = typedKey === '' ? -1 : key.indexOf(typedKey);
  const [from, last] = [places[start], places[start + typedKey.length - 1]];
  return from === undefined || last === undefined ? cut(fleetNumber, []) : cut(fleetNumber, [{ from, to: last + 1 }]);
}

/** Of a long text the part around the first word found, marked. */
export function excerpt(text: string, words: readonly string[]): Segment[] {
  const whole = text.replaceAll(/\s+/g, ' ').trim();
  if (whole.length <= LONGEST_EXCERPT) return markWords(whole, words);
  const segments = markWords(whole, words);
  const first = segments.findIndex(({ hit }) => hit);
  const found = segments.slice(0, Math.max(first, 0)).reduce((sum, { text: { length } }) => sum + length, 0);
  const from = found <= BEFORE ? 0 : afterSpace(whole, found - BEFORE, found);
  const to = from + LONGEST_EXCERPT >= whole.length ? whole.length : beforeSpace(whole, from + LONGEST_EXCERPT, from);
  return markWords(`${from > 0 ? '… ' : ''}${whole.slice(from, to)}${to < whole.length ? ' …' : ''}`, words);
}

/** The beginning of a word at or after `from`; `from` itself when there is none before `most`. */
function afterSpace(text: string, from: number, most: number): number {
  const space = text.indexOf(' ', from - 1);
  return space >= 0 && space < most ? space + 1 : whole(text, from);
}

function beforeSpace(text: string, to: number, least: number): number {
  const space = text.lastIndexOf(' ', to);
  return space > least ? space : whole(text, to);
}

/** Never between the halves of a character. */
const whole = (text: string, at: number): number => (/[\udc00-\udfff]/.test(text.charAt(at)) ? at - 1 : at);

function cut(text: string, ranges: readonly { from: number; to: number }[]): Segment[] {
  const segments: Segment[] = [];
  let at = 0;
  for (const { from, to } of ranges) {
    if (from > at) segments.push({ text: text.slice(at, from), hit: false });
    segments.push({ text: text.slice(from, to), hit: true });
    at = to;
  }
  if (at < text.length || segments.length === 0) segments.push({ text: text.slice(at), hit: false });
  return segments;
}
