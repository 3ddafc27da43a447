import type { Transaction } from '@/db/connect';
import { insertCase, insertCaseEvent, takeCaseNumber } from '@/db/queries/case';
import { insertFindings } from '@/db/queries/finding';
import { insertHolds } from '@/db/queries/unit-hold';
import type { UnitRow } from '@/db/queries/unit';
import { findingsForRanking } from '@/lib/case/findings-for-ranking';
import { releaseHolds } from '@/lib/case/release-holds';
import type { CompiledRulebook, Finding, RecordFacts } from '@/lib/diagnose';
import { findingsFromRecord } from '@/lib/diagnose/findings-from-record';
import { AS_PARKED } from '@/lib/diagnose/set-up';
import { conflict } from '@/lib/errors';
import { newId } from '@/lib/ids';
import type { NotedReading } from '../unit/note-reading';
import { complaintFindings } from './complaints';
import { makeRun } from './run-of-record';

interface Begun {
  organisationId: string;
  caseId: string;
  unit: Pick<UnitRow, 'id' | 'siteId'>;
  record: { fitId: string | null; facts: RecordFacts };
  editionId: string;
  compiled: CompiledRulebook;
  complaints: string[];
  complaintWords: string | null;
  reading: NotedReading | null;
  /** A person with a sign-in, or the name that somebody at a gate gave. */
  by: { personId: string } | { name: string };
  assignedTo: string | null;
  comebackOf: string | null;
  at: Date;
}

/** Writes a case with its first findings, of the complaints and of what the record knows, and ranks it. @returns its number */
export async function beginCase(tx: Transaction, begun: Begun): Promise<number> {
  const { organisationId, caseId, unit, record, editionId, compiled, complaints, reading, by, at } = begun;
  const author = 'personId' in by ? { personId: by.personId } : { byName: by.name };

  const asFinding = (finding: Omit<Finding, 'id'>, source: 'asked' | 'record') => ({
    ...finding,
    ...author,
    id: newId(at.getTime()),
    organisationId,
    caseId,
    source,
    judgement: null,
    kind: 'state',
    askedBecause: 'always',
    deviceAt: at,
    clockOffsetMs: 0,
    correctedAt: at,
    receivedAt: at,
  });
  const rows = [
    ...findingsFromRecord(compiled, record.facts).map((finding) => asFinding(finding, 'record')),
    ...complaintFindings(complaints).map((finding) => asFinding(finding, 'asked')),
  ];

  const held = releaseHolds(compiled, rows);
  const number = await takeCaseNumber(tx, organisationId);
  const inserted = await insertCase(tx, {
    organisationId,
    id: caseId,
    number,
    unitId: unit.id,
    siteId: unit.siteId,
    fitId: record.fitId,
    editionId,
    complaints,
    complaintWords: begun.complaintWords,
    odometerM: reading?.odometerM ?? null,
    engineS: reading?.engineS ?? null,
    asTyped: reading?.asTyped ?? {},
    vehicleState: { ...AS_PARKED, access: [] },
    releaseHolds: held,
    assignedTo: begun.assignedTo,
    ...('personId' in by ? { openedBy: by.personId } : { openedByName: by.name }),
    comebackOf: begun.comebackOf,
    openedAt: at,
  });
  if (!inserted) throw conflict('This case is being opened by another request. Look for it in the list.');
  await insertCaseEvent(tx, { organisationId, id: newId(at.getTime()), caseId, kind: 'opened', ...author, at });

  await insertFindings(tx, rows);
  await insertHolds(tx, held.map((checkId) => ({ organisationId, id: newId(at.getTime()), unitId: unit.id, caseId, checkId, findingId: rows.findLast((row) => row.checkId === checkId)?.id, placedAt: at })));
  await makeRun(tx, { organisationId, caseId, editionId, compiled, findings: findingsForRanking([...rows]), recordFacts: record.facts, becauseOf: null, at });
  return number;
}
