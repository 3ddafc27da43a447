import { caseStream } from '@/lib/auth/case-stream';
import { route } from '@/lib/auth/route';
import { events } from '@/lib/openapi/answers/device';
import { watchCase } from '@/lib/services/case/watch';

export const GET = route(watchCase, {
  params: { id: 'caseId' },
  scope: 'cases:read',
  shape: () => '',
  respond: (of, request) => caseStream(of, request.signal),
  doc: { summary: 'Hear of the writes to a case', description: 'Server-sent events, for five minutes; then ask again.', answers: events, mediaType: 'text/event-stream' },
});
