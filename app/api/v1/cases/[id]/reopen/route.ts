import { route } from '@/lib/auth/route';
import { idAnswer } from '@/lib/openapi/answers/common';
import { reopenCase } from '@/lib/services/case/reopen';

export const POST = route(reopenCase, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  ifMatch: 'possible',
  status: 201,
  doc: { summary: 'Reopen a case', description: 'Takes the call back; it stays in the history with the reason.', answers: idAnswer },
});
