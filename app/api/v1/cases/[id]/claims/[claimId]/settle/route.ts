import { route } from '@/lib/auth/route';
import { claimWritten } from '@/lib/openapi/answers/claim';
import { settleClaim } from '@/lib/services/claim/claim';

export const POST = route(settleClaim, {
  params: { id: 'caseId', claimId: 'claimId' },
  scope: 'cases:write',
  doc: { summary: 'Say what came of a claim', description: 'Denied or paid in part needs `why`; paid in part the amount. The last word holds.', answers: claimWritten },
});
