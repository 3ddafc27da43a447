import { route } from '@/lib/auth/route';
import { dossierSent } from '@/lib/openapi/answers/dossier';
import { sendDossier } from '@/lib/services/dossier/send';

export const POST = route(sendDossier, {
  params: { id: 'caseId', dossierId: 'dossierId' },
  scope: 'cases:write',
  status: 201,
  doc: { summary: 'Send a dossier by mail', description: 'Once its PDF is made. Where the mail stands, the dossier says.', answers: dossierSent },
});
