import { route } from '@/lib/auth/route';
import { caseCatches, catchWritten } from '@/lib/openapi/answers/oil-catch';
import { listCatches } from '@/lib/services/oil-catch/list';
import { startCatch } from '@/lib/services/oil-catch/start';

export const GET = route(listCatches, {
  params: { id: 'caseId' },
  scope: 'cases:read',
  doc: { summary: 'The oil caught for a case', description: 'What hangs or hung, each weighing with what it says by itself, and the checks that oil can be caught for.', answers: caseCatches },
});

export const POST = route(startCatch, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  status: 201,
  doc: { summary: 'Begin to catch oil', description: 'From a clean start, one at a time for a check. Its cautions have to be acknowledged today.', answers: catchWritten },
});
