import { route } from '@/lib/auth/route';
import { idAnswer } from '@/lib/openapi/answers/common';
import { assignCase } from '@/lib/services/case/assign';

export const POST = route(assignCase, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  ifMatch: 'possible',
  doc: { summary: 'Give a case to somebody', description: 'Or to nobody, with null.', answers: idAnswer },
});
