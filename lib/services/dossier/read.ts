import { selectCaseHead } from '@/db/queries/case';
import { selectDossier, selectDossiersOfCase, selectSendings } from '@/db/queries/dossier';
import type { Transaction } from '@/db/connect';
import { PERMITTED } from '@/lib/auth/permissions';
import { contentHash } from '@/lib/dossier/canonical';
import { conflict, notFound } from '@/lib/errors';
import { dossierInput, dossiersOfCaseInput, type DossierRowView, type DossierView } from '@/lib/schemas/dossier';
import { defineRead } from '../define';
import { dossierRowView } from './view';

/** The dossiers that were made of a case, the latest first, with to whom each went. */
export const listDossiers = defineRead({
  name: 'list.dossier',
  doing: 'see dossiers',
  roles: PERMITTED['case.see'],
  input: dossiersOfCaseInput,
  run: async ({ tx, ctx, input: { caseId } }): Promise<{ caseId: string; dossiers: DossierRowView[] }> => {
    const of = { organisationId: ctx.organisation.id, caseId };
    if (!(await selectCaseHead(tx, of))) throw notFound('case');
    const sendings = await selectSendings(tx, of);
    return { caseId, dossiers: (await selectDossiersOfCase(tx, of)).map((row) => dossierRowView(row, sendings)) };
  },
});

/** A dossier with all that it says. */
export const readDossier = defineRead({
  name: 'read.dossier',
  doing: 'see dossiers',
  roles: PERMITTED['case.see'],
  input: dossierInput,
  run: async ({ tx, ctx, input: { caseId, dossierId } }): Promise<DossierView> => {
    const { objectKey: _, content, ...row } = await dossierOf(tx, { organisationId: ctx.organisation.id, caseId, dossierId });
    const sendings = await selectSendings(tx, { organisationId: ctx.organisation.id, caseId });
    return { ...dossierRowView(row, sendings), content, isUnchanged: contentHash(content) === row.contentHash };
  },
});

/** Its PDF, to be passed on as it comes from storage. */
export const downloadDossier = defineRead({
  name: 'download.dossier',
  doing: 'see dossiers',
  roles: PERMITTED['case.see'],
  input: dossierInput,
  run: async ({ tx, ctx, input }) => {
    const { objectKey, reference } = await dossierOf(tx, { organisationId: ctx.organisation.id, ...input });
    if (objectKey === null) throw conflict('The PDF is not made yet. Try again in a minute.');
    return { name: `${reference}.pdf`, mediaType: 'application/pdf', open: () => ctx.storage.open(objectKey) };
  },
});

async function dossierOf(tx: Transaction, { caseId, ...of }: { organisationId: string; caseId: string; dossierId: string }) {
  const row = await selectDossier(tx, of);
  if (row?.caseId !== caseId) throw notFound('dossier');
  return row;
}
