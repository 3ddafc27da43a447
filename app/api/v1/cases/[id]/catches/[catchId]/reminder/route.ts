import { route } from '@/lib/auth/route';
import { catchWritten } from '@/lib/openapi/answers/oil-catch';
import { remindOfCatch } from '@/lib/services/oil-catch/end';

export const POST = route(remindOfCatch, {
  params: { id: 'caseId', catchId: 'catchId' },
  scope: 'cases:write',
  doc: { summary: 'Change the reminder to weigh', description: 'Every so many days from now; empty: no mail.', answers: catchWritten },
});
