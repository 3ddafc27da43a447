import type { Transaction } from '@/db/connect';
import type { WatchRow } from '@/db/queries/watch';
import { readAnswer } from '@/lib/case/read-answer';
import { shareOf } from '@/lib/case/share-of';
import type { CompiledRulebook } from '@/lib/diagnose';
import { conflict, invalid } from '@/lib/errors';
import { ODOMETER } from '@/lib/schemas/watch';
import { limitsOfCase } from '../limit/of-case';
import { decimalMarkOf, readMeasures, type MeasureHabits } from '../units-of-measure';

interface Typed {
  checkId: string;
  state: string | null;
  value: string | null;
  odometer?: string | null;
  note: string | null;
}

/** The columns of a reading from what was typed, by the same rules as an answer of the case: an adopted limit decides first. */
export async function readReading(tx: Transaction, { habits, compiled, watch, typed }: { habits: MeasureHabits; compiled: CompiledRulebook; watch: WatchRow; typed: Typed }) {
  const planned = watch.plan.readings.find(({ check }) => check === typed.checkId);
  const check = compiled.checks.get(typed.checkId);
  if (!planned || !check) throw invalid({ checkId: 'This is not read in this watch.' });
  const isMeasured = check.check.kind === 'measured';
  if (isMeasured && !typed.value) throw invalid({ value: 'Enter what you measured.' });
  if (!isMeasured && !typed.state) throw invalid({ state: 'Choose an answer.' });
  const { columns, asTyped } = readMeasures(habits, [ODOMETER], { odometer: typed.odometer });
  if (columns.odometerM !== null && watch.odometerM !== null && columns.odometerM < watch.odometerM) throw invalid({ odometer: 'It stood higher when the watch began.' });
  const writing = { units: habits.person.units, decimal: decimalMarkOf(habits.organisation.country) };
  const limit = isMeasured ? (await limitsOfCase(tx, { organisationId: watch.organisationId, caseId: watch.caseId, checkId: check.id })).get(check.id) : undefined;
  const given = typed.value && isMeasured ? { kind: 'measured' as const, value: typed.value, sureness: 'sure' as const } : { kind: 'state' as const, state: typed.state ?? '', sureness: 'sure' as const };
  const { kind, shares, valueTyped, unit, valueSi, judgement } = readAnswer(check, given, writing, limit);
  // A value between two bands counts for the one in which more of it lies.
  const isInOrder = judgement ? judgement.verdict === 'within' : shareOf(shares, planned.inOrder) >= 0.5;
  return { checkId: check.id, kind, shares, valueTyped, unit, valueSi, judgement, verdict: isInOrder ? 'in-order' : 'not-in-order', note: typed.note, ...columns, asTyped };
}

export const takenReading = () => conflict('This id belongs to another reading.');
