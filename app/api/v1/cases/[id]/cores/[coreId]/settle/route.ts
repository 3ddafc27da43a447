import { route } from '@/lib/auth/route';
import { claimWritten } from '@/lib/openapi/answers/claim';
import { settleCore } from '@/lib/services/claim/core';

export const POST = route(settleCore, {
  params: { id: 'caseId', coreId: 'coreId' },
  scope: 'cases:write',
  doc: { summary: 'Say what came of a core', description: 'Refused needs `why`. The last word holds.', answers: claimWritten },
});
