import { route } from '@/lib/auth/route';
import { rulebookAnswer } from '@/lib/openapi/answers/rulebook';
import { viewRulebookOfCase } from '@/lib/services/edition/view';

export const GET = route(viewRulebookOfCase, {
  params: { id: 'caseId' },
  scope: 'cases:read',
  doc: { summary: 'Read what a case can be asked', description: 'Checks, causes and cautions of the edition that the case was opened with.', answers: rulebookAnswer },
});
