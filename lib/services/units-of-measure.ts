import { invalid, type FieldErrors } from '@/lib/errors';
import { measureUnit, type MeasureField } from '@/lib/schemas/measures';
import { formatQuantity, METRIC_UNITS, parseQuantity, unitDefinition, US_UNITS, type DecimalMark, type ParsedQuantity, type Quantity, type UnitPreferences } from '@/lib/units';

/** Countries of the point; elsewhere "4,500" is asked back, because guessing would be wrong by a factor of a thousand. */
const POINT = new Set(['US', 'CA', 'GB', 'IE', 'AU', 'NZ', 'IN', 'JP', 'MX']);

/** The decimal mark that is meant in a country, where there is no doubt about it. */
export const decimalMarkOf = (country: string): DecimalMark | undefined => (POINT.has(country) ? '.' : undefined);

/** What somebody reads and writes in a country until he or she sets something else. */
export const unitsOfCountry = (country: string): UnitPreferences => (country === 'US' ? US_UNITS : METRIC_UNITS);

/** The parts of a context that say how somebody writes and reads measures. */
export interface MeasureHabits {
  organisation: { country: string };
  person: { units: UnitPreferences };
}

/**
 * Understands a measure as typed. Without a unit it is in the one that the person set; it is kept with that unit
 * behind it, because preferences change.
 */
export function readMeasure(
  { organisation, person }: MeasureHabits,
  text: string,
  measure: Pick<MeasureField, 'quantity' | 'like'>,
): { ok: true; si: number; asTyped: string } | { ok: false; message: string } {
  const defaultUnit = measureUnit(person.units, measure);
  const parsed = parseQuantity<Quantity>(text, { quantity: measure.quantity, defaultUnit, decimal: decimalMarkOf(organisation.country) });
  return parsed.ok ? { ok: true, si: parsed.si, asTyped: withUnit(parsed, measure.quantity) } : parsed;
}

/** What was typed, with its unit behind it where it named none. */
export function withUnit({ asTyped, unit }: ParsedQuantity, quantity: Quantity): string {
  const namesUnit = /[^\d\s.,:/+-]/u.test(asTyped);
  const { symbol } = unitDefinition(quantity, unit);
  return namesUnit || symbol === '' ? asTyped : `${asTyped} ${symbol}`;
}

/** What a row keeps of its measures: SI by column, and beside it what was typed. */
type Measured = { [column: string]: unknown } & { asTyped: Record<string, string> };

/**
 * What stands in the field of a measure when a form is opened: as it was typed, less a unit that is printed beside the
 * field anyway; from elsewhere (an import) as it is shown.
 */
export function fieldText(units: UnitPreferences, measure: MeasureField, row: Measured): string {
  const { quantity, column } = measure;
  const si = row[column];
  if (typeof si !== 'number') return '';
  const unit = measureUnit(units, measure);
  const text = row.asTyped[column] ?? formatQuantity<Quantity>(si, { quantity, unit });
  const [, figure = '', typedUnit = ''] = /^([\d\s.,:/+-]*?)\s*([\p{L}°%]\D*\d?)$/u.exec(text) ?? [];
  // However its letters were spelt: "in3" beside the field's own "in³" would be the same unit twice.
  const parsed = figure !== '' && typedUnit !== '' && parseQuantity<Quantity>(`1 ${typedUnit}`, { quantity, defaultUnit: unit });
  return parsed && parsed.ok && parsed.unit === unit ? figure : text;
}

type Columns<Fields extends readonly MeasureField[]> = { [Column in Fields[number]['column']]: number | null };
type Typed<Fields extends readonly MeasureField[]> = { [Field in Fields[number]['field']]?: string | null };

/**
 * The columns of several measures from what was typed into their fields. A text that is still what the form was
 * opened with keeps its value to the last digit.
 *
 * @param before the row that is being changed
 * @throws AppError "invalid" with a message beside each field that can't be read
 */
export function readMeasures<const Fields extends readonly MeasureField[]>(
  habits: MeasureHabits,
  fields: Fields,
  typed: Typed<Fields>,
  before?: Measured,
): { columns: Columns<Fields>; asTyped: Record<string, string> } {
  const columns: Record<string, number | null> = {};
  const asTyped: Record<string, string> = {};
  const problems: FieldErrors = {};
  for (const measure of fields) {
    const { field, column } = measure;
    const text = (typed as Record<string, string | null | undefined>)[field];
    columns[column] = null;
    if (!text) continue;
    const kept = before?.[column];
    if (before && typeof kept === 'number' && text === fieldText(habits.person.units, measure, before)) {
      columns[column] = kept;
      if (before.asTyped[column] !== undefined) asTyped[column] = before.asTyped[column];
      continue;
    }
    const read = readMeasure(habits, text, measure);
    if (read.ok) {
      columns[column] = read.si;
      asTyped[column] = read.asTyped;
    } else problems[field] = read.message;
  }
  if (Object.keys(problems).length > 0) throw invalid(problems);
  return { columns: columns as Columns<Fields>, asTyped };
}
