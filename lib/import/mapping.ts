import type { DecimalMark, UnitId } from '@/lib/units';
import type { DayOrder } from './day';
import type { Delimiter } from './delimiter';
import type { Encoding } from './encoding';

/** How a file is read: what a person was shown, and said yes to. */
export interface Mapping {
  encoding: Encoding;
  delimiter: Delimiter;
  decimal: DecimalMark;
  dayOrder: DayOrder;
  /** The field of each column, by its place; '' leaves it out. */
  columns: readonly string[];
  /** The unit of the figures of a measure that name none, by field. */
  units: Readonly<Record<string, UnitId>>;
  /** One value for every row, by field: as it is stored. */
  fixed: Readonly<Record<string, string>>;
}

/** A value of a row as it will be stored; a measure in SI with what stood in the cell. */
export type Value = string | number | readonly string[] | { readonly si: number; readonly asTyped: string };

/** A row, understood: by field, and only what it says. */
export type ImportRecord = Readonly<Record<string, Value>>;

/** What is wrong with a row. */
export interface RowProblem {
  /** The head of its column; '' when it is of the row as a whole. */
  column: string;
  /** What stood there. */
  text: string;
  /** What is wrong with it. */
  message: string;
  /** What would do. */
  accepts: string;
}

export type ReadRow = { ok: true; record: ImportRecord } | { ok: false; problems: RowProblem[] };

export interface Choice {
  value: string;
  label: string;
}
