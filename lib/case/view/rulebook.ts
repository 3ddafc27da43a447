import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import type { Check } from '@/lib/diagnose/types';
import type { CheckView, RulebookView } from '@/lib/schemas/case-view';
import { formatValue, unitDefinition, type UnitPreferences } from '@/lib/units';
import { isCaught } from '../weighings';
import { measureOf } from './measure';

/** An edition as the case page needs it: what is asked and said, without the rules; measures in the person's units. */
export function rulebookView({ rulebook }: CompiledRulebook, units: UnitPreferences): RulebookView {
  const names = new Map(rulebook.checks.map((check) => [check.id, check.name]));
  return {
    checks: Object.fromEntries(rulebook.checks.map((check) => [check.id, checkView(check, names, units)])),
    panels: rulebook.panels,
    causes: Object.fromEntries(rulebook.causes.map(({ id, name, sentence, station }) => [id, { name, sentence, station }])),
    cautions: Object.fromEntries(rulebook.cautions.map(({ id, text, worseWhen }) => [id, { text, worseWhen }])),
  };
}

function checkView(check: Check, names: ReadonlyMap<string, string>, units: UnitPreferences): CheckView {
  const { id, station, kind, name, prompt, why, steps, tools, minutes, setUp, cautions, basis, source, usualError } = check;
  const measure = measureOf(check, units);
  return {
    id, station, kind, name, prompt, why, steps, tools, minutes, setUp, cautions, basis, source,
    answers: check.states.map((state) => ({ id: state.id, label: state.label })),
    unitSymbol: measure ? unitDefinition(measure.quantity, measure.unit).symbol : null,
    errorSymbol: measure ? unitDefinition(measure.difference, measure.differenceUnit).symbol : null,
    usualError: measure && usualError !== undefined
      ? formatValue(usualError, { quantity: measure.difference, unit: measure.differenceUnit })
      : null,
    sum: check.sum?.id ?? null,
    overDays: isCaught(check),
    spoils: check.spoils.map((spoiled) => ({ id: spoiled, name: names.get(spoiled) ?? spoiled })),
  };
}
