import { route } from '@/lib/auth/route';
import { repairWritten } from '@/lib/openapi/answers/repair';
import { revokeWatchLink } from '@/lib/services/watch/links';

export const POST = route(revokeWatchLink, {
  params: { id: 'caseId', watchId: 'watchId', linkId: 'linkId' },
  scope: 'cases:write',
  doc: { summary: 'Take a link back', answers: repairWritten },
});
