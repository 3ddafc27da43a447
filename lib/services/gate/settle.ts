import type { Transaction } from '@/db/connect';
import { insertAudit } from '@/db/queries/audit';
import { lockCase, updateCase } from '@/db/queries/case';
import { insertFindings, selectFindings, type FindingRow } from '@/db/queries/finding';
import { selectGateAnswers, selectOpenCase, updatePassage, type GatePassageRow } from '@/db/queries/gate';
import { selectLatestRun } from '@/db/queries/run';
import { selectUnit } from '@/db/queries/unit';
import { arriving, currentFindings } from '@/lib/case/current-findings';
import { findingsForRanking } from '@/lib/case/findings-for-ranking';
import { releaseHolds } from '@/lib/case/release-holds';
import { siteDay } from '@/lib/case/site-day';
import { vehicleAfter } from '@/lib/case/vehicle-after';
import { conflict, notFound } from '@/lib/errors';
import { causesOfTheCompressor, verdictOf } from '@/lib/gate/verdict';
import { newId } from '@/lib/ids';
import { judge } from '@/lib/limits';
import { beginCase } from '../case/begin';
import { complaintFindings } from '../case/complaints';
import { lockCaseOf } from '../case/locked';
import { makeRun } from '../case/run-of-record';
import { compiledEdition } from '../edition/compiled';
import { limitsOfCase } from '../limit/of-case';
import { holdAfterAnswer } from '../unit-hold/after-answer';
import { unitRecord } from '../unit/unit-record';
import { DIAGNOSIS, readAnswers } from './standing';
import type { Opened } from './through';

/**
 * Ends a passage: its answers become findings of the unit's open case, or of one that is opened, which is ranked once more;
 * the verdict is that of this run of record.
 */
export async function settlePassage(tx: Transaction, opened: Opened, passage: GatePassageRow): Promise<void> {
  const { organisation, gate } = opened;
  const of = { organisationId: organisation.id, unitId: passage.unitId };
  // As the workshop reads it beside each answer.
  const byName = `${passage.byName}, at the gate “${gate.name}”`;
  const known = await openCaseLocked(tx, of);
  const caseId = known ?? (await openAtGate(tx, passage, byName));
  const { run, findingIds, editionId } = await addToCase(tx, opened, { passage, caseId, byName });

  const { rulebook } = await compiledEdition(tx, { ...of, editionId });
  const { verdict, reasons, ofTheCompressor } = verdictOf(run.ranking.causes, causesOfTheCompressor(rulebook), new Set(findingIds));
  await updatePassage(tx, { ...of, passageId: passage.id }, { endedAt: opened.at, verdict, reasons, ofTheCompressor, editionId, caseId });
  await insertAudit(tx, [{ ...of, action: 'pass.gate', entity: 'gate', entityId: gate.id, changed: { passage: passage.id, unitId: passage.unitId, caseId, opened: known === undefined, verdict, byName: passage.byName }, at: opened.at }]);
}

/** The case that is added to, locked; one that was called or closed while this waited is not. */
async function openCaseLocked(tx: Transaction, of: { organisationId: string; unitId: string }): Promise<string | undefined> {
  const open = await selectOpenCase(tx, of);
  const locked = open && (await lockCase(tx, { ...of, caseId: open.id }));
  return locked?.status === 'open' ? locked.id : undefined;
}

/** A case from when the passage began. Nobody's until somebody takes it. */
async function openAtGate(tx: Transaction, passage: GatePassageRow, byName: string): Promise<string> {
  const { organisationId, unitId, editionId, startedAt: at } = passage;
  const unit = await selectUnit(tx, { organisationId, unitId });
  if (!unit) throw notFound('unit');
  const caseId = newId(at.getTime());
  await beginCase(tx, {
    organisationId,
    caseId,
    unit,
    record: await unitRecord(tx, { organisationId, unitId, on: siteDay(at, unit.timeZone) }),
    editionId,
    compiled: await compiledEdition(tx, { organisationId, editionId }),
    complaints: passage.complaints,
    complaintWords: 'A compressor was asked for at the gate.',
    reading: null,
    by: { name: byName },
    assignedTo: null,
    comebackOf: null,
    at,
  });
  return caseId;
}

interface Adding {
  passage: GatePassageRow;
  caseId: string;
  byName: string;
}

/** Writes what was complained of and answered into a case, with all that follows from it, and ranks it once. */
async function addToCase(tx: Transaction, { writing, at }: Opened, { passage, caseId, byName }: Adding) {
  const of = { organisationId: passage.organisationId, caseId };
  const { head, compiled } = await lockCaseOf(tx, of);
  const rows: FindingRow[] = await selectFindings(tx, of);
  const [answers, limits] = [await selectGateAnswers(tx, { ...of, passageId: passage.id }), await limitsOfCase(tx, of)];

  const standing = currentFindings(rows.filter(({ stage }) => stage.kind === 'diagnosis'));
  const saidYes = new Set(standing.filter(({ shares }) => shares[0]?.state === 'yes').map(({ checkId }) => checkId));
  const complained = complaintFindings(passage.complaints.filter((id) => compiled.checks.has(id) && !saidYes.has(id)));
  const common = { stage: DIAGNOSIS, source: 'asked', receivedAt: at, baseline: null, person: byName };
  const unmeasured = { valueTyped: null, errorTyped: null, unit: null, valueSi: null, errorSi: null, sum: null, judgement: null };
  const given = [
    ...complained.map((finding) => ({ ...unmeasured, ...finding, ...common, id: newId(at.getTime()), kind: 'state', askedBecause: 'always', correctedAt: passage.startedAt })),
    ...readAnswers(compiled, answers, writing).map(({ at: answeredAt, ...read }) => {
      const limit = limits.get(read.checkId);
      const judgement = limit && read.valueSi !== null ? judge(limit, read.valueSi, read.errorSi ?? 0) : null;
      return { ...read, ...common, judgement, id: newId(at.getTime()), askedBecause: 'suggested', correctedAt: answeredAt };
    }),
  ];
  // Somebody in the bay may have answered the same check meanwhile.
  const added = given.map((row) => ({ ...row, ...arriving(row, rows) }));
  await insertFindings(tx, added.map(({ person: _, standing: replaced, ...row }) => ({ ...row, ...of, byName, deviceAt: row.correctedAt, clockOffsetMs: 0, supersedes: row.late ? null : (replaced?.id ?? null) })));

  const rowsNow = [...rows, ...added];
  const held = releaseHolds(compiled, rowsNow);
  const says = added.filter(({ shares }) => shares.length > 0);
  const vehicleState = says.reduce((state, { checkId }) => vehicleAfter(state, compiled.checks.get(checkId)?.check.setUp ?? {}), head.vehicleState);
  await updateCase(tx, of, { vehicleState, releaseHolds: held });
  for (const row of added) {
    const check = compiled.checks.get(row.checkId);
    if (check) await holdAfterAnswer(tx, { ...of, unitId: head.unitId, personId: null, check, finding: { ...row, says: row.shares.length > 0 }, holds: held.includes(check.id), at });
  }
  const previous = await selectLatestRun(tx, of);
  if (!previous) throw conflict('The case has no ranking.');
  const run = await makeRun(tx, {
    ...of,
    editionId: head.editionId,
    compiled,
    findings: findingsForRanking(rowsNow),
    recordFacts: previous.recordFacts,
    becauseOf: added.at(-1)?.id ?? null,
    // A case that was opened this instant has been ranked in it.
    at: new Date(Math.max(at.getTime(), passage.startedAt.getTime() + 1)),
  });
  return { run, editionId: head.editionId, findingIds: added.map(({ id }) => id) };
}
