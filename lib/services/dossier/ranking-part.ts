import type { Transaction } from '@/db/connect';
import { selectLatestRun, selectRun } from '@/db/queries/run';
import { selectEdition } from '@/db/queries/edition';
import { rankOptions } from '@/lib/case/findings-for-ranking';
import { reasonViews } from '@/lib/case/view/causes';
import { findingViews } from '@/lib/case/view/findings';
import type { FindingRow, NoteRow } from '@/lib/case/rows';
import { explain } from '@/lib/diagnose/explain';
import type { DossierParts } from '@/lib/dossier/content';
import { notFound } from '@/lib/errors';
import type { Ctx } from '../context';
import { compiledEdition } from '../edition/compiled';

interface Asked {
  caseId: string;
  /** Of the call; null: none stands, or it was made before anything was ranked. */
  runId: string | null;
  rows: readonly FindingRow[];
  notes: readonly NoteRow[];
  causeName: (id: string) => string;
}

/** The ranking that stood when the cause was called, made again from what its run kept, with its reasons; or that of now. */
export async function rankingPart(tx: Transaction, ctx: Pick<Ctx, 'organisation' | 'person'>, { caseId, runId, rows, notes, causeName }: Asked): Promise<DossierParts['ranking']> {
  const organisationId = ctx.organisation.id;
  const id = runId ?? (await selectLatestRun(tx, { organisationId, caseId }))?.id;
  const run = id === undefined ? undefined : await selectRun(tx, { organisationId, runId: id });
  const edition = run && (await selectEdition(tx, { organisationId, editionId: run.editionId }));
  if (!run || !edition) throw notFound('ranking of the case');
  const compiled = await compiledEdition(tx, { organisationId, editionId: run.editionId });
  const explained = explain(compiled, run.inputs.findings, rankOptions(run.inputs.findings, run.inputs.recordFacts));
  const reasons = reasonViews(compiled, explained, findingViews(compiled, rows, notes, ctx.person.units));
  return {
    at: run.at,
    isOfCall: runId !== null,
    editionNumber: edition.number,
    causes: run.result.causes.map(({ causeId, p }) => ({ name: causeName(causeId), p, reasons: reasons[causeId] ?? [] })),
  };
}
