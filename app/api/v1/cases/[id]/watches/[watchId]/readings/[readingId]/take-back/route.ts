import { route } from '@/lib/auth/route';
import { repairWritten } from '@/lib/openapi/answers/repair';
import { takeBackWatchReading } from '@/lib/services/watch/readings';

export const POST = route(takeBackWatchReading, {
  params: { id: 'caseId', watchId: 'watchId', readingId: 'readingId' },
  scope: 'cases:write',
  doc: { summary: 'Take a wrong reading back', description: 'It stays to be seen, and counts no more.', answers: repairWritten },
});
