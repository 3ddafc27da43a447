/** The mark a person writes before decimals. */
export type DecimalMark = '.' | ',';

/** A number found at the start of a text, and what follows it. */
export interface NumberRead {
  readonly ok: true;
  readonly value: number;
  readonly fraction: boolean;
  readonly rest: string;
}

/** Why the start of a text is not a number: a whole sentence, or nothing when there is nothing better to say. */
export interface NumberRefused {
  readonly ok: false;
  readonly message?: string;
}

interface NumberOptions {
  /** Thousands are usual here and thousandths are not. */
  readonly grouped?: boolean;
  /** Settles what could be read in two ways. */
  readonly decimal?: DecimalMark;
}

const MIXED = /^(\d{1,6})[ -](\d{1,4}) ?\/ ?(\d{1,4})(?!\d)/;
const FRACTION = /^(\d{1,6}) ?\/ ?(\d{1,6})(?!\d)/;
const DECIMAL = /^(?:\d+(?:[ .,]\d+)*|[.,]\d+)/;

/** Digits in well-formed groups of three: 1 234 567. */
const GROUPS = { ' ': /^\d{1,3}(?: \d{3})+$/, ',': /^\d{1,3}(?:,\d{3})+$/, '.': /^\d{1,3}(?:\.\d{3})+$/ };

/** "410,000" and its like: one mark that can be read either way. A leading zero ("0,125") can't be one of thousands. */
const EITHER_WAY = /^[1-9]\d{0,2}[.,]\d{3}$/;

/**
 * Reads the unsigned number at the start of a text whose blanks are single spaces: "8,3", "410 000", "1.234,5", "5/8",
 * "1 3/8", "1-3/8".
 *
 * Two marks: the later is the decimal mark and the other must group well. One mark several times: thousands. One mark
 * once: decimals, unless exactly three digits follow one to three, which is where people differ. `decimal` settles
 * that. Without it, a comma means thousands where thousands are usual ("410,000 miles") and a point means decimals
 * where they are not ("1.375 in"); what remains ("4,500 in3", "410.000 km") is asked back, because a guess would be
 * wrong by a factor of a thousand and nobody would see it.
 */
export function readNumber(text: string, options: NumberOptions = {}): NumberRead | NumberRefused {
  const mixed = MIXED.exec(text);
  if (mixed) return readFraction(text, mixed[0], Number(mixed[1]), Number(mixed[2]), Number(mixed[3]));
  const fraction = FRACTION.exec(text);
  if (fraction) return readFraction(text, fraction[0], 0, Number(fraction[1]), Number(fraction[2]));

  const written = DECIMAL.exec(text)?.[0];
  if (written === undefined) return { ok: false };
  const plain = resolveMarks(written, options);
  if (typeof plain !== 'string') return plain;
  const value = Number(plain);
  if (!Number.isFinite(value)) return { ok: false };
  return { ok: true, value, fraction: false, rest: text.slice(written.length) };
}

function readFraction(text: string, written: string, whole: number, over: number, under: number): NumberRead | NumberRefused {
  if (under === 0) return { ok: false, message: `'${written}' divides by zero.` };
  // "1 9/8" is more likely a slip than seventeen eighths.
  if (whole > 0 && over >= under) return { ok: false, message: `'${written}' has a fraction that is not less than one.` };
  return { ok: true, value: whole + over / under, fraction: true, rest: text.slice(written.length) };
}

/** The number with its thousands closed up and a point for its decimal mark, as `Number` reads it. */
function resolveMarks(written: string, { grouped = false, decimal }: NumberOptions): string | NumberRefused {
  const lastMark = Math.max(written.lastIndexOf('.'), written.lastIndexOf(','));
  const mark = written[lastMark];
  if (mark === undefined) return closeGroups(written);

  const once = written.indexOf(mark) === lastMark;
  if (!once) return closeGroups(written);

  const asDecimals = () => {
    const before = written.slice(0, lastMark);
    const closed = before === '' ? '0' : closeGroups(before);
    return typeof closed === 'string' ? `${closed}.${written.slice(lastMark + 1)}` : closed;
  };
  if (!EITHER_WAY.test(written)) return asDecimals();
  if (decimal) return mark === decimal ? asDecimals() : closeGroups(written);
  if (grouped && mark === ',') return closeGroups(written);
  if (!grouped && mark === '.') return asDecimals();

  const thousands = written.replace(mark, '');
  // Where thousands are usual three decimals would be asked back again, so fewer are proposed.
  const small = Number(written.replace(mark, '.'));
  const decimals = String(grouped ? Number(small.toFixed(1)) : small);
  return { ok: false, message: `'${written}' can be read as ${thousands} or as ${decimals}. Please write one of those.` };
}

function closeGroups(written: string): string | NumberRefused {
  if (/^\d+$/.test(written)) return written;
  for (const [mark, wellFormed] of Object.entries(GROUPS)) {
    if (wellFormed.test(written)) return written.replaceAll(mark, '');
  }
  return { ok: false };
}
