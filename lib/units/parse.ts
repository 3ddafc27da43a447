import { readColon, type Term } from './colon';
import { fromSi, toSi } from './convert';
import { readNumber, type DecimalMark } from './number';
import { QUANTITIES, isUnitOf, unitDefinition, type Quantity, type UnitOf } from './quantities';
import { quoted, refuse, refuseEmpty, refuseUnit, refuseUnknown, type RefusedQuantity } from './refusal';
import { isBlankUnit, otherQuantitySpelt, unitSpelt } from './spelling';

/** What was typed, understood. */
export interface ParsedQuantity<Q extends Quantity = Quantity> {
  readonly ok: true;
  /** The value in the quantity's SI unit. Always finite. */
  readonly si: number;
  /** The value in `unit`. */
  readonly value: number;
  /** The unit that was typed, or the default; the smallest one of "1 min 30 s". */
  readonly unit: UnitOf<Q>;
  /** The text as it was typed, without blanks around it. */
  readonly asTyped: string;
}

export interface ParseOptions<Q extends Quantity = Quantity> {
  readonly quantity: Q;
  /** The unit of a number without one: what the person set, or what the check says. */
  readonly defaultUnit: UnitOf<Q>;
  /** The person's decimal mark, when it is known. It settles what would otherwise be asked back. */
  readonly decimal?: DecimalMark;
}

/** Longer than any reading with its unit. */
const LONGEST = 60;

/** Past this a number is a slip of the finger whatever it measures. */
const LARGEST = 1e9;

/**
 * Understands what people type for a quantity: "120 psi", "8,3 bar", "5/8", "1 3/8 in", "-20F", "410,000 miles",
 * "1:30", "5 ft 6 in".
 *
 * - A number without a unit is in `defaultUnit`. Capitals, full stops and blanks in units don't matter.
 * - Comma and point: see `readNumber`. What could be wrong by a factor of a thousand is asked back, never guessed.
 * - A colon is minutes and seconds in a time ("1:30", "1:02:30") and a division in a ratio ("1.5:1").
 * - A pressure is a gauge pressure; "psia" is refused.
 * - Impossible values (below absolute zero, a negative length) are refused. Whether a value is *likely* is for the
 *   caller to judge.
 *
 * Never throws on any text, and never yields NaN or infinity.
 *
 * @throws RangeError when `defaultUnit` is no unit of `quantity`: a mistake in the program
 * @example
 * parseQuantity('120 psi', { quantity: 'pressure', defaultUnit: 'kPa' })
 * // { ok: true, si: 827370.87518..., value: 120, unit: 'psi', asTyped: '120 psi' }
 * @example
 * parseQuantity('5/8', { quantity: 'length', defaultUnit: 'in' })
 * // { ok: true, si: 0.015875, value: 0.625, unit: 'in', asTyped: '5/8' }
 * @example
 * parseQuantity('12 furlongs', { quantity: 'length', defaultUnit: 'mm' })
 * // { ok: false, message: "'12 furlongs' is not a length that we know. Try 16 mm or 5/8 in." }
 */
export function parseQuantity<Q extends Quantity>(text: string, options: ParseOptions<Q>): ParsedQuantity<Q> | RefusedQuantity {
  const { quantity, defaultUnit } = options;
  unitDefinition(quantity, defaultUnit);

  const asTyped = text.trim();
  if (asTyped === '') return refuseEmpty(quantity);
  if (asTyped.length > LONGEST) return refuseUnknown(asTyped, quantity);

  const [, sign = '', body = ''] = /^([+-]?) ?(.*)$/.exec(tidy(asTyped)) ?? [];
  const term = readColon(body, asTyped, options) ?? readTerms(body, asTyped, options);
  if (!term.ok) return term;

  const value = sign === '-' && term.value !== 0 ? -term.value : term.value;
  const si = toSi(value, quantity, term.unit);
  return findImpossible(value, si, asTyped, quantity) ?? { ok: true, si, value, unit: term.unit, asTyped };
}

/** One kind of blank, of minus and of fraction bar; "1½" as "1 1/2". */
function tidy(text: string): string {
  return text
    .replace(/[¼-¾⅐-⅞]/g, (fraction) => ` ${fraction.normalize('NFKC')}`)
    .replace(/[⁄∕]/g, '/')
    .replace(/[−–‐‑﹣]/g, '-')
    .replace(/\s+/g, ' ')
    .trim();
}

/** One number with its unit, or several where the quantity allows it. */
function readTerms<Q extends Quantity>(body: string, asTyped: string, options: ParseOptions<Q>): Term<Q> | RefusedQuantity {
  const { quantity, decimal } = options;
  const { grouped } = QUANTITIES[quantity];
  const unknown = refuseUnknown(asTyped, quantity);
  let sum: Term<Q> | undefined;
  let text = body;
  do {
    const number = readNumber(text, { grouped, decimal });
    if (!number.ok) return number.message === undefined ? unknown : refuse(number.message);
    const written = unitAtStart(number.rest, quantity);
    text = number.rest.slice(written.length).trimStart();

    const spelt = unitSpelt(quantity, written);
    const bare = isBlankUnit(written);
    if (spelt === undefined && !bare) return refuseUnit(written, asTyped, quantity);
    // Strung together, each needs its unit: the second number of "5 ft 6" could be anything.
    if (bare && (sum !== undefined || text !== '')) return unknown;

    const unit = bare || spelt === undefined ? unitOfBareNumber(number.fraction, options) : spelt;
    const term: Term<Q> = { ok: true, value: number.value, unit };
    sum = sum === undefined ? term : add(sum, term, quantity);
    if (sum === undefined) return unknown;
  } while (text !== '');
  return sum;
}

/** All of a text that can be a unit: up to the next number where "5 ft 6 in" may be written, else the whole. */
function unitAtStart(text: string, quantity: Quantity): string {
  const strung = QUANTITIES[quantity].compound === true && otherQuantitySpelt(quantity, text) === undefined;
  return strung ? (/^[^\d]*/.exec(text)?.[0] ?? '') : text;
}

function unitOfBareNumber<Q extends Quantity>(fraction: boolean, { quantity, defaultUnit }: ParseOptions<Q>): UnitOf<Q> {
  const { fractionUnit } = QUANTITIES[quantity];
  return fraction && fractionUnit !== undefined && isUnitOf(quantity, fractionUnit) ? fractionUnit : defaultUnit;
}

/** 1 min and 30 s is 90 s: the larger unit first, and less than a whole one of it after. */
function add<Q extends Quantity>(large: Term<Q>, small: Term<Q>, quantity: Q): Term<Q> | undefined {
  const inSmall = (value: number) => fromSi(toSi(value, quantity, large.unit), quantity, small.unit);
  if (inSmall(1) <= 1 || small.value >= inSmall(1)) return undefined;
  return { ...small, value: inSmall(large.value) + small.value };
}

function findImpossible(value: number, si: number, asTyped: string, quantity: Quantity): RefusedQuantity | undefined {
  const { min, max, whole } = QUANTITIES[quantity];
  if (!(Math.abs(value) <= LARGEST)) return refuse(`${quoted(asTyped)} is too large to be a reading.`);
  if (min && si < min.si) return refuse(min.message);
  if (max && si > max.si) return refuse(max.message);
  if (whole && !Number.isInteger(value)) return refuse(`${quoted(asTyped)} is not a whole number.`);
  return undefined;
}
