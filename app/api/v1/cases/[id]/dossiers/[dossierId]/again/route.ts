import { route } from '@/lib/auth/route';
import { dossierMade } from '@/lib/openapi/answers/dossier';
import { makeDossierAgain } from '@/lib/services/dossier/again';

export const POST = route(makeDossierAgain, {
  params: { id: 'caseId', dossierId: 'dossierId' },
  scope: 'cases:write',
  doc: { summary: 'Ask for the PDF of a dossier again', description: 'Where it failed; of one that is made nothing changes.', answers: dossierMade },
});
