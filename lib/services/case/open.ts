import type { z } from 'zod';
import { selectCaseHead } from '@/db/queries/case';
import { selectPublishedEdition } from '@/db/queries/edition';
import { selectUnit } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { siteDay } from '@/lib/case/site-day';
import { conflict, invalid, notFound } from '@/lib/errors';
import { openCaseInput } from '@/lib/schemas/case';
import { defineWrite, type Work } from '../define';
import { compiledEdition } from '../edition/compiled';
import { addUnit } from '../unit/add-unit';
import { noteReading } from '../unit/note-reading';
import { unitRecord } from '../unit/unit-record';
import { beginCase } from './begin';
import { complaintIds } from './complaints';

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

  const number = await beginCase(tx, {
    organisationId,
    caseId: input.id,
    unit,
    record,
    editionId: edition.id,
    compiled,
    complaints: input.complaints,
    complaintWords: input.complaintWords || null,
    reading,
    by: { personId: ctx.person.id },
    assignedTo: ctx.person.id,
    comebackOf,
    at,
  });
  audit({
    entity: 'case',
    entityId: input.id,
    changed: { number, unitId, complaints: input.complaints, complaintWords: input.complaintWords, odometerM: reading?.odometerM },
  });
  return { id: input.id, number };
}
