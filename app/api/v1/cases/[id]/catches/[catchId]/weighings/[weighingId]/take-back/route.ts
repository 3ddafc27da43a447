import { route } from '@/lib/auth/route';
import { catchWritten } from '@/lib/openapi/answers/oil-catch';
import { takeBackWeighing } from '@/lib/services/oil-catch/take-back';

export const POST = route(takeBackWeighing, {
  params: { id: 'caseId', catchId: 'catchId', weighingId: 'weighingId' },
  scope: 'cases:write',
  doc: { summary: 'Take the last weighing back', description: 'It counts no more, and the check is answered by the others.', answers: catchWritten },
});
