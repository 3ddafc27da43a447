import { lockCase } from '@/db/queries/case';
import { lockDossier } from '@/db/queries/dossier';
import { PERMITTED } from '@/lib/auth/permissions';
import { conflict, notFound } from '@/lib/errors';
import { makeDossierInput } from '@/lib/schemas/dossier';
import { defineWrite } from '../define';
import { writeDossier } from './write';

/**
 * Makes a dossier of a case as it stands: what it says is written down for good, with its hash, and the worker makes the
 * PDF of it. Sent twice, it makes one.
 */
export const makeDossier = defineWrite({
  name: 'make.dossier',
  doing: 'make dossiers',
  roles: PERMITTED['case.work'],
  input: makeDossierInput,
  run: async ({ tx, ctx, input: { id, caseId, paper, leaveOut, leaveOutPhotos, withholdNames, withholdFleet }, audit, unchanged }) => {
    const organisationId = ctx.organisation.id;
    const of = { organisationId, dossierId: id };
    // Written under the lock of its case, so that it shows one state of it.
    if (!(await lockCase(tx, { organisationId, caseId }))) throw notFound('case');
    const known = await lockDossier(tx, of);
    if (known && known.caseId !== caseId) throw conflict('This id belongs to another dossier.');
    if (known) {
      unchanged();
      return { id, caseId, reference: known.reference };
    }
    const { reference, content, hash } = await writeDossier(tx, ctx, { id, caseId, paper, leftOut: { sections: leaveOut, photoIds: leaveOutPhotos, names: withholdNames, fleet: withholdFleet } });
    audit({ entity: 'dossier', entityId: id, changed: { caseId, reference, paper, contentHash: hash, leftOut: content.leftOut } });
    return { id, caseId, reference };
  },
});
