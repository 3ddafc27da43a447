import { route } from '@/lib/auth/route';
import { repairWritten } from '@/lib/openapi/answers/repair';
import { addBreakInEvent } from '@/lib/services/break-in/run';

export const POST = route(addBreakInEvent, {
  params: { id: 'caseId', runId: 'runId' },
  scope: 'cases:write',
  status: 201,
  doc: { summary: 'Note a reading, a pause or that it runs again', description: 'With the device’s time. What happened before the end is taken after it too.', answers: repairWritten },
});
