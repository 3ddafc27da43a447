import { route } from '@/lib/auth/route';
import { catchWritten } from '@/lib/openapi/answers/oil-catch';
import { endCatch } from '@/lib/services/oil-catch/end';

export const POST = route(endCatch, {
  params: { id: 'caseId', catchId: 'catchId' },
  scope: 'cases:write',
  doc: { summary: 'Take the bottle down', description: 'What was weighed stands; nobody is reminded any more.', answers: catchWritten },
});
