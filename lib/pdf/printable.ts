/** What the embedded fonts draw: the letters of languages written in Latin script, and their signs. */
const DRAWN = /[\u0020-\u007e\u00a0-\u00ac\u00ae-\u00b4\u00b6-\u0107\u010a-\u0113\u0116-\u011b\u011e-\u0123\u0126-\u0127\u012a-\u012b\u012e-\u0133\u0136-\u0137\u0139-\u013e\u0141-\u0148\u0150-\u0155\u0158-\u015b\u015e-\u0165\u016a-\u016b\u016e-\u017e\u0192\u0218-\u021b\u02c6\u02c7\u02da\u02dc\u1e80-\u1e85\u1e9e\u1ef2-\u1ef3\u2009\u2013-\u2014\u2018-\u201a\u201c-\u201e\u2020\u2022\u2026\u2039-\u203a\u2044\u20ac\u2122\u2212\u2215]/u;

const INSTEAD: Readonly<Record<string, string>> = {
  '\n': '\n',
  '\t': ' ',
  '\u00ad': '',
  '\u00b5': 'u',
  '\u2010': '-',
  '\u2011': '-',
  '\u2032': '\'',
  '\u2033': '"',
  '\u2190': '<-',
  '\u2192': '->',
  '\u2260': 'not =',
  '\u2264': '<=',
  '\u2265': '>=',
  '\u2713': 'yes',
  '\u03bc': 'u',
  '\u03a9': 'ohm',
  '\u2126': 'ohm',
};
const UNKNOWN = '?';

/**
 * Words as the PDF can print them. What a font doesn't have would come out as a wrong sign or none, and be read as such:
 * it is written otherwise, or as a question mark that anybody sees.
 *
 * @example printable('≤ 120 psi') // '<= 120 psi'
 */
export const printable = (words: string): string => Array.from(words.normalize('NFC'), instead).join('');

function instead(sign: string): string {
  if (DRAWN.test(sign)) return sign;
  const known = INSTEAD[sign];
  if (known !== undefined) return known;
  if (/\p{Z}/u.test(sign)) return ' ';
  if (/[\p{Cf}\p{Cc}\p{M}]/u.test(sign)) return '';
  // "x₂" is "x2", "ễ" is "e".
  const plain = Array.from(sign.normalize('NFKD')).filter((part) => DRAWN.test(part)).join('');
  return plain === '' ? UNKNOWN : plain;
}
