import type { Sum, SumInput } from '@/lib/air-and-oil/sums/sum';
import { differenceOf, parseError, parseQuantity, unitFor, withoutPlusMinus, type DecimalMark, type Quantity, type UnitId, type UnitOf, type UnitPreferences } from '@/lib/units';

/** How the person writes measures. */
export interface Writing {
  units: UnitPreferences;
  decimal?: DecimalMark;
}

/** What was typed for one input: the reading, and how far it can be off. Empty or absent: the usual. */
export interface InputText {
  value?: string;
  error?: string;
}

/** By the id of the input. */
export type SumTexts = Readonly<Record<string, InputText | undefined>>;

/** One input as it went into a sum: what a finding keeps, so that its figure can be traced. */
export interface UsedInput {
  id: string;
  /** As typed; null: the default was taken. */
  typed: string | null;
  errorTyped: string | null;
  unit: UnitId;
  si: number;
  halfWidthSi: number;
}

export interface ReadTexts {
  inputs: UsedInput[];
  /** Messages beside the fields: by the id of the input, its error's as "<id>.error". */
  errors: Record<string, string>;
}

/** The unit in which an input is written without one, and that of its error, which is a difference. */
export function unitsOfInput({ quantity, like }: Pick<SumInput, 'quantity' | 'like'>, units: UnitPreferences): { unit: UnitId; difference: Quantity } {
  const unit = unitFor<Quantity>(units, quantity, like as UnitOf<Quantity>);
  return { unit, difference: differenceOf(quantity) };
}

/**
 * Understands what was typed for a sum. Whether values are in range is for the sum to say.
 *
 * @example readTexts(sumOf('time-loaded'), { loaded: { value: '1:30' } }, { units: US_UNITS })
 */
export function readTexts(sum: Pick<Sum, 'inputs'>, texts: SumTexts, writing: Writing): ReadTexts {
  const errors: Record<string, string> = {};
  const inputs = sum.inputs.flatMap((input) => {
    const { value, halfWidth } = readInput(input, texts[input.id] ?? {}, writing);
    if (!value.ok) errors[input.id] = value.message;
    if (!halfWidth.ok) errors[`${input.id}.error`] = halfWidth.message;
    if (!value.ok || !halfWidth.ok) return [];
    return [{ id: input.id, typed: value.typed, errorTyped: halfWidth.typed, unit: value.unit, si: value.si, halfWidthSi: halfWidth.si }];
  });
  return { inputs, errors };
}

function readInput(input: SumInput, text: InputText, { units, decimal }: Writing) {
  const { unit } = unitsOfInput(input, units);
  const value = readValue(input, text.value?.trim() ?? '', unit, decimal);
  return { value, halfWidth: readHalfWidth(input, value.ok ? value.si : input.byDefault, text.error?.trim() ?? '', { unit, decimal }) };
}

type Read = { ok: true; typed: string | null; unit: UnitId; si: number } | { ok: false; message: string };

function readValue({ quantity, optional, byDefault, label }: SumInput, typed: string, unit: UnitId, decimal?: DecimalMark): Read {
  if (typed === '') return optional ? { ok: true, typed: null, unit, si: byDefault } : { ok: false, message: `Give ${startLower(label)}.` };
  const read = parseQuantity<Quantity>(typed, { quantity, defaultUnit: unit as UnitOf<Quantity>, decimal });
  return read.ok ? { ok: true, typed, unit: read.unit, si: read.si } : { ok: false, message: read.message };
}

function readHalfWidth(
  { quantity, halfWidth }: SumInput,
  value: number,
  typed: string,
  { unit, decimal }: { unit: UnitId; decimal?: DecimalMark },
): { ok: true; typed: string | null; si: number } | { ok: false; message: string } {
  if (withoutPlusMinus(typed) === '') return { ok: true, typed: null, si: halfWidth(value) };
  const read = parseError(typed, { quantity, defaultUnit: unit, decimal });
  return read.ok ? { ok: true, typed, si: read.si } : read;
}

const startLower = (label: string) => label.slice(0, 1).toLowerCase() + label.slice(1);
