import type { z } from 'zod';
import { insertCase, insertCaseEvent, selectCaseHead, takeCaseNumber } from '@/db/queries/case';
import { selectPublishedEdition } from '@/db/queries/edition';
import { insertFindings } from '@/db/queries/finding';
import { insertHolds } from '@/db/queries/unit-hold';
import { selectUnit } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { findingsForRanking } from '@/lib/case/findings-for-ranking';
import { releaseHolds } from '@/lib/case/release-holds';
import { siteDay } from '@/lib/case/site-day';
import type { Finding } from '@/lib/diagnose';
import { findingsFromRecord } from '@/lib/diagnose/findings-from-record';
import { AS_PARKED } from '@/lib/diagnose/set-up';
import { conflict, invalid, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { openCaseInput } from '@/lib/schemas/case';
import { defineWrite, type Work } from '../define';
import { compiledEdition } from '../edition/compiled';
import { addUnit } from '../unit/add-unit';
import { noteReading } from '../unit/note-reading';
import { unitRecord } from '../unit/unit-record';
import { complaintFindings, complaintIds } from './complaints';
import { makeRun } from './run-of-record';

/**
 * Opens a case on a unit, known or made on the spot: complaints and what the record knows become its first findings,
 * and it is ranked at once. Sent twice, it opens one case.
 */
export const openCase = defineWrite({
  name: 'open.case',
  doing: 'open cases',
  roles: PERMITTED['case.work'],
  input: openCaseInput,
  run: (work) => writeCase(work),
});

/** Opens a case within a service's transaction. @param comebackOf the case whose repair didn't hold */
export async function writeCase(work: Work<z.output<typeof openCaseInput>>, { comebackOf = null }: { comebackOf?: string | null } = {}): Promise<{ id: string; number: number }> {
  const { tx, ctx, input, audit, unchanged } = work;
  const organisationId = ctx.organisation.id;
  const of = { organisationId, caseId: input.id };
  const already = await selectCaseHead(tx, of);
  if (already) {
    unchanged();
    return { id: already.id, number: already.number };
  }

  const unitId = input.unit.kind === 'known' ? input.unit.unitId : (await addUnit(work, input.unit)).id;
  const unit = await selectUnit(tx, { organisationId, unitId });
  if (!unit) throw notFound('unit');
  const edition = await selectPublishedEdition(tx, organisationId);
  if (!edition) throw conflict('Your organisation has no rulebook yet. An engineer has to publish one first.');
  const compiled = await compiledEdition(tx, { organisationId, editionId: edition.id });
  const unknown = input.complaints.filter((id) => !complaintIds(compiled).includes(id));
  if (unknown.length > 0) throw invalid({ complaints: `The rulebook has no complaint “${unknown[0]}”.` });

  const at = ctx.now();
  const onDay = siteDay(at, unit.timeZone);
  const reading = await noteReading(work, {
    unitId,
    readOn: onDay,
    odometer: input.odometer,
    engineHours: input.engineHours,
    odometerReplaced: input.odometerReplaced,
    source: 'case',
  });
  const record = await unitRecord(tx, { organisationId, unitId, on: onDay });

  const asFinding = (finding: Omit<Finding, 'id'>, source: 'asked' | 'record') => ({
    ...finding,
    id: newId(at.getTime()),
    organisationId,
    caseId: input.id,
    source,
    judgement: null,
    kind: 'state',
    askedBecause: 'always',
    personId: ctx.person.id,
    deviceAt: at,
    clockOffsetMs: 0,
    correctedAt: at,
    receivedAt: at,
  });
  const rows = [
    ...findingsFromRecord(compiled, record.facts).map((finding) => asFinding(finding, 'record')),
    ...complaintFindings(input.complaints).map((finding) => asFinding(finding, 'asked')),
  ];

  const held = releaseHolds(compiled, rows);
  const number = await takeCaseNumber(tx, organisationId);
  const inserted = await insertCase(tx, {
    organisationId,
    id: input.id,
    number,
    unitId,
    siteId: unit.siteId,
    fitId: record.fitId,
    editionId: edition.id,
    complaints: input.complaints,
    complaintWords: input.complaintWords || null,
    odometerM: reading?.odometerM ?? null,
    engineS: reading?.engineS ?? null,
    asTyped: reading?.asTyped ?? {},
    vehicleState: { ...AS_PARKED, access: [] },
    releaseHolds: held,
    assignedTo: ctx.person.id,
    openedBy: ctx.person.id,
    comebackOf,
    openedAt: at,
  });
  if (!inserted) throw conflict('This case is being opened by another request. Look for it in the list.');
  await insertCaseEvent(tx, { organisationId, id: newId(at.getTime()), caseId: input.id, kind: 'opened', personId: ctx.person.id, at });

  await insertFindings(tx, rows);
  await insertHolds(tx, held.map((checkId) => ({ organisationId, id: newId(at.getTime()), unitId, caseId: input.id, checkId, findingId: rows.findLast((row) => row.checkId === checkId)?.id, placedAt: at })));
  await makeRun(tx, { organisationId, caseId: input.id, editionId: edition.id, compiled, findings: findingsForRanking([...rows]), recordFacts: record.facts, becauseOf: null, at });
  audit({
    entity: 'case',
    entityId: input.id,
    changed: { number, unitId, complaints: input.complaints, complaintWords: input.complaintWords, odometerM: reading?.odometerM },
  });
  return { id: input.id, number };
}
