import { route } from '@/lib/auth/route';
import { repairWritten } from '@/lib/openapi/answers/repair';
import { createWatchLink } from '@/lib/services/watch/links';

export const POST = route(createWatchLink, {
  params: { id: 'caseId', watchId: 'watchId' },
  scope: 'cases:write',
  status: 201,
  doc: { summary: 'Make a link for one reading', description: 'For somebody without a sign-in; mailed where `mailTo` says so. Its path stands in the list of watches.', answers: repairWritten },
});
