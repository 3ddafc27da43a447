import { route } from '@/lib/auth/route';
import { dossierSent } from '@/lib/openapi/answers/dossier';
import { sendDossierAgain } from '@/lib/services/dossier/send';

export const POST = route(sendDossierAgain, {
  params: { id: 'caseId', dossierId: 'dossierId', sendingId: 'sendingId' },
  scope: 'cases:write',
  doc: { summary: 'Try again to send a dossier', description: 'Whose mail was given up; of another nothing changes.', answers: dossierSent },
});
