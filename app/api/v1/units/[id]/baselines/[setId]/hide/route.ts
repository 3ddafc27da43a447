import { route } from '@/lib/auth/route';
import { baselineHidden } from '@/lib/openapi/answers/baseline';
import { hideBaseline } from '@/lib/services/baseline/hide';

export const POST = route(hideBaseline, {
  params: { id: 'unitId' },
  scope: 'units:write',
  doc: { summary: 'Hide a wrong healthy baseline', description: 'Nothing is compared with it any more; answers that were, keep it.', answers: baselineHidden },
});
