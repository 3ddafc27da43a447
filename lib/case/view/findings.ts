import { searchOfInputs } from '@/lib/bench/texts-in-url';
import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import type { Check } from '@/lib/diagnose/types';
import { judgementText, type Judgement } from '@/lib/limits';
import type { FindingView } from '@/lib/schemas/case-view';
import type { UnitPreferences } from '@/lib/units';
import { standingFindings } from '../current-findings';
import type { FindingRow, NoteRow } from '../rows';
import { answerText } from './answer-text';
import { measureOf } from './measure';
import { comparedText } from './usual';

/** All findings of a case, newest first; those that were replaced, taken back or late say so. */
export function findingViews(
  compiled: CompiledRulebook,
  rows: readonly FindingRow[],
  notes: readonly NoteRow[],
  units: UnitPreferences,
): FindingView[] {
  const current = new Set(standingFindings(rows).map((row) => row.id));
  return rows
    .map((row): FindingView => ({
      id: row.id,
      checkId: row.checkId,
      stage: row.stage,
      source: row.source,
      kind: row.kind,
      answer: answerText(compiled.checks.get(row.checkId)?.check, row, units),
      shares: row.shares,
      sum: row.sum && { id: row.sum.id, search: searchOfInputs(row.sum) },
      judgement: judgementView(compiled.checks.get(row.checkId)?.check, row.judgement, units),
      compared: comparedText(compiled.checks.get(row.checkId)?.check, row, units),
      thinkSo: row.reliability < 1,
      person: row.person,
      at: row.correctedAt.toISOString(),
      receivedAt: row.receivedAt.toISOString(),
      late: row.late,
      current: current.has(row.id),
      notes: notes.filter((note) => note.findingId === row.id).map(({ id, text, person, at }) => ({ id, text, person, at: at.toISOString() })),
    }))
    .reverse();
}

function judgementView(check: Check | undefined, judgement: Judgement | null, units: UnitPreferences): FindingView['judgement'] {
  const measure = check && measureOf(check, units);
  return measure && judgement ? { verdict: judgement.verdict, text: judgementText(judgement, measure) } : null;
}
