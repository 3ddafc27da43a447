import { fileResponse } from '@/lib/auth/file-response';
import { route } from '@/lib/auth/route';
import { pdfBytes } from '@/lib/openapi/answers/dossier';
import { downloadDossier } from '@/lib/services/dossier/read';

export const GET = route(downloadDossier, {
  params: { id: 'caseId', dossierId: 'dossierId' },
  scope: 'cases:read',
  respond: fileResponse,
  shape: () => '',
  doc: { summary: 'The PDF of a dossier', answers: pdfBytes, mediaType: 'application/pdf' },
});
