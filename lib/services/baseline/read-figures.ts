import { CONDITION_WORDS, FIGURES, type Figure, type FigureId } from '@/lib/baseline/figures';
import { figureText } from '@/lib/baseline/words';
import { invalid, type FieldErrors } from '@/lib/errors';
import { measureUnit } from '@/lib/schemas/measures';
import { parseError, parseQuantity, type Quantity } from '@/lib/units';
import { decimalMarkOf, type MeasureHabits } from '../units-of-measure';

/** A figure as it is kept. */
export interface TypedFigure {
  figure: FigureId;
  valueSi: number;
  errorSi: number;
  valueTyped: string;
  errorTyped: string | null;
  unit: string;
}

type Typed = Readonly<Record<string, string | null | undefined>>;

/**
 * Understands the figures of a set as they were typed: each in any unit of its quantity, without one in the person's.
 *
 * @returns those that were given
 * @throws AppError "invalid" beside each field that can't be read, or can't be; at the first when none was given
 */
export function readFigures(habits: MeasureHabits, typed: Typed): TypedFigure[] {
  const problems: FieldErrors = {};
  const read = FIGURES.flatMap((figure) => {
    const value = typed[figure.field];
    return value ? (readFigure(habits, figure, { value, error: typed[`${figure.field}Error`] ?? null }, problems) ?? []) : [];
  });
  for (const { field, conditions, called } of FIGURES) {
    if (!typed[field]) continue;
    for (const condition of conditions) {
      if (!typed[condition]) problems[condition] = `Give ${CONDITION_WORDS[condition]}, or ${called} can’t be compared later.`;
    }
  }
  if (Object.keys(problems).length > 0) throw invalid(problems);
  const [first] = FIGURES;
  if (read.length === 0 && first) throw invalid({ [first.field]: 'Measure at least one of the five.' });
  return read;
}

function readFigure(
  { organisation, person }: MeasureHabits,
  figure: Figure,
  { value, error }: { value: string; error: string | null },
  problems: FieldErrors,
): TypedFigure | null {
  const { id, field, quantity, range } = figure;
  const defaultUnit = measureUnit(person.units, figure);
  const decimal = decimalMarkOf(organisation.country);
  const parsed = parseQuantity<Quantity>(value, { quantity, defaultUnit, decimal });
  const off = error === null ? null : parseError(error, { quantity, defaultUnit, decimal });
  if (!parsed.ok) problems[field] = parsed.message;
  else if (parsed.si < range.min || parsed.si > range.max) {
    const shown = (si: number) => figureText(id, si, person.units);
    problems[field] = `${value} can’t be right here: between ${shown(range.min)} and ${shown(range.max)} is possible.`;
  }
  if (off && !off.ok) problems[`${field}Error`] = off.message;
  if (!parsed.ok || (off && !off.ok)) return null;
  return { figure: id, valueSi: parsed.si, errorSi: off ? off.si : figure.usualError, valueTyped: value, errorTyped: error, unit: parsed.unit };
}
