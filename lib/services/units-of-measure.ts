import { invalid } from '@/lib/errors';
import { parseQuantity, unitDefinition, type DecimalMark, type ParsedQuantity, type Quantity, type UnitOf, type UnitPreferences } from '@/lib/units';

/** Countries of the point; elsewhere "4,500" is asked back, because guessing would be wrong by a factor of a thousand. */
const POINT = new Set(['US', 'CA', 'GB', 'IE', 'AU', 'NZ', 'IN', 'JP', 'MX']);

/** The decimal mark that is meant in a country, where there is no doubt about it. */
export const decimalMarkOf = (country: string): DecimalMark | undefined => (POINT.has(country) ? '.' : undefined);

/** The parts of a context that say how somebody writes and reads measures. */
export interface MeasureHabits {
  organisation: { country: string };
  person: { units: UnitPreferences };
}

export interface Measure {
  si: number;
  /** As it was typed; the unit stands behind it even where it was left out, because preferences change. */
  asTyped: string;
}

/**
 * Understands a measure typed into the field `field`. Without a unit it is in the one that the person set.
 *
 * @throws AppError "invalid" with the message beside the field
 */
export function readMeasure<Q extends Quantity>(
  { organisation, person }: MeasureHabits,
  { text, field, quantity, unit }: { text: string; field: string; quantity: Q; unit?: UnitOf<Q> },
): Measure {
  const parsed = parseQuantity(text, { quantity, defaultUnit: unit ?? person.units[quantity], decimal: decimalMarkOf(organisation.country) });
  if (!parsed.ok) throw invalid({ [field]: parsed.message });
  return { si: parsed.si, asTyped: withUnit(parsed, quantity) };
}

function withUnit<Q extends Quantity>({ asTyped, unit }: ParsedQuantity<Q>, quantity: Q): string {
  const namesUnit = /[^\d\s.,:/+-]/u.test(asTyped);
  const { symbol } = unitDefinition(quantity, unit);
  return namesUnit || symbol === '' ? asTyped : `${asTyped} ${symbol}`;
}
