import type { DecimalMark } from './number';
import { parseQuantity, type ParsedQuantity } from './parse';
import { differenceOf, type Quantity, type UnitId, type UnitOf } from './quantities';
import { refuse, type RefusedQuantity } from './refusal';

/** How far a reading can be off, as people write it. */
const PLUS_MINUS = /^\s*(±|\+\s*\/?\s*[-−])\s*/;

/** The error itself, without a "±" before it. @example withoutPlusMinus('+/- 2 psi') // '2 psi' */
export const withoutPlusMinus = (text: string): string => text.replace(PLUS_MINUS, '');

/**
 * Understands how far a reading can be off either way: a difference, 0 or more, with or without its "±".
 *
 * @param options of the reading: its quantity, and the unit of an error without one
 * @example parseError('± 2 °F', { quantity: 'temperature', defaultUnit: 'degF' }) // { ok: true, si: 1.11… }
 */
export function parseError(text: string, { quantity, defaultUnit, decimal }: { quantity: Quantity; defaultUnit: UnitId; decimal?: DecimalMark }): ParsedQuantity<Quantity> | RefusedQuantity {
  const error = parseQuantity<Quantity>(withoutPlusMinus(text), { quantity: differenceOf(quantity), defaultUnit: defaultUnit as UnitOf<Quantity>, decimal });
  return error.ok && error.si < 0 ? refuse('An error is 0 or more.') : error;
}
