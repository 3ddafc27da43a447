import { formatQuantity, unitFor, type Quantity, type UnitId, type UnitOf, type UnitPreferences } from '@/lib/units';

/** What was given, and what would have been allowed, in the quantity's SI unit. */
export interface Bounds {
  readonly least?: number;
  readonly most?: number;
}

interface Given extends Bounds {
  /** The name of the input: a parameter of a function, or the id of an input of a sum. */
  readonly field: string;
  readonly given: number;
  readonly quantity: Quantity;
}

/**
 * An input for which the formula says nothing that could be trusted. The one error of this library: the edge makes a
 * sentence of it with `outOfRangeSentence`, in the person's units.
 */
export class OutOfRange extends RangeError implements Given {
  readonly field: string;
  readonly given: number;
  readonly quantity: Quantity;
  readonly least: number | undefined;
  readonly most: number | undefined;

  constructor({ field, given, quantity, least, most }: Given) {
    super(`${field} is ${given}; allowed from ${least ?? 'anything'} to ${most ?? 'anything'} (SI)`);
    this.name = 'OutOfRange';
    this.field = field;
    this.given = given;
    this.quantity = quantity;
    this.least = least;
    this.most = most;
  }
}

/**
 * Throws unless a number is finite and within its bounds.
 *
 * @throws OutOfRange
 * @example requireWithin('speedHz', 'rotationalSpeed', 16.7, { least: 0, most: 100 })
 */
export function requireWithin(field: string, quantity: Quantity, given: number, { least, most }: Bounds): void {
  // Written so that NaN is refused too.
  const fits = given >= (least ?? -Infinity) && given <= (most ?? Infinity) && Number.isFinite(given);
  if (!fits) throw new OutOfRange({ field, given, quantity, least, most });
}

/** The least that can be told from nothing, where nothing itself would divide by zero. */
export const ABOVE_ZERO = Number.MIN_VALUE;

/** Throws unless a number is finite and greater than zero. */
export function requirePositive(field: string, quantity: Quantity, given: number): void {
  requireWithin(field, quantity, given, { least: ABOVE_ZERO });
}

/** Throws unless a number is finite and not less than zero. */
export function requireNotNegative(field: string, quantity: Quantity, given: number): void {
  requireWithin(field, quantity, given, { least: 0 });
}

/**
 * The sentence to put beside the field, in the person's units.
 *
 * @param label what the field is called on the page, such as "Bore left in the line"
 * @param like the unit that the field is written in
 * @example
 * outOfRangeSentence(error, { label: 'Discharge pressure', units: US_UNITS })
 * // 'Discharge pressure must be from 0 psi to 300 psi.'
 */
export function outOfRangeSentence(error: OutOfRange, { label, units, like }: { label: string; units: UnitPreferences; like?: UnitId }): string {
  const { quantity, given, least, most } = error;
  if (!Number.isFinite(given)) return `${label} must be a number.`;
  const unit = unitFor<Quantity>(units, quantity, like as UnitOf<Quantity> | undefined);
  const show = (si: number) => formatQuantity(si, { quantity, unit });
  if (least === ABOVE_ZERO) return most === undefined ? `${label} must be more than zero.` : `${label} must be more than zero and at most ${show(most)}.`;
  if (least !== undefined && most !== undefined) return `${label} must be from ${show(least)} to ${show(most)}.`;
  if (least !== undefined) return least === 0 ? `${label} cannot be less than zero.` : `${label} must be at least ${show(least)}.`;
  if (most !== undefined) return `${label} must be at most ${show(most)}.`;
  return `${label} is not a value that this sum can use.`;
}
