import { route } from '@/lib/auth/route';
import { caseKit } from '@/lib/openapi/answers/device';
import { readCaseKit } from '@/lib/services/case/kit';

export const GET = route(readCaseKit, {
  params: { id: 'caseId' },
  scope: 'cases:read',
  doc: { summary: 'Read what a device needs to go on alone', description: 'With the rulebook of its edition it gives the same state as the server would.', answers: caseKit },
});
