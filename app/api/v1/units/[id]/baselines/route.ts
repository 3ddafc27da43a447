import { route } from '@/lib/auth/route';
import { baselineWritten } from '@/lib/openapi/answers/baseline';
import { recordBaseline } from '@/lib/services/baseline/record';

export const POST = route(recordBaseline, {
  params: { id: 'unitId' },
  scope: 'units:write',
  status: 201,
  doc: {
    summary: 'Record a healthy baseline',
    description: 'One or more of the five figures of a unit in good order, each with its unit, or in yours. A head temperature needs its conditions.',
    answers: baselineWritten,
  },
});
