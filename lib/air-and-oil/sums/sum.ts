import { toSi, unitDefinition, type Quantity, type UnitId, type UnitOf } from '@/lib/units';
import type { Expression } from '../formula/expression';
import type { Letter } from '../formula/to-mathml';

/** Anything that a formula has a symbol for. */
export interface SumQuantity {
  readonly id: string;
  /** "Reservoir volume": begins a line. */
  readonly label: string;
  readonly letter: Letter;
  readonly quantity: Quantity;
  /** The unit that fits its size; `unitFor` turns it into the person's. */
  readonly like: UnitId;
}

/** What a person gives. All in SI. */
export interface SumInput extends SumQuantity {
  /** May be left empty: the default is then taken, and is said to have been. */
  readonly optional: boolean;
  /** To begin with, or in place of an optional input. */
  readonly byDefault: number;
  readonly least: number;
  readonly most: number;
  /** How far a reading of this size can be off to either side, unless the person says otherwise. 0: it is taken as given. */
  readonly halfWidth: (value: number) => number;
  /** The value is the total of so many readings, each with that error: the id of the input that says how many. */
  readonly totalOf?: string;
  readonly note?: string;
}

export type Values = Readonly<Record<string, number>>;

/** What a sum comes to: outputs and terms by id, or that it comes to nothing, and why. */
export type Outcome =
  | {
      readonly kind: 'values';
      /** Undefined where there is no such value for these inputs; a note says why. */
      readonly values: Readonly<Record<string, number | undefined>>;
      /** Sentences for beside the result. */
      readonly notes: readonly string[];
    }
  | { readonly kind: 'never'; readonly because: string };

export interface Plot {
  readonly title: string;
  /** The input along the bottom. */
  readonly x: string;
  readonly range: (inputs: Values) => readonly [from: number, to: number];
  /** Outputs that are drawn as lines; all of the quantity of the first. */
  readonly series: readonly string[];
  /** Lines straight across, at a value in SI. */
  readonly marks: readonly { readonly label: string; readonly at: (inputs: Values) => number }[];
}

export interface Sum {
  readonly id: string;
  readonly name: string;
  readonly purpose: string;
  /** To be read before anything is measured. */
  readonly cautions: readonly string[];
  readonly inputs: readonly SumInput[];
  readonly outputs: readonly SumQuantity[];
  /** The output that the band is of, and that the formula comes to. */
  readonly main: string;
  readonly formula: {
    readonly expression: Expression;
    /** What is worked out on the way and stands in the formula. */
    readonly terms: readonly SumQuantity[];
  };
  readonly assumptions: readonly string[];
  readonly cannotTell: readonly string[];
  readonly source: string;
  /**
   * The sum itself, on inputs that `runSum` has completed and found in range.
   *
   * @throws OutOfRange with the id of an input, where inputs don't fit each other
   */
  readonly compute: (inputs: Values) => Outcome;
  readonly plot?: Plot;
  /** The sum that it can stand in for: the same outputs from other readings. */
  readonly insteadOf?: string;
}

type Described = Omit<SumQuantity, 'id'>;
type DescribedInput = Omit<SumInput, 'id'>;

interface Definition<I extends string, O extends string, T extends string> extends Omit<Sum, 'inputs' | 'outputs' | 'main' | 'formula' | 'compute'> {
  readonly inputs: Readonly<Record<I, DescribedInput>>;
  readonly outputs: Readonly<Record<O, Described>>;
  readonly main: NoInfer<O>;
  readonly expression: Expression;
  readonly terms: Readonly<Record<T, Described>>;
  readonly compute: (
    inputs: Readonly<Record<I, number>>,
  ) => { readonly kind: 'never'; readonly because: string } | { readonly values: Readonly<Record<NoInfer<O> | NoInfer<T>, number | undefined>>; readonly notes?: readonly string[] };
}

/** A sum from a definition in which ids are checked by the compiler. */
export function defineSum<I extends string, O extends string, T extends string>({ inputs, outputs, terms, expression, compute, ...rest }: Definition<I, O, T>): Sum {
  return {
    ...rest,
    inputs: withIds<DescribedInput>(inputs),
    outputs: withIds<Described>(outputs),
    formula: { expression, terms: withIds<Described>(terms) },
    compute: (given) => {
      const outcome = compute(given as Readonly<Record<I, number>>);
      return 'kind' in outcome ? outcome : { kind: 'values', values: outcome.values, notes: outcome.notes ?? [] };
    },
  };
}

function withIds<D>(described: Readonly<Record<string, D>>): (D & { readonly id: string })[] {
  return Object.entries(described).map(([id, description]) => ({ ...description, id }));
}

interface InputOptions {
  readonly optional?: boolean;
  /** These three and `off` in the unit that is named. */
  readonly byDefault: number;
  readonly least: number;
  readonly most: number;
  readonly off?: number;
  /** Off by so much of the value besides. */
  readonly share?: number;
  readonly totalOf?: string;
  readonly note?: string;
}

/** "p_1" is p with a 1 below. */
export function letter(written: string): Letter {
  const [first = '', sub] = written.split('_');
  return sub === undefined ? { letter: first } : { letter: first, sub };
}

/** An input, with its numbers in the unit in which they are usual. */
export function input<Q extends Quantity>(label: string, written: string, quantity: Q, like: UnitOf<Q>, options: InputOptions): DescribedInput {
  const { optional = false, off = 0, share = 0, totalOf, note } = options;
  const si = (value: number) => toSi(value, quantity, like);
  // An error is a difference: the zero of its scale has no part in it.
  const fixed = off * unitDefinition(quantity, like).factor;
  return {
    label,
    letter: letter(written),
    quantity,
    like,
    optional,
    byDefault: si(options.byDefault),
    least: si(options.least),
    most: si(options.most),
    halfWidth: (value) => fixed + share * Math.abs(value),
    ...(totalOf === undefined ? {} : { totalOf }),
    ...(note === undefined ? {} : { note }),
  };
}

/** An output, or a term of the formula. */
export function output<Q extends Quantity>(label: string, written: string, quantity: Q, like: UnitOf<Q>): Described {
  return { label, letter: letter(written), quantity, like };
}
