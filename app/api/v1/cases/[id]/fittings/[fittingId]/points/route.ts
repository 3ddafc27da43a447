import { route } from '@/lib/auth/route';
import { repairWritten } from '@/lib/openapi/answers/repair';
import { answerPoint } from '@/lib/services/fitting/answer';

export const POST = route(answerPoint, {
  params: { id: 'caseId', fittingId: 'fittingId' },
  scope: 'cases:write',
  status: 201,
  doc: { summary: 'Answer a point of the install record', description: 'The last answer to a point holds, and is the fit’s practice record.', answers: repairWritten },
});
