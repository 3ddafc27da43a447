export const DELIMITERS = [';', ',', '\t', '|'] as const;
export type Delimiter = (typeof DELIMITERS)[number];

export const DELIMITER_NAMES: Readonly<Record<Delimiter, string>> = { ';': 'Semicolon', ',': 'Comma', '\t': 'Tab', '|': 'Bar' };

const isDelimiter = (text: string | undefined): text is Delimiter => (DELIMITERS as readonly (string | undefined)[]).includes(text);

/** A first line with which a spreadsheet is told what parts the columns; it is no row. */
const SAID = /^\ufeff?sep=(.)\r?\n/i;

/** What the file itself says parts its columns, by a first line "sep=;". */
export function saidDelimiter(text: string): Delimiter | undefined {
  const said = SAID.exec(text)?.[1];
  return isDelimiter(said) ? said : undefined;
}

const LINES = 20;

/**
 * What parts the columns: the mark that stands equally often in most of the first lines, outside quotes; of those the most
 * frequent. A comma where nothing does: a file of one column.
 *
 * @param text the beginning of the file
 * @example sniffDelimiter('Unit;Odometer\nT-1;410,5\n') // ';'
 */
export function sniffDelimiter(text: string): Delimiter {
  const said = saidDelimiter(text);
  if (said) return said;
  const lines = text.replace(/"[^"]*"/g, '""').split(/\r\n|\r|\n/).filter((line) => line.trim() !== '').slice(0, LINES);
  const scores = DELIMITERS.map((mark) => {
    const counts = lines.map((line) => line.split(mark).length - 1);
    const [first = 0] = counts;
    const alike = counts.filter((count) => count === first).length;
    return { mark, score: first === 0 ? 0 : (alike / lines.length) * 1000 + Math.min(first, 99) };
  });
  const best = scores.reduce((a, b) => (b.score > a.score ? b : a));
  return best.score === 0 ? ',' : best.mark;
}
