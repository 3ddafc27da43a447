import { termOptions } from '@/lib/schemas/terms';
import { parseQuantity, QUANTITIES, unitDefinition, unitFor, US_UNITS, type Quantity, type UnitId } from '@/lib/units';
import { readDay } from './day';
import { FIELDS, type ChoiceList, type Field, type ImportKind, type MeasureOf } from './fields';
import { plainName } from './guess';
import type { Choice, ImportRecord, Mapping, ReadRow, RowProblem, Value } from './mapping';
import { wholeProblems } from './whole-row';

export interface RowSettings {
  kind: ImportKind;
  mapping: Mapping;
  header: readonly string[];
  /** The organisation's own sites, causes and complaints. */
  choices: Readonly<Record<ChoiceList, readonly Choice[]>>;
  /** Of the word for a cause that no rulebook lists. */
  somethingElse: string;
  /** No day may be after it. */
  today: string;
}

type Read = { ok: true; value: Value } | { ok: false; message: string; accepts: string };

/** Before it nobody kept such records here. */
const EARLIEST = '1950-01-01';
/** A longer list of what would do helps nobody. */
const MOST_NAMED = 12;
const CONTROL = /[\p{Cc}]/gu;

/**
 * Reads one row by what its columns were said to be: a record, or everything that is wrong with it.
 *
 * @param cells as they stood in the file
 * @example readRow(['T-1', '410.000'], settings) // { ok: true, record: { fleetNumber: 'T-1', odometer: { si: 410000000, asTyped: '410.000 km' } } }
 */
export function readRow(cells: readonly string[], settings: RowSettings): ReadRow {
  const { kind, mapping, header } = settings;
  const record: Record<string, Value> = {};
  const problems: RowProblem[] = [];
  for (const field of FIELDS[kind]) {
    const place = mapping.columns.indexOf(field.id);
    const column = place < 0 ? field.label : (header[place] ?? field.label);
    const cell = place < 0 ? '' : (cells[place] ?? '').replace(CONTROL, ' ').trim();
    if (cell.includes('\ufffd')) {
      problems.push({ column, text: cell, message: 'There is a character in it that could not be read.', accepts: 'Choose another encoding, or save the file as UTF-8 and upload it whole.' });
      continue;
    }
    if (cell === '') {
      const fixed = mapping.fixed[field.id];
      if (fixed) record[field.id] = field.kind === 'choices' ? [fixed] : fixed;
      else if (field.needed) problems.push({ column, text: '', message: `${field.label} is missing.`, accepts: accepted(field, settings) });
      continue;
    }
    const read = readCell(cell, field, settings);
    if (read.ok) record[field.id] = read.value;
    else problems.push({ column, text: cell, message: read.message, accepts: read.accepts });
  }
  if (problems.length === 0) problems.push(...wholeProblems(kind, record, settings));
  return problems.length > 0 ? { ok: false, problems } : { ok: true, record: record satisfies ImportRecord };
}

function readCell(cell: string, field: Field, settings: RowSettings): Read {
  const refuse = (message: string): Read => ({ ok: false, message, accepts: accepted(field, settings) });
  switch (field.kind) {
    case 'text':
      return cell.length <= field.most ? { ok: true, value: cell } : refuse('That is too long.');
    case 'country':
      return /^[A-Za-z]{2}$/.test(cell) ? { ok: true, value: cell.toUpperCase() } : refuse('This is no country.');
    case 'count':
      return /^\d{1,6}$/.test(cell) && Number(cell) >= 1 && Number(cell) <= field.most ? { ok: true, value: Number(cell) } : refuse('This is no such number.');
    case 'day': {
      const day = readDay(cell, settings.mapping.dayOrder);
      if (!day) return refuse('This is no day that can be read.');
      if (day < EARLIEST) return refuse('That is too long ago.');
      return day > settings.today ? refuse('This day is yet to come.') : { ok: true, value: day };
    }
    case 'term':
      return chosen(cell, termOptions(field.list), refuse);
    case 'choice':
      return chosen(cell, settings.choices[field.list], refuse);
    case 'choices':
      return several(cell, settings.choices[field.list], refuse);
    case 'measure':
      return measured(cell, field, settings);
  }
}

/** Words for yes and no, and for what became of a part. */
const ALSO: Readonly<Record<string, string>> = { y: 'yes', true: 'yes', '1': 'yes', x: 'yes', n: 'no', false: 'no', '0': 'no', reman: 'rebuilt', remanufactured: 'rebuilt', replaced: 'changed', reused: 'kept', lorry: 'truck', coach: 'bus' };

const find = (cell: string, choices: readonly Choice[]): string | undefined => {
  const name = plainName(cell);
  const also = ALSO[name];
  return choices.find(({ value, label }) => value === cell || plainName(value) === name || plainName(label) === name || value === also)?.value;
};

function chosen(cell: string, choices: readonly Choice[], refuse: (message: string) => Read): Read {
  const value = find(cell, choices);
  return value === undefined ? refuse('This is none of the list.') : { ok: true, value };
}

/** Several in one cell, parted by a mark that isn't the file's own. */
function several(cell: string, choices: readonly Choice[], refuse: (message: string) => Read): Read {
  const whole = find(cell, choices);
  if (whole !== undefined) return { ok: true, value: [whole] };
  const values = cell.split(/[;|/,+]/).map((one) => one.trim()).filter((one) => one !== '').map((one) => ({ one, value: find(one, choices) }));
  const unknown = values.find(({ value }) => value === undefined);
  if (unknown) return refuse(values.length > 1 ? `“${unknown.one}” is none of the list.` : 'This is none of the list.');
  return { ok: true, value: [...new Set(values.map(({ value }) => value ?? ''))] };
}

/** The unit of a figure that names none. */
export const unitForField = ({ measure }: MeasureOf, mapping: Pick<Mapping, 'units'>): UnitId =>
  mapping.units[measure.field] ?? unitFor<Quantity>(US_UNITS, measure.quantity, measure.like);

function measured(cell: string, field: MeasureOf, { mapping }: RowSettings): Read {
  const { quantity } = field.measure;
  const unit = unitForField(field, mapping);
  const parsed = parseQuantity<Quantity>(cell, { quantity, defaultUnit: unit, decimal: mapping.decimal });
  if (!parsed.ok) return { ok: false, message: parsed.message, accepts: acceptedMeasure(field, unit) };
  const { symbol } = unitDefinition<Quantity>(quantity, parsed.unit);
  const namesUnit = /[^\d\s.,:/+-]/u.test(parsed.asTyped);
  return { ok: true, value: { si: parsed.si, asTyped: namesUnit || symbol === '' ? parsed.asTyped : `${parsed.asTyped} ${symbol}` } };
}

const acceptedMeasure = ({ measure }: MeasureOf, unit: UnitId) => {
  const { symbol, name } = unitDefinition<Quantity>(measure.quantity, unit);
  const [example] = QUANTITIES[measure.quantity].examples;
  return `A figure${symbol === '' ? '' : ` in ${symbol} (${name})`}, or one with its unit such as ${example}.`;
};

const named = (choices: readonly Choice[]) => `${choices.slice(0, MOST_NAMED).map(({ label }) => label).join('; ')}${choices.length > MOST_NAMED ? `; and ${choices.length - MOST_NAMED} others` : ''}.`;

function accepted(field: Field, settings: RowSettings): string {
  switch (field.kind) {
    case 'text':
      return `Up to ${field.most} characters.`;
    case 'country':
      return 'The two letters of the country, such as US.';
    case 'count':
      return `A whole number from 1 to ${field.most}.`;
    case 'day':
      return `A day from 1950 up to today, such as 2024-12-31 or ${settings.mapping.dayOrder === 'dmy' ? '31.12.2024' : '12/31/2024'}.`;
    case 'term':
      return named(termOptions(field.list));
    case 'choice':
    case 'choices':
      return named(settings.choices[field.list]);
    case 'measure':
      return acceptedMeasure(field, unitForField(field, settings.mapping));
  }
}
