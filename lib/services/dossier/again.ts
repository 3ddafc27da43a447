import { lockDossier, updateDossier } from '@/db/queries/dossier';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { dossierInput } from '@/lib/schemas/dossier';
import { defineWrite } from '../define';

/** All tries of the job together take less. */
const AT_HAND_MS = 15 * 60_000;

/** Asks for the PDF of a dossier again; of one that is made nothing changes. */
export const makeDossierAgain = defineWrite({
  name: 'make-again.dossier',
  doing: 'make dossiers',
  roles: PERMITTED['case.work'],
  input: dossierInput,
  run: async ({ tx, ctx, input: { caseId, dossierId }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, dossierId };
    const row = await lockDossier(tx, of);
    if (row?.caseId !== caseId) throw notFound('dossier');
    // One whose worker was stopped at its last try would wait for ever.
    const isAtHand = row.state === 'waiting' && ctx.now().getTime() - row.madeAt.getTime() < AT_HAND_MS;
    if (row.state === 'made' || isAtHand) unchanged();
    else {
      await updateDossier(tx, of, { state: 'waiting', error: null });
      await ctx.jobs.send(tx, 'make-dossier', of);
      audit({ entity: 'dossier', entityId: dossierId, changed: { reference: row.reference, state: 'waiting' } });
    }
    return { id: dossierId, caseId, reference: row.reference };
  },
});
