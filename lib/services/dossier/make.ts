import { insertDossier, insertSeal, lockDossier, takeDossierNumber } from '@/db/queries/dossier';
import { lockCase } from '@/db/queries/case';
import { PERMITTED } from '@/lib/auth/permissions';
import { siteDay } from '@/lib/case/site-day';
import { contentHash } from '@/lib/dossier/canonical';
import { dossierContent } from '@/lib/dossier/content';
import { dossierReference } from '@/lib/dossier/reference';
import { conflict, invalid, notFound } from '@/lib/errors';
import { makeDossierInput, MOST_DOSSIER_PHOTOS } from '@/lib/schemas/dossier';
import { defineWrite } from '../define';
import { gatherParts } from './gather-parts';

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
    const { head, ...parts } = await gatherParts(tx, ctx, caseId);
    const leftOut = { sections: leaveOut, photoIds: leaveOutPhotos, names: withholdNames, fleet: withholdFleet };
    const photos = leaveOut.includes('photos') ? 0 : parts.photos.filter((photo) => !leaveOutPhotos.includes(photo.id)).length;
    if (photos > MOST_DOSSIER_PHOTOS) throw invalid({ leaveOutPhotos: `A dossier takes ${MOST_DOSSIER_PHOTOS} photos at most, and this would be ${photos}. Leave some out.` });

    const madeAt = ctx.now();
    const number = await takeDossierNumber(tx, organisationId);
    const reference = dossierReference(number, siteDay(madeAt, head.timeZone));
    const about = { reference, organisation: ctx.organisation.name, caseNumber: head.number, madeAt, madeBy: ctx.person.name, timeZone: head.timeZone };
    const content = dossierContent({ about, ...parts }, leftOut);
    const hash = contentHash(content);
    const written = await insertDossier(tx, { organisationId, id, caseId, number, reference, madeAt, madeBy: ctx.person.id, paper, leftOut, content, contentHash: hash });
    if (!written) throw conflict('This id belongs to another dossier.');
    await insertSeal(tx, { organisationId, dossierId: id, kind: 'content', reference, hash, madeAt });
    await ctx.jobs.send(tx, 'make-dossier', of);
    audit({ entity: 'dossier', entityId: id, changed: { caseId, reference, paper, contentHash: hash, leftOut: content.leftOut } });
    return { id, caseId, reference };
  },
});
