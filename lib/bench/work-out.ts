import type { Band } from '@/lib/air-and-oil/band';
import { OutOfRange, outOfRangeSentence } from '@/lib/air-and-oil/out-of-range';
import { bandOf, runSum, type Given } from '@/lib/air-and-oil/sums/run-sum';
import type { Sum } from '@/lib/air-and-oil/sums/sum';
import { readTexts, type SumTexts, type UsedInput, type Writing } from './read-texts';

/** What a sum comes to for what was typed. */
export type WorkedOut =
  | { kind: 'values'; values: Readonly<Record<string, number | undefined>>; band: Band | undefined; notes: readonly string[]; inputs: UsedInput[] }
  /** The moment never comes, or there is no such value: `because` says why. */
  | { kind: 'never'; because: string; inputs: UsedInput[] }
  /** Something can't be understood or is out of range: messages by field. */
  | { kind: 'refused'; errors: Readonly<Record<string, string>> };

/**
 * Works out a sum from what was typed: one way for the page, the API, a finding and a device without a connection.
 *
 * @param output the one that the band is of; the main one where nothing is said
 * @example workOut(sumOf('time-loaded'), { loaded: { value: '90 s' }, unloaded: { value: '10:30' }, delivery: { value: '12 cfm' } }, { units: US_UNITS })
 */
export function workOut(sum: Sum, texts: SumTexts, writing: Writing, output = sum.main): WorkedOut {
  const { inputs, errors } = readTexts(sum, texts, writing);
  if (Object.keys(errors).length > 0) return { kind: 'refused', errors };
  try {
    const given = siOf(inputs);
    const outcome = runSum(sum, given);
    if (outcome.kind === 'never') return { kind: 'never', because: outcome.because, inputs };
    const halfWidths = Object.fromEntries(inputs.map(({ id, halfWidthSi }) => [id, halfWidthSi]));
    return { kind: 'values', values: outcome.values, notes: outcome.notes, band: bandOf(sum, given, { halfWidths, output }), inputs };
  } catch (error) {
    if (!(error instanceof OutOfRange)) throw error;
    return { kind: 'refused', errors: { [error.field]: sentence(sum, error, writing) } };
  }
}

/** Inputs as the sums take them: by id, in SI. */
export const siOf = (inputs: readonly Pick<UsedInput, 'id' | 'si'>[]): Given => Object.fromEntries(inputs.map(({ id, si }) => [id, si]));

function sentence({ inputs }: Sum, error: OutOfRange, { units }: Writing): string {
  const input = inputs.find(({ id }) => id === error.field);
  return outOfRangeSentence(error, { label: input?.label ?? error.field, units, like: input?.like });
}
