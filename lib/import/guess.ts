import { QUANTITIES, unitDefinition, unitsOf, type Quantity, type UnitId } from '@/lib/units';
import { FIELDS, type Field, type ImportKind } from './fields';

/** Letters and digits alone: "Unit-No." and "unit no" are one name. */
export const plainName = (text: string): string => text.normalize('NFKD').toLowerCase().replace(/[^\p{L}\p{N}]/gu, '');

/** "Odometer (km)", "Mileage [mi]", "odometer_km": a name, and a unit behind it. */
const WITH_UNIT = /^(.*?)[\s_]*[([]([^)\]]+)[)\]]\s*$/;
const UNIT_LAST = /^(.*?)[\s_,-]+([\p{L}°³0-9/]{1,12})$/u;

export interface GuessedColumn {
  /** A field's id; undefined: the column is left out. */
  field?: string;
  /** What its head says that it is in. */
  unit?: UnitId;
}

/**
 * What the columns of a file are, by their heads: each field once, the likeliest column for it. A person has the last word.
 *
 * @example guessColumns('units', ['Truck no.', 'Odometer (km)', 'Colour'])
 * // [{ field: 'fleetNumber' }, { field: 'odometer', unit: 'km' }, {}]
 */
export function guessColumns(kind: ImportKind, header: readonly string[]): GuessedColumn[] {
  const taken = new Map<string, { column: number; score: number }>();
  header.forEach((head, column) => {
    const best = FIELDS[kind].map((field) => ({ field, score: likeness(field, head) })).reduce((a, b) => (b.score > a.score ? b : a));
    if (best.score === 0) return;
    const before = taken.get(best.field.id);
    if (!before || best.score > before.score) taken.set(best.field.id, { column, score: best.score });
  });
  const fieldAt = new Map([...taken].map(([field, { column }]) => [column, field]));
  return header.map((head, column) => {
    const field = FIELDS[kind].find(({ id }) => id === fieldAt.get(column));
    if (!field) return {};
    const unit = field.kind === 'measure' ? unitInHead(head, field.measure.quantity) : undefined;
    return { field: field.id, ...(unit && { unit }) };
  });
}

/** 0: nothing of it. The name itself counts more than the name with something behind it. */
function likeness(field: Field, head: string): number {
  const names = new Set([plainName(field.id), plainName(field.label), ...(field.called ?? [])]);
  const whole = plainName(head);
  if (whole === '') return 0;
  if (names.has(whole)) return 3;
  const bare = [WITH_UNIT, UNIT_LAST].map((pattern) => plainName(pattern.exec(head.trim())?.[1] ?? ''));
  if (bare.some((name) => name !== '' && names.has(name))) return 2;
  return 0;
}

/** The unit that a head names, if it is one of the quantity's. */
export function unitInHead<Q extends Quantity>(head: string, quantity: Q): UnitId | undefined {
  const written = [WITH_UNIT, UNIT_LAST].map((pattern) => pattern.exec(head.trim())?.[2]).concat(head);
  for (const text of written) {
    const name = text === undefined ? '' : plainName(text);
    const found = name !== '' && unitsOf(quantity).find((id) => spellings(quantity, id).has(name));
    if (found) return found;
  }
  return undefined;
}

function spellings(quantity: Quantity, id: UnitId): ReadonlySet<string> {
  const { symbol, name, spellings: others } = unitDefinition<Quantity>(quantity, id);
  return new Set([id, symbol, name, ...others, ...(id in QUANTITIES[quantity].units ? [`${name}s`] : [])].map(plainName).filter((text) => text !== ''));
}
