import { describe, expect, test } from 'vitest';
import { readTable, sniffDelimiter, sniffEncoding, type Encoding, type TableRow } from '@/lib/import';

async function* inPieces(bytes: Uint8Array, size: number) {
  for (let at = 0; at < bytes.length; at += size) yield await Promise.resolve(bytes.subarray(at, at + size));
}

async function rowsOf(bytes: Uint8Array, { encoding = 'utf-8', delimiter = ';', size = 7 }: { encoding?: Encoding; delimiter?: ';' | ',' | '\t'; size?: number } = {}): Promise<TableRow[]> {
  const rows: TableRow[] = [];
  for await (const row of readTable(inPieces(bytes, size), { encoding, delimiter })) rows.push(row);
  return rows;
}

const utf8 = (text: string) => new TextEncoder().encode(text);
const utf16 = (text: string) => Buffer.from(`\ufeff${text}`, 'utf16le');
const TEXT = 'Unit;Größe\r\nT-1;12,5 €\r\n"T;2";"with\r\na break"\r\n\r\nT-3;\r\n';
const ROWS = [
  { line: 1, cells: ['Unit', 'Größe'] },
  { line: 2, cells: ['T-1', '12,5 €'] },
  { line: 4, cells: ['T;2', 'with\r\na break'] },
  { line: 6, cells: ['T-3', ''] },
];

describe('a file of a spreadsheet', () => {
  test.each<[string, Uint8Array, Encoding]>([
    ['UTF-8', utf8(TEXT), 'utf-8'],
    ['UTF-8 with its mark', utf8(`\ufeff${TEXT}`), 'utf-8'],
    ['UTF-16', utf16(TEXT), 'utf-16le'],
    // In windows-1252 the euro is 0x80, ö 0xf6 and ß 0xdf (Unicode's mapping table CP1252.TXT, from memory).
    ['windows-1252', Buffer.from(TEXT.replace('€', '\x80'), 'latin1'), 'windows-1252'],
  ])('is read the same in %s, wherever its pieces are cut', async (_name, bytes, encoding) => {
    expect(sniffEncoding(bytes)).toBe(encoding);
    for (const size of [1, 3, 7, 1000]) expect(await rowsOf(bytes, { encoding, size })).toEqual(ROWS);
  });

  test('without a mark is UTF-16 by its empty halves', () => {
    expect(sniffEncoding(Buffer.from('Unit;Odometer', 'utf16le'))).toBe('utf-16le');
    expect(sniffEncoding(Buffer.from('Unit;Odometer', 'utf16le').swap16())).toBe('utf-16be');
  });

  test('says itself what parts its columns, in a line that is no row', async () => {
    expect(sniffDelimiter('sep=;\r\nUnit,no;Odometer\r\n')).toBe(';');
    expect(await rowsOf(utf8('sep=;\r\nUnit;km\r\nT-1;5\r\n'))).toEqual([{ line: 2, cells: ['Unit', 'km'] }, { line: 3, cells: ['T-1', '5'] }]);
  });

  test.each([
    ['a,b,c\n1,2,3\n', ','],
    ['a;b\n1,5;2,5\n3,5;4,5\n', ';'],
    ['a\tb\n1, 2\t3\n', '\t'],
    ['a|b\n1|2', '|'],
    ['"a;b;c",d\n"e;f;g",h\n', ','],
    ['alone\nrow\n', ','],
  ])('%j is parted by %j', (text, delimiter) => expect(sniffDelimiter(text)).toBe(delimiter));

  test('cut off in the middle of a row says so', async () => {
    const rows = await rowsOf(utf8('a;b;c\n1;2;3\n4;5'));
    expect(rows.at(-1)).toEqual({ line: 3, cells: ['4', '5'], broken: expect.stringContaining('breaks off') });
    // A short row in the middle is how some spreadsheets write empty cells.
    expect(await rowsOf(utf8('a;b;c\n1;2\n4;5;6\n'))).toEqual([{ line: 1, cells: ['a', 'b', 'c'] }, { line: 2, cells: ['1', '2'] }, { line: 3, cells: ['4', '5', '6'] }]);
  });

  test('cut off in the middle of a character ends in one that can’t be read', async () => {
    const whole = utf8('a;b\nT-1;Größe');
    const cut = whole.subarray(0, whole.indexOf(0xc3) + 1);
    expect((await rowsOf(cut)).at(-1)?.cells[1]).toBe('Gr\ufffd');
    expect(sniffEncoding(cut)).toBe('utf-8');
  });

  test('cut off between quotes gives the rows before it', async () => {
    const rows = await rowsOf(utf8('a;b\n1;2\n3;"4\n5;6\n7;8'), { size: 1000 });
    expect(rows.slice(0, 2)).toEqual([{ line: 1, cells: ['a', 'b'] }, { line: 2, cells: ['1', '2'] }]);
    expect(rows.at(-1)).toEqual({ line: 3, cells: [], broken: expect.stringContaining('never closed') });
  });

  test('of a hundred thousand rows is read to the last', async () => {
    const text = `a;b\n${Array.from({ length: 100_000 }, (_, i) => `T-${i};${i}`).join('\n')}\n`;
    let count = 0;
    let last: TableRow | undefined;
    for await (const row of readTable(inPieces(utf8(text), 65_536), { encoding: 'utf-8', delimiter: ';' })) {
      count += 1;
      last = row;
    }
    expect([count, last]).toEqual([100_001, { line: 100_001, cells: ['T-99999', '99999'] }]);
  });

  test('that is empty has no rows', async () => expect(await rowsOf(utf8(''))).toEqual([]));
});
