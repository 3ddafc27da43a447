import type { DecimalMark } from '@/lib/units';
import { guessDayOrder, type DayOrder } from './day';
import { guessDecimalMark } from './decimal-mark';
import { sniffDelimiter, type Delimiter } from './delimiter';
import { sniffEncoding, type Encoding } from './encoding';
import { FIELDS, type ImportKind } from './fields';
import { guessColumns } from './guess';
import type { Mapping } from './mapping';
import { readTable } from './read-table';

/** Enough of a file to guess by, and to be shown of it. */
const HEAD_BYTES = 64 * 1024;
const ROWS_SHOWN = 5;
const ROWS_LOOKED_AT = 200;

export interface Looked {
  encoding: Encoding;
  delimiter: Delimiter;
  header: string[];
  /** The first rows. */
  sample: string[][];
}

/**
 * The head and the first rows of a file, by how it seems to be written, or as somebody said that it is.
 *
 * @param bytes the file
 */
export async function lookAt(bytes: Uint8Array, said: Partial<Pick<Looked, 'encoding' | 'delimiter'>> = {}): Promise<Looked & { rows: string[][] }> {
  const head = bytes.subarray(0, HEAD_BYTES);
  const encoding = said.encoding ?? sniffEncoding(bytes);
  const delimiter = said.delimiter ?? sniffDelimiter(new TextDecoder(encoding).decode(head, { stream: true }));
  const rows: string[][] = [];
  for await (const { cells } of readTable(inOnePiece(head), { encoding, delimiter })) {
    if (cells.length > 0) rows.push(cells);
    if (rows.length > ROWS_LOOKED_AT) break;
  }
  const [header = [], ...rest] = rows;
  // The last one may be cut off, unless the file ends there.
  const whole = head.length < bytes.length && rest.length > 1 ? rest.slice(0, -1) : rest;
  return { encoding, delimiter, header: header.map((text) => text.trim()), sample: whole.slice(0, ROWS_SHOWN), rows: whole };
}

async function* inOnePiece(bytes: Uint8Array): AsyncGenerator<Uint8Array> {
  yield bytes;
}

/** A guess at how a file is to be read, for a person to put right. */
export function guessMapping(kind: ImportKind, { encoding, delimiter, header, rows }: Looked & { rows: string[][] }, otherwise: { decimal: DecimalMark; dayOrder: DayOrder }): Mapping {
  const columns = guessColumns(kind, header);
  const textsOf = (wanted: 'day' | 'measure') =>
    columns.flatMap(({ field }, place) => (FIELDS[kind].find(({ id }) => id === field)?.kind === wanted ? rows.map((row) => row[place] ?? '') : []));
  return {
    encoding,
    delimiter,
    decimal: guessDecimalMark(textsOf('measure'), delimiter === ';' ? ',' : otherwise.decimal),
    dayOrder: guessDayOrder(textsOf('day'), otherwise.dayOrder),
    columns: columns.map(({ field }) => field ?? ''),
    units: Object.fromEntries(columns.flatMap(({ field, unit }) => (field && unit ? [[field, unit]] : []))),
    fixed: {},
  };
}
