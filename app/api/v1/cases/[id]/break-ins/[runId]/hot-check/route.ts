import { route } from '@/lib/auth/route';
import { repairWritten } from '@/lib/openapi/answers/repair';
import { lookHot } from '@/lib/services/break-in/run';

export const POST = route(lookHot, {
  params: { id: 'caseId', runId: 'runId' },
  scope: 'cases:write',
  doc: { summary: 'Say what was seen for leaks while it was hot', answers: repairWritten },
});
