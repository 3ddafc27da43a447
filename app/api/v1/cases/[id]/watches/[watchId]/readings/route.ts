import { route } from '@/lib/auth/route';
import { repairWritten } from '@/lib/openapi/answers/repair';
import { addWatchReading } from '@/lib/services/watch/readings';

export const POST = route(addWatchReading, {
  params: { id: 'caseId', watchId: 'watchId' },
  scope: 'cases:write',
  status: 201,
  doc: { summary: 'Add a reading to a watch', description: 'An answer (`state`) or a figure (`value`), as its check has it. The check’s cautions have to be acknowledged today.', answers: repairWritten },
});
