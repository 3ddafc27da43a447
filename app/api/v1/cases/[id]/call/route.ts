import { route } from '@/lib/auth/route';
import { idAnswer } from '@/lib/openapi/answers/common';
import { callCause } from '@/lib/services/case/call';

export const POST = route(callCause, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  ifMatch: 'possible',
  status: 201,
  doc: { summary: 'Name the cause of a case', description: 'A cause that does not lead needs `whyNotLeading`; “something-else” needs `unlistedCause`.', answers: idAnswer },
});
