import { route } from '@/lib/auth/route';
import { repairWritten } from '@/lib/openapi/answers/repair';
import { endBreakIn } from '@/lib/services/break-in/run';

export const POST = route(endBreakIn, {
  params: { id: 'caseId', runId: 'runId' },
  scope: 'cases:write',
  doc: { summary: 'End a break-in run', description: 'Done, when it ran long enough and was read; or stopped, with why.', answers: repairWritten },
});
