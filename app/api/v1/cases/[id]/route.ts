import { route } from '@/lib/auth/route';
import { caseState } from '@/lib/openapi/answers/case-state';
import { readCaseState } from '@/lib/services/case/read';

export const GET = route(readCaseState, {
  params: { id: 'caseId' },
  scope: 'cases:read',
  version: ({ version }) => version,
  doc: {
    summary: 'Read the state of a case',
    description: 'Its ranking, findings and next checks, now or at an instant. Its ETag is what If-Match of a call, a reopening and an assignment can name.',
    answers: caseState,
  },
});
