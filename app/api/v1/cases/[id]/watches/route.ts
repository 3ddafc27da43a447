import { route } from '@/lib/auth/route';
import { repairWritten } from '@/lib/openapi/answers/repair';
import { watchList } from '@/lib/openapi/answers/watch';
import { listWatches } from '@/lib/services/watch/list';
import { startWatch } from '@/lib/services/watch/start';

export const GET = route(listWatches, {
  params: { id: 'caseId' },
  scope: 'cases:read',
  doc: { summary: 'How the repair of a case is watched', description: 'What a watch would be begun with, and those until now: what was read, what is due, why it can’t be said yet that it held, what came of it.', answers: watchList },
});

export const POST = route(startWatch, {
  params: { id: 'caseId' },
  scope: 'cases:write',
  status: 201,
  doc: { summary: 'Begin to watch a repair', description: 'With an answer to each statement of `planned.begin`, in its order; where one isn’t so, `why`.', answers: repairWritten },
});
