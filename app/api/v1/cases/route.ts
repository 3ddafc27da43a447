import { route } from '@/lib/auth/route';
import { caseList, opened } from '@/lib/openapi/answers/case';
import { browseCases } from '@/lib/services/case/browse';
import { openCase } from '@/lib/services/case/open';

export const GET = route(browseCases, { scope: 'cases:read', doc: { summary: 'List cases', description: 'The newest first.', answers: caseList } });

export const POST = route(openCase, {
  scope: 'cases:write',
  status: 201,
  doc: {
    summary: 'Open a case',
    description: 'On a unit that exists, or on one that is made on the spot. What the record knows and the complaints become its first findings.',
    answers: opened,
  },
});
