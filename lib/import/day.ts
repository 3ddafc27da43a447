/** In which order a file writes the parts of its days; a year of four digits, or a month in letters, is told from the rest anyway. */
export const DAY_ORDERS = ['dmy', 'mdy'] as const;
export type DayOrder = (typeof DAY_ORDERS)[number];

export const DAY_ORDER_NAMES: Readonly<Record<DayOrder, string>> = { dmy: 'Day first: 31.12.2024', mdy: 'Month first: 12/31/2024' };

const MONTHS = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec'];

/** A time behind a day is cut off: "2024-03-01T00:00:00Z", "3/1/2024 12:00 AM". */
const TIME = /[T ]\d{1,2}:\d{2}(:\d{2}(\.\d+)?)?( ?[ap]\.?m\.?)?( ?(Z|[+-]\d{2}:?\d{2}))?$/i;

const YEAR_FIRST = /^(\d{4})[-/.](\d{1,2})[-/.](\d{1,2})$/;
const COMPACT = /^((?:19|20)\d{2})(\d{2})(\d{2})$/;
const NUMBERS = /^(\d{1,2})[-/. ]+(\d{1,2})[-/. ]+(\d{4}|\d{2})$/;
const DAY_AND_LETTERS = /^(\d{1,2})[-. ]+([a-z]{3,9})\.?[-, ]+(\d{4}|\d{2})$/i;
const LETTERS_FIRST = /^([a-z]{3,9})\.? (\d{1,2}),? (\d{4})$/i;
/** How a spreadsheet counts days when a cell lost its format: 1 is 1 January 1900. */
const SERIAL = /^\d{5}(\.\d+)?$/;

/** Of two digits, those up to this are of this century. */
const PIVOT = 50;
const wholeYear = (text: string) => (text.length === 4 ? Number(text) : Number(text) + (Number(text) < PIVOT ? 2000 : 1900));

/** Spreadsheets count a 29 February 1900 that never was, so that from March on day 0 is 30 December 1899. */
const SERIAL_ZERO_MS = Date.UTC(1899, 11, 30);
const DAY_MS = 86_400_000;

/**
 * A day as a spreadsheet writes it, as "YYYY-MM-DD"; undefined when it is none.
 *
 * @param order what "03/04/2024" means
 * @example readDay('31.12.24', 'dmy')  // '2024-12-31'
 * @example readDay('Mar 1, 2024', 'mdy') // '2024-03-01'
 * @example readDay('45352', 'dmy')     // '2024-03-01', counted as a spreadsheet counts
 * @example readDay('31/12/2024', 'mdy') // undefined: there is no month 31
 */
export function readDay(text: string, order: DayOrder): string | undefined {
  const written = text.trim().replace(TIME, '').trim();
  const [, y = '', m = '', d = ''] = YEAR_FIRST.exec(written) ?? COMPACT.exec(written) ?? [];
  if (y !== '') return dayOf(Number(y), Number(m), Number(d));
  const numbers = NUMBERS.exec(written);
  if (numbers) {
    const [, first = '', second = '', year = ''] = numbers;
    return order === 'dmy' ? dayOf(wholeYear(year), Number(second), Number(first)) : dayOf(wholeYear(year), Number(first), Number(second));
  }
  const [, day = '', name = '', year = ''] = DAY_AND_LETTERS.exec(written) ?? [];
  if (name !== '') return dayOf(wholeYear(year), monthNamed(name), Number(day));
  const [, named = '', dayAfter = '', yearAfter = ''] = LETTERS_FIRST.exec(written) ?? [];
  if (named !== '') return dayOf(Number(yearAfter), monthNamed(named), Number(dayAfter));
  if (SERIAL.test(written)) return new Date(SERIAL_ZERO_MS + Math.floor(Number(written)) * DAY_MS).toISOString().slice(0, 10);
  return undefined;
}

const monthNamed = (name: string) => MONTHS.indexOf(name.slice(0, 3).toLowerCase()) + 1;

function dayOf(year: number, month: number, day: number): string | undefined {
  const at = new Date(Date.UTC(year, month - 1, day));
  const isReal = month >= 1 && month <= 12 && at.getUTCMonth() === month - 1 && at.getUTCDate() === day && day >= 1;
  return isReal ? at.toISOString().slice(0, 10) : undefined;
}

/**
 * What the days of a file say of their order: a first part above 12 is a day, a second above 12 too.
 *
 * @param texts cells that may be days
 * @param otherwise where none says it
 * @example guessDayOrder(['03/31/2024', '04/01/2024'], 'dmy') // 'mdy'
 */
export function guessDayOrder(texts: readonly string[], otherwise: DayOrder): DayOrder {
  for (const text of texts) {
    const [, first = '', second = ''] = NUMBERS.exec(text.trim().replace(TIME, '').trim()) ?? [];
    if (Number(first) > 12 && Number(second) <= 12) return 'dmy';
    if (Number(second) > 12 && Number(first) <= 12) return 'mdy';
  }
  return texts.some((text) => /^\d{1,2}\.\d{1,2}\.\d{2,4}\b/.test(text.trim())) ? 'dmy' : otherwise;
}
