import { route } from '@/lib/auth/route';
import { caseReasons } from '@/lib/openapi/answers/case-state';
import { readCaseReasons } from '@/lib/services/case/read';

export const GET = route(readCaseReasons, {
  params: { id: 'caseId' },
  scope: 'cases:read',
  doc: { summary: 'Read the reasons of a ranking', description: 'What each finding counts for or against each cause, and what would change the ranking most.', answers: caseReasons },
});
