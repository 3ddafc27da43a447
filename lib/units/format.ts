import { fromSi } from './convert';
import type { DecimalMark } from './number';
import { QUANTITIES, unitDefinition, type Quantity, type UnitOf } from './quantities';

export interface FormatOptions<Q extends Quantity = Quantity> {
  readonly quantity: Q;
  /** The unit to show, as `unitFor` gives it. */
  readonly unit: UnitOf<Q>;
  /** Exactly so many decimals. */
  readonly digits?: number;
  /** So many significant figures; used when `digits` is not given. */
  readonly significant?: number;
  /** The person's decimal mark; a point when nothing is said. */
  readonly decimal?: DecimalMark;
}

/** Figures that are shown at least, however few decimals the unit has: 1.38 kPa, not 1 kPa. */
const LEAST_FIGURES = 3;

/** Decimals past this are binary noise of the conversion. */
const MOST_DECIMALS = 12;

/** Past this, `toFixed` no longer writes plain digits that mean anything. */
const LARGEST = 1e15;

const NO_BREAK_SPACE = '\u00a0';

/**
 * Shows an SI value in a unit: number, blank, symbol.
 *
 * Without `digits` or `significant` it shows the decimals usual for the unit, or three significant figures where that is
 * more, and drops zeros at the end. Thousands are grouped where they are usual (distances, hours, rpm): by commas, or
 * by no-break spaces when the decimal mark is a comma. What is shown can be typed again: `parseQuantity` of it, with the
 * same decimal mark, gives a value that is shown the same.
 *
 * @param si the value in the quantity's SI unit
 * @throws RangeError when `si` is not finite or past 1e15 in the unit, or the quantity has no such unit
 * @example
 * formatQuantity(827_370.875, { quantity: 'pressure', unit: 'psi' })            // '120 psi'
 * formatQuantity(827_370.875, { quantity: 'pressure', unit: 'bar' })            // '8.27 bar'
 * formatQuantity(0.015875, { quantity: 'length', unit: 'mm', digits: 1 })       // '15.9 mm'
 * formatQuantity(659_831_040, { quantity: 'distance', unit: 'mi' })             // '410,000 mi'
 */
export function formatQuantity<Q extends Quantity>(si: number, options: FormatOptions<Q>): string {
  const { symbol } = unitDefinition(options.quantity, options.unit);
  const value = formatValue(si, options);
  return symbol === '' ? value : `${value} ${symbol}`;
}

/**
 * As `formatQuantity`, the number alone: for a table whose head names the unit, or a field with the unit beside it.
 *
 * @throws RangeError as `formatQuantity`
 * @example
 * formatValue(827_370.875, { quantity: 'pressure', unit: 'bar', decimal: ',' }) // '8,27'
 */
export function formatValue<Q extends Quantity>(si: number, options: FormatOptions<Q>): string {
  const { quantity, unit, digits, significant, decimal = '.' } = options;
  const value = fromSi(si, quantity, unit);
  if (!(Math.abs(value) < LARGEST)) throw new RangeError(`${si} is no ${quantity} that can be shown`);

  const plain = digits === undefined ? dropZeros(toFigures(value, unitDefinition(quantity, unit).digits, significant)) : toDecimals(value, digits);
  const [whole = '', decimals] = plain.split('.');
  const shownWhole = QUANTITIES[quantity].grouped ? group(whole, decimal === '.' ? ',' : NO_BREAK_SPACE) : whole;
  return decimals === undefined ? shownWhole : `${shownWhole}${decimal}${decimals}`;
}

/** The unit's decimals or three figures, whichever shows more; or exactly the figures asked for. */
function toFigures(value: number, unitDigits: number, significant?: number): string {
  const figures = significant ?? LEAST_FIGURES;
  // The exponent after rounding: 9.996 to three figures is 10.0 and needs one decimal, not two.
  const exponent = Number(value.toExponential(figures - 1).split('e')[1]);
  const decimals = Math.max(0, figures - 1 - exponent);
  if (significant !== undefined) return toDecimals(Number(value.toPrecision(significant)), decimals);
  return toDecimals(value, Math.max(unitDigits, decimals));
}

function toDecimals(value: number, decimals: number): string {
  const fixed = value.toFixed(Math.min(decimals, MOST_DECIMALS));
  return Number(fixed) === 0 ? fixed.replace('-', '') : fixed;
}

function dropZeros(plain: string): string {
  return plain.includes('.') ? plain.replace(/\.?0+$/, '') : plain;
}

function group(whole: string, mark: string): string {
  return whole.replace(/\B(?=(\d{3})+$)/g, mark);
}
