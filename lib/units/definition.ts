/** One unit of one quantity. `si = (value + offset) * factor`. */
export interface UnitDefinition {
  /** What is shown after a number: "psi", "°F". Empty for plain numbers. */
  readonly symbol: string;
  /** For a list to choose from: "pounds per square inch". */
  readonly name: string;
  readonly factor: number;
  /** Only temperature scales have one. */
  readonly offset: number;
  /** Decimals shown when nothing else is asked for. */
  readonly digits: number;
  /** Everything people write for it, besides the symbol and the name. */
  readonly spellings: readonly string[];
}

/** A bound in SI, and the sentence that tells why a value past it can't be right. */
export interface Bound {
  readonly si: number;
  readonly message: string;
}

/** What can be measured, how it is stored, and what people may write for it. */
export interface QuantityDefinition {
  /** "length", as in "a unit of length". */
  readonly noun: string;
  /** "a length", as in "is not a length that we know". */
  readonly called: string;
  /** The SI unit that is stored, for readers of the code and the database. */
  readonly siUnit: string;
  readonly units: Readonly<Record<string, UnitDefinition>>;
  /** Two things to type, for messages. */
  readonly examples: readonly [string, string];
  readonly min?: Bound;
  readonly max?: Bound;
  /** Large numbers are usual and thousandths are not: "410,000" is four hundred and ten thousand. */
  readonly grouped?: boolean;
  /** Whole numbers only. */
  readonly whole?: boolean;
  /** Several units may be strung together: "1 min 30 s", "5 ft 6 in". */
  readonly compound?: boolean;
  /** What two numbers with a colon between them mean. */
  readonly colon?: 'clock' | 'ratio';
  /** The unit of a bare fraction, where the default unit would be absurd: half is not half a percent. */
  readonly fractionUnit?: string;
  /** Spellings that are refused with a sentence of their own. */
  readonly hints?: Readonly<Record<string, string>>;
}

interface UnitOptions {
  readonly offset?: number;
  readonly digits?: number;
  readonly spellings?: readonly string[];
}

/** One row of a table of units. Whole numbers are shown unless `digits` says more. */
export function unit(symbol: string, name: string, factor: number, options: UnitOptions = {}): UnitDefinition {
  const { offset = 0, digits = 0, spellings = [] } = options;
  return { symbol, name, factor, offset, digits, spellings };
}

/** Every `over` written over every `under`: per(['psi'], ['min', 'minute']) is psi/min and psi/minute. */
export function per(over: readonly string[], under: readonly string[]): string[] {
  return over.flatMap((top) => under.map((bottom) => `${top}/${bottom}`));
}

/** The bound of everything that has a size and no direction. */
export function notNegative(message: string): Bound {
  return { si: 0, message };
}
