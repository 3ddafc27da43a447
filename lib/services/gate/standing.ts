import type { Transaction } from '@/db/connect';
import { selectFindings } from '@/db/queries/finding';
import { selectGateAnswers, selectOpenCase, type GateAnswerRow, type GatePassageRow } from '@/db/queries/gate';
import { selectLatestRun } from '@/db/queries/run';
import type { Writing } from '@/lib/bench/read-texts';
import { findingsForRanking, rankOptions } from '@/lib/case/findings-for-ranking';
import { readAnswer, type AnswerColumns } from '@/lib/case/read-answer';
import { siteDay } from '@/lib/case/site-day';
import type { CompiledRulebook, Stage } from '@/lib/diagnose';
import { findingsFromRecord } from '@/lib/diagnose/findings-from-record';
import { nextAtGate } from '@/lib/gate/next';
import { answerInput } from '@/lib/schemas/case';
import { complaintFindings, complaintIds } from '../case/complaints';
import { compiledEdition } from '../edition/compiled';
import { unitRecord } from '../unit/unit-record';
import type { Opened } from './through';

export const DIAGNOSIS: Stage = { kind: 'diagnosis' };

export interface ReadAnswer extends AnswerColumns {
  id: string;
  checkId: string;
  at: Date;
}

/** The answers of a passage by a rulebook; one that it has no check or no answer for any more is left out. */
export function readAnswers(compiled: CompiledRulebook, answers: readonly GateAnswerRow[], writing: Writing): ReadAnswer[] {
  return answers.flatMap(({ id, checkId, answer, at }) => {
    const check = compiled.checks.get(checkId);
    const given = answerInput.parse(answer);
    if (!check || (given.kind === 'state' && !check.stateIndex.has(given.state))) return [];
    return [{ ...readAnswer(check, given, writing), id, checkId, at }];
  });
}

/** Where a passage stands: by which rulebook, what was answered, and the check that comes next; null when it is at its end. */
export async function standingOf(tx: Transaction, { organisation, site, writing, at }: Opened, passage: GatePassageRow) {
  const of = { organisationId: organisation.id, unitId: passage.unitId };
  const open = await selectOpenCase(tx, of);
  const compiled = await compiledEdition(tx, { ...of, editionId: open?.editionId ?? passage.editionId });
  const answers = await selectGateAnswers(tx, { ...of, passageId: passage.id });
  const read = readAnswers(compiled, answers, writing);

  const asRow = { stage: DIAGNOSIS, kind: 'state', correctedAt: passage.startedAt, receivedAt: passage.startedAt };
  const complained = complaintFindings(passage.complaints.filter((id) => compiled.checks.has(id)));
  const [known, facts] = open
    ? [await selectFindings(tx, { ...of, caseId: open.id }), (await selectLatestRun(tx, { ...of, caseId: open.id }))?.recordFacts ?? {}]
    : await recorded();
  const findings = findingsForRanking([
    ...known,
    ...complained.map((finding) => ({ ...finding, ...asRow, id: `complaint:${finding.checkId}`, source: 'asked' })),
    ...read.map((row) => ({ ...row, stage: DIAGNOSIS, source: 'asked', correctedAt: row.at, receivedAt: row.at })),
  ]);
  const spent = { checks: answers.length, minutes: answers.reduce((sum, { minutes }) => sum + minutes, 0) };
  const next = nextAtGate(compiled, {
    findings,
    options: rankOptions(findings, facts),
    spent,
    leaveOut: complaintIds(compiled),
    labourRatePerHour: organisation.labourRatePerHour,
  });
  return { compiled, answers, spent, next };

  async function recorded() {
    const { facts: noted } = await unitRecord(tx, { ...of, on: siteDay(at, site.timeZone) });
    return [findingsFromRecord(compiled, noted).map((finding) => ({ ...finding, ...asRow, source: 'record' })), noted] as const;
  }
}
