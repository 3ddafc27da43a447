import type { CompiledRulebook } from '@/lib/diagnose';
import type { Check } from '@/lib/diagnose/types';
import { unitDefinition, type Quantity, type UnitPreferences } from '@/lib/units';
import { measureOf } from './measure';
import { unreadOf } from './work-cautions';

/** A check as somebody without a sign-in does it: all of its cautions, and nothing of the case. */
export function checkForVisitor(compiled: CompiledRulebook, check: Check, units: UnitPreferences) {
  const measure = measureOf(check, units);
  return {
    name: check.name,
    prompt: check.prompt,
    steps: check.steps,
    cautions: unreadOf(compiled, check, []).cautions.map(({ text }) => text),
    states: check.kind === 'measured' ? [] : check.states.map(({ id, label }) => ({ id, label })),
    /** Of a figure without one; null: an answer is chosen. */
    unit: measure && unitDefinition<Quantity>(measure.quantity, measure.unit).symbol,
  };
}
