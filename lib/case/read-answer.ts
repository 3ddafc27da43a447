import type { z } from 'zod';
import { waysTo } from '@/lib/air-and-oil/sums';
import type { Writing } from '@/lib/bench/read-texts';
import { workOut } from '@/lib/bench/work-out';
import type { CompiledCheck } from '@/lib/diagnose/compiled';
import { FindingError } from '@/lib/diagnose/errors';
import { sharesOf } from '@/lib/diagnose/shares';
import type { StateShare } from '@/lib/diagnose/types';
import { invalid } from '@/lib/errors';
import { judge, type Judgement, type Limit } from '@/lib/limits';
import type { answerInput } from '@/lib/schemas/case';
import { formatQuantity, parseError, parseQuantity, type DecimalMark } from '@/lib/units';
import type { FindingSum } from './rows';
import { measureOf, type Measure } from './view/measure';

/** The columns of a finding that an answer fills. */
export interface AnswerColumns {
  kind: 'state' | 'measured' | 'cannot-tell' | 'skip' | 'undo';
  shares: StateShare[];
  reliability: number;
  valueTyped: string | null;
  errorTyped: string | null;
  unit: string | null;
  valueSi: number | null;
  errorSi: number | null;
  sum: FindingSum | null;
  judgement: Judgement | null;
}

const NOT_MEASURED = { valueTyped: null, errorTyped: null, unit: null, valueSi: null, errorSi: null, sum: null, judgement: null };

export type ParsedAnswer = z.output<typeof answerInput>;

/**
 * Understands an answer to a check: a state as it is, a measured value from what was typed, judged by the limit that the
 * organisation adopted.
 *
 * @param limit that holds for this unit and check, if one does
 * @throws AppError "invalid" with the message beside `value`, `error` or `state`
 */
export function readAnswer(check: CompiledCheck, answer: ParsedAnswer, writing: Writing, limit?: Limit): AnswerColumns {
  const read = readUnjudged(check, answer, writing);
  return limit && read.valueSi !== null ? { ...read, judgement: judge(limit, read.valueSi, read.errorSi ?? 0) } : read;
}

function readUnjudged(check: CompiledCheck, answer: ParsedAnswer, writing: Writing): AnswerColumns {
  if (answer.kind === 'measured') return readMeasured(check, answer, writing);
  if (answer.kind === 'sum') return readSum(check, answer, writing);
  if (answer.kind !== 'state') return { kind: answer.kind, shares: [], reliability: 1, ...NOT_MEASURED };
  if (check.check.kind === 'measured') throw invalid({ value: 'This check is measured: enter the value.' });
  if (!check.stateIndex.has(answer.state)) throw invalid({ state: 'This check has no such answer.' });
  return { kind: 'state', ...sharesOf(check, answer), ...NOT_MEASURED };
}

function readMeasured(check: CompiledCheck, answer: Extract<ParsedAnswer, { kind: 'measured' }>, { units, decimal }: Writing): AnswerColumns {
  const measure = measureOf(check.check, units);
  if (!measure) throw invalid({ state: 'This check is not measured: choose an answer.' });
  const value = parseQuantity(answer.value, { quantity: measure.quantity, defaultUnit: measure.unit, decimal });
  if (!value.ok) throw invalid({ value: value.message });
  refuseOutOfRange(check, answer.value, value.si, measure);
  const error = answer.error ? readError(answer.error, measure, decimal) : (check.check.usualError ?? 0);
  try {
    const { shares, reliability } = sharesOf(check, { kind: 'measured', value: value.si, error, sureness: answer.sureness });
    return {
      kind: 'measured',
      shares,
      reliability,
      valueTyped: answer.value,
      errorTyped: answer.error ?? null,
      unit: value.unit,
      valueSi: value.si,
      errorSi: error,
      sum: null,
      judgement: null,
    };
  } catch (cause) {
    if (cause instanceof FindingError) throw invalid({ value: 'This value does not fit the check.' });
    throw cause;
  }
}

/** The value and its band from a sum of the bench, made here from what was typed: what a page showed counts for nothing. */
function readSum(check: CompiledCheck, { sum: sumId, inputs, sureness }: Extract<ParsedAnswer, { kind: 'sum' }>, writing: Writing): AnswerColumns {
  const measure = measureOf(check.check, writing.units);
  const ways = check.check.sum ? waysTo(check.check.sum.id) : [];
  const sum = sumId ? ways.find(({ id }) => id === sumId) : ways[0];
  if (!check.check.sum || !measure || ways.length === 0) throw invalid({ inputs: 'The bench has no sum for this check: enter the value.' });
  if (!sum) throw invalid({ sum: 'This check is not answered by that sum.' });
  const { output } = check.check.sum;
  const worked = workOut(sum, inputs, writing, output);
  if (worked.kind === 'refused') throw invalid(worked.errors);
  if (worked.kind === 'never') throw invalid({ inputs: worked.because });
  const { band } = worked;
  const value = worked.values[output];
  if (value === undefined || !band) throw invalid({ inputs: 'There is no such value for these readings.' });
  const shown = formatQuantity(value, { quantity: measure.quantity, unit: measure.unit });
  refuseOutOfRange(check, shown, value, measure);
  // Bands are spread over as they are for a reading: evenly within the larger side of its doubt.
  const error = Math.max(value - (band.low ?? value), (band.high ?? value) - value);
  return {
    kind: 'measured',
    ...sharesOf(check, { kind: 'measured', value, error, sureness }),
    valueTyped: null,
    errorTyped: null,
    unit: measure.unit,
    valueSi: value,
    errorSi: error,
    sum: { id: sum.id, output, inputs: worked.inputs, low: band.low ?? null, high: band.high ?? null },
    judgement: null,
  };
}

function refuseOutOfRange({ check }: CompiledCheck, typed: string, si: number, { quantity, unit }: Measure): void {
  const { min, max } = check.range ?? { min: -Infinity, max: Infinity };
  if (si >= min && si <= max) return;
  const shown = (limit: number) => formatQuantity(limit, { quantity, unit });
  throw invalid({ value: `${typed} can't be right here: between ${shown(min)} and ${shown(max)} is possible.` });
}

function readError(typed: string, { quantity, differenceUnit }: Measure, decimal?: DecimalMark): number {
  const error = parseError(typed, { quantity, defaultUnit: differenceUnit, decimal });
  if (!error.ok) throw invalid({ error: error.message });
  return error.si;
}
