import { route } from '@/lib/auth/route';
import { dossierList, dossierMade } from '@/lib/openapi/answers/dossier';
import { makeDossier } from '@/lib/services/dossier/make';
import { listDossiers } from '@/lib/services/dossier/read';

export const GET = route(listDossiers, {
  params: { id: 'caseId' },
  scope: 'cases:read',
  doc: { summary: 'The dossiers of a case', description: 'The latest first, each with to whom it was sent and where that mail stands.', answers: dossierList },
});

export const POST = route(makeDossier, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  status: 201,
  doc: { summary: 'Make a dossier', description: 'Of the case as it stands now. Its PDF is made within a minute: ask for its state.', answers: dossierMade },
});
