import type { DecimalMark } from '@/lib/units';

const WITH_COMMA = /^\d{1,3}(\.\d{3})*,\d+$|^\d+,\d+$/;
const WITH_POINT = /^\d{1,3}(,\d{3})*\.\d+$|^\d+\.\d+$/;
/** Three digits behind one mark may be thousands. */
const EITHER = /^\d{1,3}[.,]\d{3}$/;

/**
 * Which mark a file writes before decimals, by the figures that leave no doubt.
 *
 * @param otherwise where none does: semicolons between columns go with a comma
 * @example guessDecimalMark(['12,5', '410.000'], '.') // ','
 */
export function guessDecimalMark(texts: readonly string[], otherwise: DecimalMark): DecimalMark {
  const clear = texts.map((text) => text.trim()).filter((text) => !EITHER.test(text));
  const commas = clear.filter((text) => WITH_COMMA.test(text)).length;
  const points = clear.filter((text) => WITH_POINT.test(text)).length;
  if (commas === points) return otherwise;
  return commas > points ? ',' : '.';
}
