import { route } from '@/lib/auth/route';
import { dossierWhole } from '@/lib/openapi/answers/dossier';
import { readDossier } from '@/lib/services/dossier/read';

export const GET = route(readDossier, {
  params: { id: 'caseId', dossierId: 'dossierId' },
  scope: 'cases:read',
  doc: { summary: 'A dossier', description: 'With all that it says, as it was kept when it was made.', answers: dossierWhole },
});
