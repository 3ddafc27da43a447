import { type CsvError, parse, type Info } from 'csv-parse';
import { saidDelimiter, type Delimiter } from './delimiter';
import type { Encoding } from './encoding';

/** A row as it stood in the file, or what kept it from being read. */
export interface TableRow {
  /** Where it ends in the file, from 1, as a text editor counts. */
  line: number;
  cells: string[];
  /** The file broke off here, or can't be read on. */
  broken?: string;
}

/** A cell or row longer than that is a quote that is never closed. */
const MOST_CHARACTERS = 100_000;

const CUT = 'The file breaks off here: this line has fewer columns than the first, and no end.';
const OPEN = 'A quotation mark opens here and is never closed; the file may be cut off.';
const UNREADABLE = 'The file can’t be read on from here.';

/**
 * Reads a file row by row as it streams in, the head included, without empty rows. What it can't read it says, as its last
 * row. Cut off in the middle of a character it ends in one that can't be read (U+FFFD).
 *
 * @param bytes of the file in pieces, wherever they are cut
 */
export async function* readTable(bytes: AsyncIterable<Uint8Array>, { encoding, delimiter }: { encoding: Encoding; delimiter: Delimiter }): AsyncGenerator<TableRow> {
  const parser = parse({ delimiter, bom: true, info: true, relax_column_count: true, relax_quotes: true, skip_empty_lines: true, max_record_size: MOST_CHARACTERS });
  const waiting: TableRow[] = [];
  let broken: CsvError | undefined;
  let lastLine = 0;
  let doubled = 0;
  // Taken one piece at a time, so that no more than a piece is held.
  parser.on('readable', () => {
    for (let next: unknown = parser.read(); next !== null; next = parser.read()) {
      const { record, info } = next as { record: string[]; info: Info };
      // csv-parse counts a break of two characters between quotes as two lines.
      doubled += record.reduce((count, cell) => count + cell.split('\r\n').length - 1, 0);
      lastLine = info.lines - doubled;
      waiting.push({ line: lastLine, cells: record });
    }
  });
  const failed = new Promise<void>((resolve) => parser.once('error', (error: CsvError) => { broken = error; resolve(); }));
  const ended = new Promise<void>((resolve) => parser.once('end', resolve));

  const texts = textOf(bytes, encoding);
  let width: number | undefined;
  let held: TableRow | undefined;
  let endsLine = true;
  let skipped = 0;
  for await (const { text, said } of texts) {
    if (broken) break;
    if (said) skipped = 1;
    if (text === '') continue;
    endsLine = /[\r\n]$/.test(text);
    await Promise.race([new Promise<void>((resolve) => parser.write(text, () => resolve())), failed]);
    yield* taken();
  }
  if (!broken) {
    parser.end();
    await Promise.race([ended, failed]);
  }
  yield* taken();
  if (held) yield { ...held, ...(!broken && !endsLine && width !== undefined && held.cells.length < width && { broken: CUT }) };
  if (broken) yield { line: lastLine + skipped + 1, cells: [], broken: broken.code === 'CSV_QUOTE_NOT_CLOSED' || broken.code === 'CSV_MAX_RECORD_SIZE' ? OPEN : UNREADABLE };

  /** All but the last one, of which it isn't known yet whether the file ends in it. */
  function* taken(): Generator<TableRow> {
    for (const row of waiting.splice(0)) {
      width ??= row.cells.length;
      const before = held;
      held = { ...row, line: row.line + skipped };
      if (before && before.cells.some((cell) => cell.trim() !== '')) yield before;
    }
  }
}

/** The text of the file in pieces, without a first line that says what parts the columns. */
async function* textOf(bytes: AsyncIterable<Uint8Array>, encoding: Encoding): AsyncGenerator<{ text: string; said: boolean }> {
  const decoder = new TextDecoder(encoding);
  let beginning: string | undefined = '';
  for await (const piece of bytes) {
    const text: string = decoder.decode(piece, { stream: true });
    if (beginning === undefined) {
      yield { text, said: false };
      continue;
    }
    beginning += text;
    if (beginning.length < 16) continue;
    yield cleared(beginning);
    beginning = undefined;
  }
  const rest = decoder.decode();
  yield beginning === undefined ? { text: rest, said: false } : cleared(beginning + rest);
}

const cleared = (text: string) => (saidDelimiter(text) ? { text: text.slice(text.indexOf('\n') + 1), said: true } : { text, said: false });
