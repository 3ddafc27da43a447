import { route } from '@/lib/auth/route';
import { caseState } from '@/lib/openapi/answers/case-state';
import { recordFinding } from '@/lib/services/case/record-finding';

export const POST = route(recordFinding, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  status: 201,
  doc: {
    summary: 'Answer a check',
    description: 'Answers the state of the case after it. A new answer to the same check replaces the one before; `undo` takes it back. Cautions of the check have to be acknowledged first.',
    answers: caseState,
  },
});
