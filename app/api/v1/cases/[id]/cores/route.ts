import { route } from '@/lib/auth/route';
import { claimWritten } from '@/lib/openapi/answers/claim';
import { sendCore } from '@/lib/services/claim/core';

export const POST = route(sendCore, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  status: 201,
  doc: { summary: 'Keep that a core went back', answers: claimWritten },
});
