import { route } from '@/lib/auth/route';
import { repairWritten } from '@/lib/openapi/answers/repair';
import { finishFitting } from '@/lib/services/fitting/answer';

export const POST = route(finishFitting, {
  params: { id: 'caseId', fittingId: 'fittingId' },
  scope: 'cases:write',
  doc: { summary: 'Finish a fitting', description: 'Refused, naming them, while points are open.', answers: repairWritten },
});
