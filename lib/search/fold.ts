/** What parts words: all but letters and digits. drizzle/0016 has the same list, for what the database keeps. */
const BETWEEN_WORDS =
  /[\u0000-\u002f\u003a-\u0060\u007b-\u00b4\u00b6-\u00b9\u00bb-\u00bf\u00d7\u00f7\u2000-\u206f\u20a0-\u20cf\u2100-\u2bff\u3000-\u3004\u3007-\u3020\ufe00-\ufe0f\ufeff\u{1f000}-\u{1faff}]+/gu;

/** As the database keeps no more of a word. */
const LONGEST_WORD = 60;

/**
 * A text as it is compared: lower case, without accents, its words a space apart.
 * @example fold('Señal, 1/8') // 'senal 1 8'
 */
export const fold = (text: string): string =>
  text.normalize('NFD').replaceAll(/[\u0300-\u036f]/g, '').toLowerCase().replaceAll(BETWEEN_WORDS, ' ').trim();

/**
 * The words that somebody looks for, each once. Punctuation alone has none.
 * @example wordsOf('Drain, DRAIN choked!') // ['drain', 'choked']
 */
export const wordsOf = (text: string): string[] => [...new Set(fold(text).split(' ').filter(Boolean).map((word) => [...word].slice(0, LONGEST_WORD).join('')))];

/**
 * A fleet number without what people leave out of it: "T-104", "t 104" and "T0104" are one to whoever stands in the yard.
 * @example fleetKey('T-0104') // 't104'
 */
export const fleetKey = (text: string): string => fold(text).replaceAll(' ', '').replaceAll(/(^|[^0-9])0+(?=[0-9])/g, '$1');
