import { fleetKey, wordsOf } from './fold';

/** What somebody asked for, as the parts of the search need it. */
export interface Asked {
  words: string[];
  /** For PostgreSQL: all of the words, each from its beginning. null: there is no word to look for. */
  tsquery: string | null;
  /** As fleet numbers are compared; '' when there is none. */
  fleetKey: string;
  /** Whether a fleet number that is nearly the one typed may be meant: it has a digit, and enough to compare by. */
  maybeMistyped: boolean;
  /** "412", "#412" and "case 412" name a case. */
  caseNumber: number | null;
}

/** Of a PostgreSQL integer. */
const LARGEST = 2_147_483_647;
/** Three characters and fewer are near too many numbers. */
const FEWEST_TO_COMPARE = 3;

/**
 * Reads what somebody typed. Whatever it is, what comes of it can be asked: a word holds letters and digits alone, so that
 * no operator of a tsquery can stand in one.
 * @example readAsked('case 412').caseNumber // 412
 */
export function readAsked(text: string): Asked {
  const words = wordsOf(text);
  const key = fleetKey(text);
  return {
    words,
    tsquery: words.length > 0 ? words.map((word) => `'${word}':*`).join(' & ') : null,
    fleetKey: key,
    maybeMistyped: /\d/.test(key) && key.length >= FEWEST_TO_COMPARE,
    caseNumber: caseNumberIn(text),
  };
}

function caseNumberIn(text: string): number | null {
  const [, digits] = /^\s*(?:case)?\s*(?:#|no\.?|number)?\s*(\d{1,10})\s*$/i.exec(text) ?? [];
  const number = Number(digits);
  return digits !== undefined && number <= LARGEST ? number : null;
}
