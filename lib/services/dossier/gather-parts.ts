import { selectRemovalsOfCase, selectStoredOfCase } from '@/db/queries/attachment';
import { selectCalls, selectCaseEvents, selectCaseHead } from '@/db/queries/case';
import { selectModel } from '@/db/queries/compressor-model';
import { selectFindingNotes, selectFindings } from '@/db/queries/finding';
import { selectFit, selectFitsOfUnit } from '@/db/queries/fit';
import { selectRepairs, selectSteps } from '@/db/queries/repair';
import { selectUnit } from '@/db/queries/unit';
import type { Transaction } from '@/db/connect';
import { standingFindings } from '@/lib/case/current-findings';
import type { DossierParts } from '@/lib/dossier/content';
import { notFound } from '@/lib/errors';
import { standingCall } from '../case/standing-call';
import type { Ctx } from '../context';
import { compiledEdition } from '../edition/compiled';
import { objectKey } from '../photo/object-key';
import { lastMarks } from '../repair/marks';
import { gatherProof } from './gather-proof';
import { rankingPart } from './ranking-part';

/** Far more than anybody looks through; a dossier takes fewer. */
const MOST_PHOTOS = 1000;

export type Gathered = Omit<DossierParts, 'about'> & { head: NonNullable<Awaited<ReturnType<typeof selectCaseHead>>> };

/**
 * Reads what a dossier of a case is made from, as the case stands now.
 *
 * @throws AppError "not-found" for a case that isn't there
 */
export async function gatherParts(tx: Transaction, ctx: Pick<Ctx, 'organisation' | 'person'>, caseId: string): Promise<Gathered> {
  const organisationId = ctx.organisation.id;
  const of = { organisationId, caseId };
  const head = await selectCaseHead(tx, of);
  if (!head) throw notFound('case');
  const unit = await selectUnit(tx, { organisationId, unitId: head.unitId });
  if (!unit) throw notFound('unit');
  const compiled = await compiledEdition(tx, { organisationId, editionId: head.editionId });
  const rows = await selectFindings(tx, of);
  const notes = await selectFindingNotes(tx, of);
  const call = standingCall(await selectCalls(tx, of), await selectCaseEvents(tx, of)) ?? null;
  const causes = new Map(compiled.rulebook.causes.map(({ id, name }) => [id, name]));
  const causeName = (id: string) => causes.get(id) ?? id;
  const fit = head.fitId === null ? undefined : await selectFit(tx, { organisationId, fitId: head.fitId });
  const said = await selectSteps(tx, of);
  return {
    head,
    ...(await gatherProof(tx, ctx, { ...of, compiled, causeName })),
    units: ctx.person.units,
    unit: {
      unit,
      siteName: head.siteName,
      odometerM: head.odometerM,
      engineS: head.engineS,
      model: (fit && (await selectModel(tx, { organisationId, modelId: fit.modelId }))) ?? null,
    },
    fits: await selectFitsOfUnit(tx, { organisationId, unitId: head.unitId }),
    complaint: {
      complaints: head.complaints.map((id) => compiled.checks.get(id)?.check.name ?? id),
      words: head.complaintWords,
      openedAt: head.openedAt,
      openedBy: head.openedBy,
    },
    findings: { compiled, standing: standingFindings(rows).sort((a, b) => a.correctedAt.getTime() - b.correctedAt.getTime() || (a.id < b.id ? -1 : 1)), notes },
    photos: await photosInSight(tx, of, (checkId) => compiled.checks.get(checkId)?.check.name ?? checkId),
    ranking: await rankingPart(tx, ctx, { caseId, runId: call?.runId ?? null, rows, notes, causeName }),
    call: call && { ...call, mainCause: causeName(call.mainCause), contributingCauses: call.contributingCauses.map(causeName) },
    repairs: (await selectRepairs(tx, of)).flatMap(({ remedyId, ...repair }) => {
      const remedy = compiled.rulebook.remedies.find(({ id }) => id === remedyId);
      if (!remedy) return [];
      const marks = lastMarks(said.filter(({ repairId }) => repairId === repair.id));
      return [{ ...repair, name: remedy.name, steps: remedy.steps.map((text, i) => ({ text, mark: marks.get(i) ?? null })) }];
    }),
  };
}

/** What somebody took out of sight stays out of it. */
async function photosInSight(tx: Transaction, of: { organisationId: string; caseId: string }, checkName: (id: string) => string): Promise<DossierParts['photos']> {
  const removals = new Map((await selectRemovalsOfCase(tx, of)).map((removal) => [removal.photoId, removal.kind]));
  return (await selectStoredOfCase(tx, { ...of, limit: MOST_PHOTOS }))
    .filter(({ id }) => removals.get(id) !== 'hide')
    .map(({ checkId, takenAt, createdAt, ...photo }) => ({ ...photo, checkName: checkId && checkName(checkId), takenAt: takenAt ?? createdAt, objectKey: objectKey(of.organisationId, photo.id) }));
}
