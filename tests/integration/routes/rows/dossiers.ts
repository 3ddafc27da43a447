import { sql } from 'drizzle-orm';
import { PERMITTED } from '@/lib/auth/permissions';
import { newId } from '@/lib/ids';
import { openCase } from '@/lib/services/case/open';
import { makeDossier } from '@/lib/services/dossier/make';
import { makeDossierPdf } from '@/lib/services/dossier/make-pdf';
import { readDossier } from '@/lib/services/dossier/read';
import { sendDossier } from '@/lib/services/dossier/send';
import { storage } from '@/lib/storage/of-environment';
import { feature, type Made } from '../row';

const SEE = PERMITTED['case.see'];
const WORK = PERMITTED['case.work'];
const PAGE = '(signed-in)/cases/[id]/dossier';
const DOSSIERS = 'api/v1/cases/[id]/dossiers';

const ofDossier = ({ caseId = '', dossierId = '' }: Made) => ({ id: caseId, dossierId });

/** A case with a dossier whose PDF is made and whose mail was given up, and one whose PDF failed. */
export const dossiers = feature({
  async prepare({ tenant, as }) {
    // The storage that the routes have, so that what is put there is found by them.
    const ctx = { ...as('technician'), storage: storage() };
    const [caseId, dossierId, failedId, sendingId] = [newId(), newId(), newId(), newId()];
    await openCase({ ctx, input: { id: caseId, unit: { kind: 'new', id: newId(), fleetNumber: caseId, siteId: tenant.siteId, vehicleKind: 'truck' }, complaints: ['complaint-oil'] } });
    for (const id of [dossierId, failedId]) await makeDossier({ ctx, input: { id, caseId, paper: 'a4' } });
    await makeDossierPdf(ctx, { organisationId: tenant.organisationId, dossierId }, { isLast: true });
    await sendDossier({ ctx, input: { id: sendingId, caseId, dossierId, to: 'desk@people.test', words: '' } });
    await tenant.asOwner(async (tx) => {
      await tx.execute(sql`update dossier set state = 'failed' where id = ${failedId}`);
      await tx.execute(sql`update mail set state = 'given-up' where entity_id = ${dossierId}`);
    });
    const { reference, contentHash } = await readDossier({ ctx, input: { caseId, dossierId } });
    return { caseId, dossierId, failedId, sendingId, reference, contentHash };
  },
  rows: [
    { page: PAGE, roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { page: `${PAGE}/[dossierId]`, roles: SEE, params: ofDossier },
    { page: '(public)/verify', roles: 'anybody' },
    { action: PAGE, name: 'make', roles: WORK, form: ({ caseId }) => ({ id: newId(), caseId, paper: 'letter', leaveOut: ['ranking', 'call'], withholdNames: 'on' }) },
    { action: PAGE, name: 'makeAgain', roles: WORK, form: ({ caseId, failedId }) => ({ caseId, dossierId: failedId }) },
    { action: PAGE, name: 'send', roles: WORK, form: ({ caseId, dossierId }) => ({ id: newId(), caseId, dossierId, to: 'supplier@people.test', words: 'As agreed' }) },
    { action: PAGE, name: 'sendAgain', roles: WORK, form: ({ caseId, dossierId, sendingId }) => ({ caseId, dossierId, sendingId }) },
    { action: '(public)/verify', name: 'verify', roles: 'anybody', form: ({ reference, contentHash }) => ({ reference, hash: contentHash }) },

    { route: DOSSIERS, method: 'GET', roles: SEE, params: ({ caseId }) => ({ id: caseId }) },
    { route: DOSSIERS, method: 'POST', roles: WORK, params: ({ caseId }) => ({ id: caseId }), body: () => ({ id: newId(), paper: 'a4', leaveOut: ['photos'], withholdFleet: true }) },
    { route: `${DOSSIERS}/[dossierId]`, method: 'GET', roles: SEE, params: ofDossier },
    { route: `${DOSSIERS}/[dossierId]/pdf`, method: 'GET', roles: SEE, params: ofDossier },
    { route: `${DOSSIERS}/[dossierId]/again`, method: 'POST', roles: WORK, params: ({ caseId, failedId }) => ({ id: caseId, dossierId: failedId }) },
    { route: `${DOSSIERS}/[dossierId]/sendings`, method: 'POST', roles: WORK, params: ofDossier, body: () => ({ id: newId(), to: 'supplier@people.test', words: 'As agreed' }) },
    { route: `${DOSSIERS}/[dossierId]/sendings/[sendingId]/again`, method: 'POST', roles: WORK, params: (made) => ({ ...ofDossier(made), sendingId: made.sendingId ?? '' }) },
  ],
});
