import { route } from '@/lib/auth/route';
import { catchWritten } from '@/lib/openapi/answers/oil-catch';
import { weigh } from '@/lib/services/oil-catch/weigh';

export const POST = route(weigh, {
  params: { id: 'caseId', catchId: 'catchId' },
  scope: 'cases:write',
  status: 201,
  doc: {
    summary: 'Weigh what was caught',
    description: 'Since the weighing before, with the hour meter or the hours run. Answers the check by the sum of all weighings; what stood there goes into the history.',
    answers: catchWritten,
  },
});
