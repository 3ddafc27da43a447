import { sumOf } from '@/lib/air-and-oil/sums';
import type { Sum } from '@/lib/air-and-oil/sums/sum';
import { differenceOf, formatQuantity, formatValue, parseQuantity, type Quantity, type UnitId, type UnitOf } from '@/lib/units';
import { unitsOfInput, type InputText, type SumTexts, type UsedInput, type Writing } from './read-texts';

/** A sum, or whatever else has inputs. */
type Fields = Pick<Sum, 'inputs'>;

type Search = Readonly<Record<string, string | undefined>>;

/** Figures enough to type a reading again, and few enough that the noise of a conversion is not among them. */
const FIGURES = 10;

/**
 * What was typed, as it stands in an address: each value with its unit, so that the sum says the same to somebody who has
 * set other units.
 *
 * @example searchOfTexts(sum, { volume: { value: '3' } }, { units: US_UNITS }) // { volume: '3 ft³' }
 */
export function searchOfTexts(sum: Fields, texts: SumTexts, writing: Writing): Record<string, string> {
  return Object.fromEntries(
    fields(sum, writing).flatMap(({ input, key, part, ...measure }) => {
      const text = texts[input.id]?.[part]?.trim() ?? '';
      return text === '' ? [] : [[key, withUnit(text, measure, writing)]];
    }),
  );
}

/**
 * The fields of a sum from an address; a unit that is the person's own is left out, since it is printed beside the field.
 *
 * @param search by name; what the sum has no input for is ignored
 */
export function textsOfSearch(sum: Fields, search: Search, writing: Writing): Record<string, InputText> {
  const texts: Record<string, InputText> = {};
  for (const { input, key, part, ...measure } of fields(sum, writing)) {
    const text = search[key];
    if (text !== undefined) texts[input.id] = { ...texts[input.id], [part]: withoutUnit(text, measure, writing) };
  }
  return texts;
}

interface Measure {
  quantity: Quantity;
  unit: UnitId;
}

const fields = (sum: Fields, { units }: Writing) =>
  sum.inputs.flatMap((input) => {
    const { unit, difference } = unitsOfInput(input, units);
    return [
      { input, key: input.id, part: 'value' as const, quantity: input.quantity, unit },
      { input, key: `${input.id}.error`, part: 'error' as const, quantity: difference, unit },
    ];
  });

function withUnit(text: string, { quantity, unit }: Measure, { decimal }: Writing): string {
  const read = parseQuantity<Quantity>(text, { quantity, defaultUnit: unit as UnitOf<Quantity>, decimal });
  return read.ok ? formatQuantity<Quantity>(read.si, { quantity, unit: read.unit, significant: FIGURES }) : text;
}

function withoutUnit(text: string, { quantity, unit }: Measure, { decimal }: Writing): string {
  const read = parseQuantity<Quantity>(text, { quantity, defaultUnit: unit as UnitOf<Quantity>, decimal: '.' });
  if (!read.ok) return text;
  const options = { quantity, unit: read.unit, significant: FIGURES, decimal };
  return read.unit === unit ? formatValue<Quantity>(read.si, options) : formatQuantity<Quantity>(read.si, options);
}

/** The same from what went into a sum: the address of a bench that shows it again. Inputs that were left empty stay empty. */
export function searchOfInputs({ id, inputs }: { id: string; inputs: readonly UsedInput[] }): Record<string, string> {
  const sum = sumOf(id);
  if (!sum) return {};
  return Object.fromEntries(
    inputs.flatMap(({ id: inputId, typed, errorTyped, unit, si, halfWidthSi }) => {
      const input = sum.inputs.find((one) => one.id === inputId);
      if (!input) return [];
      const { quantity } = input;
      const text = (value: number, of: Quantity) => formatQuantity<Quantity>(value, { quantity: of, unit: unit as UnitOf<Quantity>, significant: FIGURES });
      return [
        ...(typed === null ? [] : [[inputId, text(si, quantity)] as const]),
        ...(errorTyped === null ? [] : [[`${inputId}.error`, text(halfWidthSi, differenceOf(quantity))] as const]),
      ];
    }),
  );
}
