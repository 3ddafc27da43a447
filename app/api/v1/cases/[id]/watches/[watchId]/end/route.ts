import { route } from '@/lib/auth/route';
import { watchEnded } from '@/lib/openapi/answers/watch';
import { endWatch } from '@/lib/services/watch/end';

export const POST = route(endWatch, {
  params: { id: 'caseId', watchId: 'watchId' },
  scope: 'cases:write',
  doc: { summary: 'End a watch', description: 'Held, when everything was read near its end and is in order; or came back, or lost sight of, with `why`. The case is closed with it; a comeback goes on in a case of its own, or in the open one of the unit that `goesOnIn` names.', answers: watchEnded },
});
